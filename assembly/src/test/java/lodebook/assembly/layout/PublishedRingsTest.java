package lodebook.assembly.layout;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/// Rings whose field others have published.
class PublishedRingsTest {

  /// Halbach 1980, Nucl. Instr. Meth. 169, 1; Bjørk et al. 2015, J. Magn. Magn. Mater. 384, 128
  /// (arXiv 1502.06700): infinitely long sectors, p pole pairs, focus in, amplitude of h = p at the
  /// inner radius: p/(p−1)·[1 − (Ri/Ro)^(p−1)] × sin((p+1)π/M)/((p+1)π/M); inside × (r/Ri)^(p−1).
  @ParameterizedTest
  @CsvSource({"4, 4, 0.79465", "2, 4, 0", "3, 6, 0", "5, 3, 0", "2, 8, 0"})
  void focusIn(int p, int k, double atTheInnerRadius) {
    int sectors = p * k;
    double x = (p + 1) * Math.PI / sectors;
    double expected = p / (p - 1.0) * (1 - Math.pow(2 / 3.0, p - 1)) * Math.sin(x) / x;
    if (atTheInnerRadius > 0) {
      assertEquals(atTheInnerRadius, expected, 5e-6);
    }
    double r = 17;
    assertEquals(expected * Math.pow(r / 20, p - 1), amplitude(p, k, Focus.IN, r), 2e-5 * expected);
  }

  /// The same theory, focus out, at the outer radius: p/(p+1)·[1 − (Ri/Ro)^(p+1)] ×
  /// sin((p−1)π/M)/((p−1)π/M); outside × (Ro/r)^(p+1).
  @ParameterizedTest
  @CsvSource({"1, 4", "2, 4", "3, 6", "4, 4", "3, 8"})
  void focusOut(int p, int k) {
    double x = (p - 1) * Math.PI / (p * k);
    double factor = p == 1 ? 1 : Math.sin(x) / x;
    double expected = p / (p + 1.0) * (1 - Math.pow(2 / 3.0, p + 1)) * factor;
    double r = 34;
    assertEquals(
        expected * Math.pow(30 / r, p + 1), amplitude(p, k, Focus.OUT, r), 2e-5 * expected);
  }

  private static double amplitude(int p, int k, Focus focus, double radius) {
    RingDesign ring =
        new RingDesign(
            Rings.layout(p, k, focus, 25, radius), Rings.arc(20, 30, 360.0 / (p * k), 20000), null);
    assertEquals(List.of(), ring.faults());
    return new WorkingCircle(ring).workingAmplitude(Rings.equal(ring.ruleFacings(), 1));
  }

  /// Blümler and Soltner 2023, Appl. Magn. Reson. (doi 10.1007/s00723-023-01602-2): dipoles on a
  /// circle of radius R and length L, on the axis at the middle, against a long ring L(6R² +
  /// L²)/(4R² + L²)^(3/2). Thin rods stand for the dipoles.
  @ParameterizedTest
  @CsvSource({"5, 0.35667", "20, 0.88388"})
  void shortRing(double length, double factor) {
    assertEquals(
        factor, length * (600 + length * length) / Math.pow(400 + length * length, 1.5), 5e-6);
    assertEquals(factor, atTheAxis(length) / atTheAxis(20000), 1e-3);
  }

  private static double atTheAxis(double length) {
    RingDesign ring =
        new RingDesign(Rings.layout(1, 8, Focus.IN, 10, 5), Rings.rod(0.2, length), null);
    ReadingPlace axis = new ReadingPlace(0, 0, 0, Component.RADIAL);
    return new RingField(ring).at(List.of(axis)).apply(Rings.equal(ring.ruleFacings(), 1))[0];
  }

  /// Trade, and two independent programs: in a complete ring of four per pole pair a magnet facing
  /// in or out is pressed towards the working side, one along the ring towards the other.
  @ParameterizedTest
  @CsvSource({"OUT, 1", "IN, -1"})
  void forcesInACompleteRing(Focus focus, int towardsWorkingSide) {
    RingDesign ring =
        new RingDesign(
            Rings.layout(3, 4, focus, 10, focus == Focus.OUT ? 13 : 7),
            Rings.block(4, 4, 10),
            null);
    RingLoad load = new RingLoad(ring, Rings.equal(ring.ruleFacings(), 1.3));
    assertTrue(load.on(1).force().x() * towardsWorkingSide > 0.1);
    assertTrue(load.on(3).force().x() * towardsWorkingSide > 0.1);
    assertTrue(load.on(2).force().x() * towardsWorkingSide < -0.1);
    assertEquals(0, load.on(2).force().y(), 1e-3);
    assertEquals(load.on(1).force().x(), load.on(7).force().x(), 1e-6);
  }

  /// The strong side's working wave is several times the weak side's (trade).
  @Test
  void strongSideIsTheWorkingSide() {
    RingDesign out =
        new RingDesign(Rings.layout(3, 4, Focus.OUT, 10, 13), Rings.block(4, 4, 10), null);
    RingDesign weak =
        new RingDesign(Rings.layout(3, 4, Focus.IN, 10, 13), Rings.block(4, 4, 10), null);
    double strong = new WorkingCircle(out).workingAmplitude(Rings.equal(out.ruleFacings(), 1.3));
    double faint = new WorkingCircle(weak).workingAmplitude(Rings.equal(weak.ruleFacings(), 1.3));
    assertTrue(strong > 3 * faint, strong + " against " + faint);
  }
}
