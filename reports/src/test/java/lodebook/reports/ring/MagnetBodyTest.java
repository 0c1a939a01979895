package lodebook.reports.ring;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lodebook.assembly.layout.Facing;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Shape;
import lodebook.reports.Samples;
import org.junit.jupiter.api.Test;

final class MagnetBodyTest {
  private static final MagnetType PLATE = Samples.block(3, 5, 10);

  @Test
  void aBlockThatDoesNotTurnKeepsItsThicknessAlongTheRadius() {
    var bounds = MagnetBody.of(PLATE, Facing.TO_NEXT, false, false).outline().getBounds2D();
    assertEquals(3, bounds.getWidth(), 1e-9);
    assertEquals(5, bounds.getHeight(), 1e-9);
  }

  @Test
  void aSideMagnetLiesWithItsThicknessAlongTheRing() {
    var bounds = MagnetBody.of(PLATE, Facing.TO_NEXT, false, true).outline().getBounds2D();
    assertEquals(5, bounds.getWidth(), 1e-9);
    assertEquals(3, bounds.getHeight(), 1e-9);
  }

  @Test
  void aTurningBlockTurnsWithItsFacing() {
    var bounds = MagnetBody.of(PLATE, new Facing(45), true, false).outline().getBounds2D();
    assertEquals(8 / Math.sqrt(2), bounds.getWidth(), 1e-9);
    assertEquals(8 / Math.sqrt(2), bounds.getHeight(), 1e-9);
  }

  @Test
  void aDiscIsSeenFromItsSideAndARodFromItsEnd() {
    MagnetType disc = Samples.round(Shape.DISC, 2, 0, 6, 0, 0);
    var side = MagnetBody.of(disc, Facing.OUT, true, false).outline().getBounds2D();
    assertEquals(2, side.getWidth(), 1e-9);
    assertEquals(6, side.getHeight(), 1e-9);
    var rod = MagnetBody.of(Samples.round(Shape.ROD, 0, 10, 5, 0, 0), Facing.IN, true, false);
    assertTrue(rod.outline().contains(1.7, 1.7));
    assertFalse(rod.outline().contains(1.8, 1.8));
  }

  /// Outer radius 30, inner 20, 60°: the middle of its thickness is at the origin.
  @Test
  void anArcKeepsItsCurvature() {
    MagnetType arc = Samples.round(Shape.ARC, 0, 10, 60, 40, 60);
    var body = MagnetBody.of(arc, Facing.OUT, false, false);
    var bounds = body.outline().getBounds2D();
    assertEquals(5, bounds.getMaxX(), 0.01);
    assertEquals(20 * Math.cos(Math.PI / 6) - 25, bounds.getMinX(), 0.01);
    assertEquals(15, bounds.getMaxY(), 0.01);
    assertEquals(5, body.reach(0), 0.01);
    assertTrue(body.northHalf().contains(25 * Math.cos(0.4) - 24.5, 25 * Math.sin(0.4)));
    assertFalse(body.northHalf().contains(24.5 * Math.cos(0.4) - 25, 24.5 * Math.sin(0.4)));
  }
}
