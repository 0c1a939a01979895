package lodebook.assembly.field;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/// Fields that others have published or computed.
class PublishedFieldsTest {
  private static final double MU0 = 4e-7 * Math.PI;
  private static final Vector3 POLARISATION = new Vector3(0.1, 0.2, 0.3);

  /// A general-purpose field library's documentation of its cylinder segment; quadrature agrees to
  /// every digit. Theory: Nielsen and Bjørk, J. Magn. Magn. Mater. 507, 166799 (arXiv 2004.11701).
  /// Radii 10 and 20, height 10, from 0° to 45°, at (20, 20, 20) mm.
  @Test
  void arcSegment() {
    double half = Math.PI / 8;
    ArcSegment arc = new ArcSegment(0.01, 0.02, Math.PI / 4, 0.01);
    Vector3 middle = new Vector3(0.015, 0, 0).turnedAboutZ(half);
    Vector3 flux =
        new PosedBody(arc, Pose.turnedAboutZ(middle, half))
            .flux(new Vector3(0.02, 0.02, 0.02), POLARISATION);
    assertEquals(807.847, flux.x() / MU0, 0.0006);
    assertEquals(1934.228, flux.y() / MU0, 0.0006);
    assertEquals(2741.168, flux.z() / MU0, 0.0006);
  }

  /// The same documentation's cylinder, axial and transverse magnetisation together: diameter 10,
  /// height 10, at (10, 10, 10) mm. Theory: Caciagli et al. 2018, J. Magn. Magn. Mater. 456, 423.
  @Test
  void cylinder() {
    Cylinder rod = new Cylinder(0.005, 0.01, Cylinder.Axis.Z);
    Vector3 flux = rod.flux(new Vector3(0.01, 0.01, 0.01), POLARISATION);
    assertEquals(4849.913, flux.x() / MU0, 0.0006);
    assertEquals(3883.178, flux.y() / MU0, 0.0006);
    assertEquals(2739.732, flux.z() / MU0, 0.0006);
  }

  /// Textbook closed form on a disc's axis: ½[(t+z)/√(R²+(t+z)²) − z/√(R²+z²)].
  @Test
  void discOnItsAxis() {
    double r = 0.004;
    double t = 0.003;
    for (double z : new double[] {0.0001, 0.001, 0.01, 0.1, 0.2}) {
      double expected = 0.5 * ((t + z) / Math.hypot(r, t + z) - z / Math.hypot(r, z));
      Cylinder disc = new Cylinder(r, t, Cylinder.Axis.X);
      Vector3 flux = disc.flux(new Vector3(t / 2 + z, 0, 0), new Vector3(1, 0, 0));
      assertEquals(expected, flux.x(), 1e-9 * expected + 1e-16);
    }
  }
}
