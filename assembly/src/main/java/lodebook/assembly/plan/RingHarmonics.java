package lodebook.assembly.plan;

import java.util.List;
import java.util.stream.IntStream;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.FieldMatrix;
import lodebook.assembly.layout.ReadingPlace;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.layout.RingField;

/// What each slot's magnet gives to the harmonics of a ring's radial field on the working circle.
///
/// The radial flux density at mid-height on the working circle is B(φ) = Σ_h c_h e^{ihφ}, and with
/// every facing fixed c_h = Σ_i a_{h,i} s_i, s_i the remanence of the magnet in slot i. This holds
/// with recoil permeability too, since each magnetisation answers linearly to the field.
public final class RingHarmonics {
  private final int polePairs;
  private final int segmentsPerPolePair;
  private final double[][] real;
  private final double[][] imaginary;

  /// @param polePairs pole pairs p of the working wave
  /// @param segmentsPerPolePair magnets k per pole pair
  /// @param real real parts of a_{h,i}, first index h from 0, second index slot − 1, tesla a tesla
  /// @param imaginary imaginary parts, same shape
  public RingHarmonics(
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

  /// Harmonics of a ring whose facings are given, one for each slot, slot 1 first.
  ///
  /// The field is sampled at 12 places a slot, at least 240; harmonics above half of that are left
  /// out. At a gap g to the working circle of radius r they have fallen by more than e^(−120·g/r).
  public static RingHarmonics of(RingDesign design, List<Facing> facings) {
    int places = Math.max(12 * design.slots(), 240);
    double radius = design.layout().workingRadiusMetres();
    FieldMatrix field =
        new RingField(design, facings)
            .at(
                IntStream.range(0, places)
                    .mapToObj(
                        t ->
                            new ReadingPlace(radius, 2 * Math.PI * t / places, 0, Component.RADIAL))
                    .toList());
    double[][] real = new double[places / 2][design.slots()];
    double[][] imaginary = new double[places / 2][design.slots()];
    double[] cosine = new double[places];
    double[] sine = new double[places];
    for (int t = 0; t < places; t++) {
      cosine[t] = Math.cos(2 * Math.PI * t / places) / places;
      sine[t] = Math.sin(2 * Math.PI * t / places) / places;
    }
    double[] samples = new double[places];
    for (int i = 0; i < design.slots(); i++) {
      double out = Math.cos(facings.get(i).radians());
      double next = Math.sin(facings.get(i).radians());
      for (int t = 0; t < places; t++) {
        samples[t] = out * field.perOut(t, i + 1) + next * field.perNext(t, i + 1);
      }
      for (int h = 0; h < places / 2; h++) {
        double re = 0;
        double im = 0;
        for (int t = 0, at = 0; t < places; t++) {
          re += samples[t] * cosine[at];
          im -= samples[t] * sine[at];
          at += h;
          if (at >= places) {
            at -= places;
          }
        }
        real[h][i] = re;
        imaginary[h][i] = im;
      }
    }
    return new RingHarmonics(
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
