package lodebook.assembly.field;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class LoadTest {
  private static PosedMagnet magnet(Body body, Vector3 centre, Vector3 polarisation) {
    return new PosedMagnet(new PosedBody(body, Pose.turnedAboutZ(centre, 0)), polarisation);
  }

  private static Vector3 up(double tesla) {
    return new Vector3(0, 0, tesla);
  }

  /// Geometry of Akoun and Yonnet 1984, IEEE Trans. Magn. 20, 1962 (from memory); the numbers by
  /// quadrature of an independent program, the published curve agrees to its reading.
  @ParameterizedTest
  @CsvSource({
    "0, 0.5884, 0.5884, -1.7736",
    "4, 0, 0.6376, -1.8534",
    "14, -1.1076, 0.3226, -0.6448",
    "20, -0.5671, 0.0573, 0.4102"
  })
  void twoParallelBlocks(double d, double x, double y, double z) {
    PosedMagnet fixed = magnet(new Block(0.020, 0.012, 0.006), Vector3.ZERO, up(0.38));
    Vector3 offset = new Vector3((-4 + d) / 1e3, -0.004, 0.008);
    PosedMagnet moved = magnet(new Block(0.012, 0.020, 0.006), offset, up(0.38));
    Vector3 force = Load.on(moved, List.of(fixed)).force();
    assertEquals(x, force.x(), 2e-4);
    assertEquals(y, force.y(), 2e-4);
    assertEquals(z, force.z(), 2e-4);
  }

  /// A general-purpose force code's test case (coaxial cylinders, radius 20, length 40, centres 50
  /// mm apart, 1.3 T), 265.537 N; quadrature 265.5371.
  @Test
  void coaxialCylinders() {
    Cylinder rod = new Cylinder(0.020, 0.040, Cylinder.Axis.Z);
    Load load =
        Load.on(
            magnet(rod, new Vector3(0, 0, 0.05), up(1.3)),
            List.of(magnet(rod, Vector3.ZERO, up(1.3))));
    assertEquals(-265.537, load.force().z(), 0.01);
    assertEquals(0, load.torque().norm(), 1e-9);
  }

  /// Quadrature of an independent program; the bound Br²A/2µ0 is 39.79 N.
  @Test
  void touchingCubesAndPlates() {
    assertEquals(32.38, touching(0.010), 0.005);
    assertEquals(12.06, touching(0.002), 0.005);
  }

  private static double touching(double thickness) {
    Block block = new Block(0.010, 0.010, thickness);
    return -Load.on(
            magnet(block, up(thickness), up(1)), List.of(magnet(block, Vector3.ZERO, up(1))))
        .force()
        .z();
  }

  /// What one does to the other comes back: forces cancel, and so do torques about one point.
  @Test
  void actionAndReaction() {
    PosedMagnet arc =
        magnet(
            new ArcSegment(0.010, 0.014, 0.5, 0.008),
            new Vector3(0.001, 0.0, 0.0),
            new Vector3(1.0, 0.3, 0.2));
    PosedMagnet rod =
        magnet(
            new Cylinder(0.002, 0.010, Cylinder.Axis.Z),
            new Vector3(0.007, 0.003, 0.001),
            new Vector3(-0.4, 0.9, 0.1));
    PosedMagnet disc =
        magnet(
            new Cylinder(0.003, 0.002, Cylinder.Axis.X),
            new Vector3(-0.006, 0.002, -0.001),
            new Vector3(1.2, 0, 0.3));
    for (List<PosedMagnet> pair :
        List.of(List.of(arc, rod), List.of(arc, disc), List.of(rod, disc))) {
      PosedMagnet a = pair.get(0);
      PosedMagnet b = pair.get(1);
      Load onA = Load.on(a, List.of(b));
      Load onB = Load.on(b, List.of(a));
      double size = onA.force().norm();
      assertEquals(0, onA.force().plus(onB.force()).norm(), 1e-4 * size);
      Vector3 total =
          onA.torque()
              .plus(a.place().pose().centre().cross(onA.force()))
              .plus(onB.torque())
              .plus(b.place().pose().centre().cross(onB.force()));
      assertEquals(0, total.norm(), 1e-4 * size * 0.01);
    }
  }
}
