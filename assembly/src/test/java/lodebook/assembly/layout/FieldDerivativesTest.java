package lodebook.assembly.layout;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/// Derivatives against moving the probe, or the whole ring, by hand.
class FieldDerivativesTest {
  private static final double STEP = 5e-6;

  private final RingDesign ring = Rings.stirrer();
  private final RingField field = new RingField(ring);
  private final RingPolarisation uneven =
      RingPolarisation.of(new Random(7).doubles(12, 1.2, 1.4).toArray(), ring.ruleFacings());

  private double read(double x, double y, double z, double angle, Component component) {
    double radius = Math.hypot(x, y);
    double turn = Math.atan2(y, x) - angle;
    double at = angle + turn;
    double[] both =
        field
            .at(
                List.of(
                    new ReadingPlace(radius, at, z, Component.RADIAL),
                    new ReadingPlace(radius, at, z, Component.TANGENTIAL)))
            .apply(uneven);
    return component == Component.RADIAL
        ? both[0] * Math.cos(turn) - both[1] * Math.sin(turn)
        : both[0] * Math.sin(turn) + both[1] * Math.cos(turn);
  }

  @Test
  void movingTheProbe() {
    double angle = 0.4;
    double c = Math.cos(angle);
    double s = Math.sin(angle);
    double x = 0.0133 * c;
    double y = 0.0133 * s;
    double z = 0.001;
    for (Component component : Component.values()) {
      FieldDerivatives slopes =
          field.derivatives(List.of(new ReadingPlace(0.0133, angle, z, component)));
      double out =
          (read(x + STEP * c, y + STEP * s, z, angle, component)
                  - read(x - STEP * c, y - STEP * s, z, angle, component))
              / (2 * STEP);
      double next =
          (read(x - STEP * s, y + STEP * c, z, angle, component)
                  - read(x + STEP * s, y - STEP * c, z, angle, component))
              / (2 * STEP);
      double up =
          (read(x, y, z + STEP, angle, component) - read(x, y, z - STEP, angle, component))
              / (2 * STEP);
      assertEquals(out, slopes.probeOut().apply(uneven)[0], 1e-3);
      assertEquals(next, slopes.probeNext().apply(uneven)[0], 1e-3);
      assertEquals(up, slopes.probeUp().apply(uneven)[0], 1e-3);
    }
  }

  /// Moving one magnet out is, for that magnet's part, moving the probe the other way.
  @Test
  void movingAMagnet() {
    ReadingPlace over = new ReadingPlace(0.013, 0, 0, Component.RADIAL);
    FieldDerivatives slopes = field.derivatives(List.of(over));
    assertEquals(-slopes.probeOut().perOut(0, 1), slopes.magnetOut().perOut(0, 1), 1e-9);
    assertEquals(-slopes.probeNext().perNext(0, 1), slopes.magnetNext().perNext(0, 1), 1e-9);
    RingDesign farther =
        new RingDesign(Rings.layout(3, 4, Focus.OUT, 10.005, 13), ring.mainType(), null);
    double moved = new RingField(farther).at(List.of(over)).apply(uneven)[0];
    double here = field.at(List.of(over)).apply(uneven)[0];
    assertEquals((moved - here) / 5e-6, slopes.magnetOut().apply(uneven)[0], 0.3);
  }
}
