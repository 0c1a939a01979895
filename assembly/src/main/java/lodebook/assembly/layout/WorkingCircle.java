package lodebook.assembly.layout;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.magnet.MagnetBody;
import lodebook.assembly.magnet.MagnetType;

/// Harmonics of a ring's radial field on its working circle at mid-height, as a linear map from the
/// slots' polarisations.
///
/// The sampling is fine enough that aliasing stays below 10⁻⁶ of the working wave.
public final class WorkingCircle {
  private final Layout layout;
  private final FieldMatrix realParts;
  private final FieldMatrix imaginaryParts;

  private record BodyKey(MagnetType type, double turn) {}

  /// Harmonics of a ring whose bodies stand as the rule wants them.
  public WorkingCircle(RingDesign design) {
    this(design, design.ruleFacings());
  }

  /// Harmonics of a ring whose bodies stand as given facings turn them.
  ///
  /// @param facings one for each slot, slot 1 first
  public WorkingCircle(RingDesign design, List<Facing> facings) {
    layout = design.layout();
    int slots = design.slots();
    SlotSpectra[] spectra = new SlotSpectra[slots];
    Map<BodyKey, SlotSpectra> known = new HashMap<>();
    int count = 0;
    for (int i = 0; i < slots; i++) {
      double turn = design.bodyTurnRadians(i + 1, facings.get(i));
      spectra[i] =
          known.computeIfAbsent(
              new BodyKey(design.typeAt(i + 1), turn),
              key ->
                  SlotSpectra.of(
                      MagnetBody.of(key.type()),
                      key.turn(),
                      layout.slotRadiusMetres(),
                      layout.workingRadiusMetres()));
      count = Math.max(count, spectra[i].count());
    }
    count = Math.max(count, layout.polePairs() + 1);
    realParts = new FieldMatrix(count, slots);
    imaginaryParts = new FieldMatrix(count, slots);
    for (int slot = 1; slot <= slots; slot++) {
      fill(slot, spectra[slot - 1].resized(count));
    }
  }

  /// Turns the coefficients of a magnet at angle 0 to its slot: c_h · e^(−ihθ).
  private void fill(int slot, SlotSpectra own) {
    double angle = layout.angleFromFirstRadians(slot);
    for (int h = 0; h < own.count(); h++) {
      double c = Math.cos(h * angle);
      double s = Math.sin(h * angle);
      realParts.set(
          h, slot, own.outRe[h] * c + own.outIm[h] * s, own.nextRe[h] * c + own.nextIm[h] * s);
      imaginaryParts.set(
          h, slot, own.outIm[h] * c - own.outRe[h] * s, own.nextIm[h] * c - own.nextRe[h] * s);
    }
  }

  /// Real parts of c_h per tesla of each slot's polarisation; row h, from 0.
  public FieldMatrix realParts() {
    return realParts;
  }

  /// Imaginary parts of c_h per tesla of each slot's polarisation; row h, from 0.
  public FieldMatrix imaginaryParts() {
    return imaginaryParts;
  }

  /// The highest h that is computed; what lies beyond is negligible.
  public int highest() {
    return realParts.rows() - 1;
  }

  /// Whether an ideal ring of this layout has the harmonic h: |h| = |p(1 + k·m)| for a whole m.
  public boolean isIdeal(int h) {
    int p = layout.polePairs();
    int k = layout.segmentsPerPolePair();
    if (h % p != 0) {
      return false;
    }
    int q = Math.floorMod(h / p, k);
    return q == 1 || q == k - 1;
  }

  /// Harmonics of given polarisations.
  public Spectrum spectrum(RingPolarisation polarisation) {
    return new Spectrum(realParts.apply(polarisation), imaginaryParts.apply(polarisation));
  }

  /// Amplitude of the working wave, 2|c_p|, tesla.
  public double workingAmplitude(RingPolarisation polarisation) {
    return spectrum(polarisation).amplitude(layout.polePairs());
  }

  /// Root mean square of the harmonics that an ideal ring does not have, over that of the working
  /// wave; harmonics that the same ring has with equal pieces are subtracted first.
  ///
  /// @param actual the ring's polarisations
  /// @param equalPieces those of the same ring with equal pieces of the mean strength
  public double unwantedHarmonics(RingPolarisation actual, RingPolarisation equalPieces) {
    Spectrum difference = spectrum(actual.minus(equalPieces));
    double power = 0;
    for (int h = 0; h <= difference.highest(); h++) {
      if (!isIdeal(h)) {
        double square = difference.re(h) * difference.re(h) + difference.im(h) * difference.im(h);
        power += h == 0 ? square : 2 * square;
      }
    }
    return Math.sqrt(power) / (workingAmplitude(actual) / Math.sqrt(2));
  }
}
