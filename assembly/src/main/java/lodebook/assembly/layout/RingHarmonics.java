package lodebook.assembly.layout;

import java.util.HashMap;
import java.util.Map;
import lodebook.assembly.magnet.MagnetBody;
import lodebook.assembly.magnet.MagnetType;

/// Harmonics of a ring's radial field on its working circle at mid-height, as a linear map from the
/// slots' polarisations.
///
/// The sampling is fine enough that aliasing stays below 10⁻⁶ of the working wave.
public final class RingHarmonics {
  private final Layout layout;
  private final SlotSpectra[] spectra;
  private final int count;

  private record BodyKey(MagnetType type, double turn) {}

  /// Harmonics of a ring whose bodies stand as the rule wants them.
  public RingHarmonics(RingDesign design) {
    layout = design.layout();
    int slots = design.slots();
    spectra = new SlotSpectra[slots];
    Map<BodyKey, SlotSpectra> known = new HashMap<>();
    int longest = 0;
    for (int i = 0; i < slots; i++) {
      double turn = design.bodyTurnRadians(i + 1, layout.ruleFacing(i + 1));
      spectra[i] =
          known.computeIfAbsent(
              new BodyKey(design.typeAt(i + 1), turn),
              key ->
                  SlotSpectra.of(
                      MagnetBody.of(key.type()),
                      key.turn(),
                      layout.slotRadiusMetres(),
                      layout.workingRadiusMetres()));
      longest = Math.max(longest, spectra[i].count());
    }
    count = longest;
    for (int i = 0; i < slots; i++) {
      if (spectra[i].count() < count) {
        spectra[i] = spectra[i].resized(count);
      }
    }
  }

  /// The highest h that is computed; what lies beyond is negligible.
  public int highest() {
    return count - 1;
  }

  /// Whether an ideal ring of this layout has the harmonic h: |h| = |p(1 + k·m)| for a whole m.
  public boolean isIdeal(int h) {
    int p = layout.polePairs();
    int k = layout.segmentsPerPolePair();
    if (h % p != 0) {
      return false;
    }
    int q = Math.floorMod(h / p, k);
    return q == 1 % k || q == k - 1;
  }

  /// Harmonics of given polarisations.
  public Spectrum spectrum(RingPolarisation polarisation) {
    double[] re = new double[count];
    double[] im = new double[count];
    for (int slot = 1; slot <= spectra.length; slot++) {
      double out = polarisation.out(slot);
      double next = polarisation.next(slot);
      if (out == 0 && next == 0) {
        continue;
      }
      SlotSpectra own = spectra[slot - 1];
      double angle = layout.angleFromFirstRadians(slot);
      double turnRe = Math.cos(angle);
      double turnIm = -Math.sin(angle);
      double phaseRe = 1;
      double phaseIm = 0;
      for (int h = 0; h < count; h++) {
        double a = out * own.outRe[h] + next * own.nextRe[h];
        double b = out * own.outIm[h] + next * own.nextIm[h];
        re[h] += a * phaseRe - b * phaseIm;
        im[h] += a * phaseIm + b * phaseRe;
        double turned = phaseRe * turnRe - phaseIm * turnIm;
        phaseIm = phaseRe * turnIm + phaseIm * turnRe;
        phaseRe = turned;
      }
    }
    return new Spectrum(re, im);
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
  public double unwanted(RingPolarisation actual, RingPolarisation equalPieces) {
    double power = unwantedPower(spectrum(actual.minus(equalPieces)));
    double working = spectrum(actual).amplitude(layout.polePairs());
    return Math.sqrt(power) / (working / Math.sqrt(2));
  }

  /// Mean square of the harmonics that an ideal ring does not have, tesla squared.
  double unwantedPower(Spectrum spectrum) {
    double power = 0;
    for (int h = 0; h <= spectrum.highest(); h++) {
      if (!isIdeal(h)) {
        double square = spectrum.re(h) * spectrum.re(h) + spectrum.im(h) * spectrum.im(h);
        power += h == 0 ? square : 2 * square;
      }
    }
    return power;
  }
}
