package lodebook.assembly.layout;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class WorkingCircleTest {
  private static RingPolarisation equal(RingDesign ring, double remanence) {
    return Rings.equal(ring.ruleFacings(), remanence);
  }

  /// Two independent programs.
  @Test
  void stirrersWorkingWaveAndItsOwnHarmonics() {
    RingDesign ring = Rings.stirrer();
    Spectrum spectrum = new WorkingCircle(ring).spectrum(equal(ring, 1.3));
    assertEquals(424.8, 1e3 * spectrum.amplitude(3), 0.05);
    assertEquals(51.5, 1e3 * spectrum.amplitude(15), 0.05);
    assertEquals(27.6, 1e3 * spectrum.amplitude(27), 0.05);
  }

  /// Two independent programs: a short ring of blocks has h = 12 on its strong side, too; read at
  /// radius 16.
  @Test
  void anIdealRingsOwnHarmonicsAreNoAssemblyError() {
    RingDesign ring =
        new RingDesign(Rings.layout(4, 4, Focus.IN, 20, 16), Rings.block(5, 5, 10), null);
    WorkingCircle harmonics = new WorkingCircle(ring);
    RingPolarisation equal = equal(ring, 1.3);
    Spectrum spectrum = harmonics.spectrum(equal);
    assertEquals(0.0088, spectrum.amplitude(12) / spectrum.amplitude(4), 0.00005);
    assertEquals(0, harmonics.unwantedHarmonics(equal, equal), 1e-12);
  }

  /// The spectrum against plain sampling of the ring's readings.
  @Test
  void spectrumRebuildsTheField() {
    RingDesign ring = Rings.stirrer();
    Random random = new Random(4);
    double[] remanences = random.doubles(12, 1.2, 1.4).toArray();
    RingPolarisation uneven = RingPolarisation.of(remanences, ring.ruleFacings());
    Spectrum spectrum = new WorkingCircle(ring).spectrum(uneven);
    RingField field = new RingField(ring);
    for (int n = 0; n < 20; n++) {
      double angle = random.nextDouble(7);
      double sum = spectrum.re(0);
      for (int h = 1; h <= spectrum.highest(); h++) {
        sum += 2 * (spectrum.re(h) * Math.cos(h * angle) - spectrum.im(h) * Math.sin(h * angle));
      }
      ReadingPlace place = new ReadingPlace(0.013, angle, 0, Component.RADIAL);
      assertEquals(field.at(List.of(place)).apply(uneven)[0], sum, 1e-6);
    }
  }

  /// The definition by plain sums: Parseval's theorem over 2000 samples of the difference, less the
  /// waves that an ideal ring has.
  @Test
  void unwantedHarmonicsFollowTheirDefinition() {
    RingDesign ring = Rings.stirrer();
    double[] remanences = new Random(5).doubles(12, 1.25, 1.35).toArray();
    double mean = Arrays.stream(remanences).average().orElseThrow();
    RingPolarisation uneven = RingPolarisation.of(remanences, ring.ruleFacings());
    RingPolarisation equal = equal(ring, mean);
    List<ReadingPlace> places =
        IntStream.range(0, 2000)
            .mapToObj(n -> new ReadingPlace(0.013, 2 * Math.PI * n / 2000, 0, Component.RADIAL))
            .toList();
    FieldMatrix field = new RingField(ring).at(places);
    double[] difference = field.apply(uneven.minus(equal));
    double power = 0;
    for (double value : difference) {
      power += value * value / 2000;
    }
    for (int m = -80; m < 80; m++) {
      power -= 2 * square(difference, 3 * (1 + 4 * m));
    }
    double working = 2 * square(field.apply(uneven), 3);
    assertEquals(
        Math.sqrt(power / working), new WorkingCircle(ring).unwantedHarmonics(uneven, equal), 1e-6);
  }

  /// |c_h|² of samples; h and −h have the same.
  private static double square(double[] samples, int h) {
    double re = 0;
    double im = 0;
    for (int n = 0; n < samples.length; n++) {
      double angle = 2 * Math.PI * h * n / samples.length;
      re += samples[n] * Math.cos(angle) / samples.length;
      im += samples[n] * Math.sin(angle) / samples.length;
    }
    return re * re + im * im;
  }
}
