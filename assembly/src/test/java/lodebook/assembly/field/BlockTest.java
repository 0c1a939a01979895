package lodebook.assembly.field;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class BlockTest {
  private static final Block CUBE = new Block(0.01, 0.01, 0.01);
  private static final Vector3 ALONG_X = new Vector3(1, 0, 0);

  /// The textbook closed form on the axis, with z from the pole face: B/Br = [atan(wl /
  /// (2z√(4z²+w²+l²))) − the same at z + t]/π; the number was computed from it twice.
  @Test
  void cubeOneMillimetreAboveItsFace() {
    double flux = CUBE.flux(new Vector3(0.006, 0, 0), ALONG_X).x();
    assertEquals(0.35665624, flux, 5e-9);
  }

  /// The same closed form far away, where the dipole gives 1.27323954e-6.
  @Test
  void cubeHalfAMetreAwayKeepsItsDigits() {
    double flux = CUBE.flux(new Vector3(0.5, 0, 0), ALONG_X).x();
    assertEquals(1.27323950e-6, flux, 1e-8 * 1.27323950e-6);
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.0051, 0.007, 0.02, 0.1, 0.259, 0.2605, 1})
  void blockOnItsAxisFollowsTheTextbook(double x) {
    Block block = new Block(0.004, 0.005, 0.017);
    double z = x - 0.002;
    double expected = (onAxis(z, 0.005, 0.017) - onAxis(z + 0.004, 0.005, 0.017)) / Math.PI;
    double flux = block.flux(new Vector3(x, 0, 0), ALONG_X).x();
    assertEquals(expected, flux, 1e-9 * expected + 1e-16);
  }

  private static double onAxis(double z, double w, double l) {
    return Math.atan(w * l / (2 * z * Math.sqrt(4 * z * z + w * w + l * l)));
  }

  /// A cube's middle is demagnetised by a third: B = 2/3 J.
  @Test
  void middleOfACube() {
    Vector3 flux = CUBE.flux(Vector3.ZERO, new Vector3(0.3, 0.6, 0.9));
    assertEquals(0.2, flux.x(), 1e-15);
    assertEquals(0.4, flux.y(), 1e-15);
    assertEquals(0.6, flux.z(), 1e-15);
  }

  @Test
  void edgesAndCornersAreFinite() {
    double[] f = new double[6];
    double h = 0.005;
    for (double[] p :
        new double[][] {{h, h, 0}, {h, h, h}, {h, 0, 0}, {h, h, 0.02}, {0, h, h}, {h, 0.02, h}}) {
      CUBE.fullTensor(p[0], p[1], p[2], f);
      for (double element : f) {
        assertTrue(Math.abs(element) < 10, "element " + element);
      }
    }
  }
}
