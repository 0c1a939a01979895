package lodebook.assembly.plan;

import java.util.List;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.MutualMagnetisation;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.layout.RingHarmonics;
import lodebook.assembly.layout.RingPolarisation;
import lodebook.assembly.layout.Spectrum;

/// What each slot's magnet gives to the harmonics of a ring's radial field on the working circle.
///
/// The radial flux density at mid-height on the working circle is B(φ) = Σ_h c_h e^{ihφ}, and with
/// every facing fixed c_h = Σ_i a_{h,i} s_i, s_i the remanence of the magnet in slot i. This holds
/// with recoil permeability too, since each magnetisation answers linearly to the field.
public final class SlotHarmonics {
  private final int polePairs;
  private final int segmentsPerPolePair;
  private final double[][] real;
  private final double[][] imaginary;

  /// @param polePairs pole pairs p of the working wave
  /// @param segmentsPerPolePair magnets k per pole pair
  /// @param real real parts of a_{h,i}, first index h from 0, second index slot − 1, tesla a tesla
  /// @param imaginary imaginary parts, same shape
  public SlotHarmonics(
      int polePairs, int segmentsPerPolePair, double[][] real, double[][] imaginary) {
    if (real.length <= polePairs || imaginary.length != real.length) {
      throw new IllegalArgumentException(
          "harmonics up to " + (real.length - 1) + " don't reach the working wave " + polePairs);
    }
    this.polePairs = polePairs;
    this.segmentsPerPolePair = segmentsPerPolePair;
    this.real = copy(real);
    this.imaginary = copy(imaginary);
  }

  /// Harmonics of a ring whose facings are given, one for each slot, slot 1 first; magnets answer
  /// to each other's field as their type's recoil permeability says.
  public static SlotHarmonics of(RingDesign design, List<Facing> facings) {
    RingHarmonics ring = new RingHarmonics(design);
    MutualMagnetisation mutual = MutualMagnetisation.of(design);
    int slots = design.slots();
    double[][] real = new double[ring.highest() + 1][slots];
    double[][] imaginary = new double[ring.highest() + 1][slots];
    for (int i = 0; i < slots; i++) {
      double[] one = new double[slots];
      one[i] = 1;
      Spectrum spectrum = ring.spectrum(mutual.answerTo(RingPolarisation.of(one, facings)));
      for (int h = 0; h <= ring.highest(); h++) {
        real[h][i] = spectrum.re(h);
        imaginary[h][i] = spectrum.im(h);
      }
    }
    return new SlotHarmonics(
        design.layout().polePairs(), design.layout().segmentsPerPolePair(), real, imaginary);
  }

  /// Number of slots.
  public int slots() {
    return polePairs * segmentsPerPolePair;
  }

  /// Order h of the working wave.
  public int workingOrder() {
    return polePairs;
  }

  /// Highest order known.
  public int highestOrder() {
    return real.length - 1;
  }

  /// Whether an ideal ring may have a harmonic of this order: h = |p(1 + k·m)|, m any whole number.
  public boolean ideal(int order) {
    if (order % polePairs != 0) {
      return false;
    }
    int multiple = order / polePairs % segmentsPerPolePair;
    return multiple == 1 || multiple == segmentsPerPolePair - 1;
  }

  double real(int order, int slot) {
    return real[order][slot];
  }

  double imaginary(int order, int slot) {
    return imaginary[order][slot];
  }

  private static double[][] copy(double[][] rows) {
    double[][] copy = new double[rows.length][];
    for (int i = 0; i < rows.length; i++) {
      copy[i] = rows[i].clone();
    }
    return copy;
  }
}
