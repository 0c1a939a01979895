package lodebook.assembly.layout;

/// Fourier coefficients of a ring's radial flux density on its working circle at mid-height: B_r(φ)
/// = Σ c_h e^(ihφ) over all whole h, φ from slot 1 towards rising slot numbers; c_−h is the
/// conjugate of c_h.
public final class Spectrum {
  private final double[] re;
  private final double[] im;

  Spectrum(double[] re, double[] im) {
    this.re = re;
    this.im = im;
  }

  /// The highest h kept; what lies beyond is below 10⁻⁷ of the greatest of a single magnet's.
  public int highest() {
    return re.length - 1;
  }

  /// Real part of c_h, tesla.
  public double re(int h) {
    return h < re.length ? re[h] : 0;
  }

  /// Imaginary part of c_h, tesla.
  public double im(int h) {
    return h < im.length ? im[h] : 0;
  }

  /// Amplitude of the wave with h periods round the ring, 2|c_h| (|c_0| for h = 0), tesla.
  public double amplitude(int h) {
    return (h == 0 ? 1 : 2) * Math.hypot(re(h), im(h));
  }
}
