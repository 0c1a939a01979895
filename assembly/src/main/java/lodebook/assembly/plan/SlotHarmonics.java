package lodebook.assembly.plan;

import java.util.List;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.FieldMatrix;
import lodebook.assembly.layout.MutualMagnetisation;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.layout.WorkingCircle;

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

  /// Harmonics of a ring whose facings are given, one for each slot, slot 1 first; the magnets
  /// answer to each other's field with their types' recoil permeability.
  public static SlotHarmonics of(RingDesign design, List<Facing> facings) {
    WorkingCircle circle = new WorkingCircle(design, facings);
    MutualMagnetisation mutual = MutualMagnetisation.of(design);
    double[][] real = along(facings, mutual.perRemanence(circle.realParts()));
    double[][] imaginary = along(facings, mutual.perRemanence(circle.imaginaryParts()));
    return new SlotHarmonics(
        design.layout().polePairs(), design.layout().segmentsPerPolePair(), real, imaginary);
  }

  private static double[][] along(List<Facing> facings, FieldMatrix parts) {
    double[][] lines = new double[parts.rows()][parts.slots()];
    for (int i = 0; i < parts.slots(); i++) {
      double out = Math.cos(facings.get(i).radians());
      double next = Math.sin(facings.get(i).radians());
      for (int h = 0; h < parts.rows(); h++) {
        lines[h][i] = out * parts.perOut(h, i + 1) + next * parts.perNext(h, i + 1);
      }
    }
    return lines;
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
