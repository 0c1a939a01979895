package lodebook.assembly.layout;

import java.util.Arrays;
import lodebook.assembly.field.Body;

/// Fourier coefficients of the radial flux density on a circle at mid-height, per tesla of
/// polarisation of one magnet at angle 0.
///
/// Sampled at as many points as it takes for the highest coefficients to fall below 10⁻⁷ of the
/// greatest, which bounds the aliasing of the rest; coefficients below 10⁻⁷ of the greatest at the
/// end are dropped.
final class SlotSpectra {
  private static final double ALIASING = 1e-7;
  private static final double NEGLIGIBLE = 1e-7;
  private static final int FIRST_SAMPLES = 128;
  private static final int MOST_SAMPLES = 8192;

  /// Real and imaginary parts for h = 0, 1, … of a polarisation along out and to next.
  final double[] outRe;

  final double[] outIm;
  final double[] nextRe;
  final double[] nextIm;

  private SlotSpectra(double[] outRe, double[] outIm, double[] nextRe, double[] nextIm) {
    this.outRe = outRe;
    this.outIm = outIm;
    this.nextRe = nextRe;
    this.nextIm = nextIm;
  }

  int count() {
    return outRe.length;
  }

  static SlotSpectra of(Body body, double turn, double slotRadius, double workingRadius) {
    int samples = FIRST_SAMPLES;
    while (true) {
      SlotSpectra spectra = sampled(body, turn, slotRadius, workingRadius, samples);
      double greatest = spectra.greatestFrom(0);
      if (spectra.greatestFrom(spectra.count() - 8) < ALIASING * greatest
          || samples >= MOST_SAMPLES) {
        return spectra.cut(NEGLIGIBLE * greatest);
      }
      samples *= 2;
    }
  }

  private static SlotSpectra sampled(
      Body body, double turn, double slotRadius, double workingRadius, int samples) {
    double[] perOut = new double[samples];
    double[] perNext = new double[samples];
    double[] f = new double[3];
    for (int n = 0; n < samples; n++) {
      double angle = 2 * Math.PI * n / samples;
      double c = Math.cos(angle);
      double s = Math.sin(angle);
      SlotTensor.at(body, turn, workingRadius * c - slotRadius, workingRadius * s, 0, f);
      perOut[n] = c * f[0] + s * f[2];
      perNext[n] = c * f[2] + s * f[1];
    }
    int count = samples / 2;
    SlotSpectra spectra =
        new SlotSpectra(new double[count], new double[count], new double[count], new double[count]);
    transform(perOut, spectra.outRe, spectra.outIm);
    transform(perNext, spectra.nextRe, spectra.nextIm);
    return spectra;
  }

  /// c_h = 1/M · Σ B(φ_n) e^(−ihφ_n).
  private static void transform(double[] values, double[] re, double[] im) {
    int samples = values.length;
    double[] cosine = new double[samples];
    double[] sine = new double[samples];
    for (int n = 0; n < samples; n++) {
      cosine[n] = Math.cos(2 * Math.PI * n / samples) / samples;
      sine[n] = Math.sin(2 * Math.PI * n / samples) / samples;
    }
    for (int h = 0; h < re.length; h++) {
      int at = 0;
      for (int n = 0; n < samples; n++) {
        re[h] += values[n] * cosine[at];
        im[h] -= values[n] * sine[at];
        at = (at + h) % samples;
      }
    }
  }

  private double greatestFrom(int first) {
    double greatest = 0;
    for (int h = first; h < count(); h++) {
      greatest =
          Math.max(
              greatest, Math.max(Math.hypot(outRe[h], outIm[h]), Math.hypot(nextRe[h], nextIm[h])));
    }
    return greatest;
  }

  private SlotSpectra cut(double below) {
    int count = count();
    while (count > 1 && greatestFrom(count - 1) < below) {
      count--;
    }
    return resized(count);
  }

  /// The same coefficients, cut off or filled up with zeros.
  SlotSpectra resized(int count) {
    return new SlotSpectra(
        Arrays.copyOf(outRe, count),
        Arrays.copyOf(outIm, count),
        Arrays.copyOf(nextRe, count),
        Arrays.copyOf(nextIm, count));
  }
}
