package lodebook.assembly.layout;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import lodebook.assembly.magnet.MagnetType;
import org.junit.jupiter.api.Test;

class LayoutRuleTest {
  private static List<String> faults(Layout layout, MagnetType type) {
    return new RingDesign(layout, type, null).faults();
  }

  @Test
  void theStirrersLayoutIsRight() {
    assertEquals(List.of(), Rings.stirrer().faults());
  }

  /// By hand: 12 slots, corners at (7, 2) mm; 7·tan 15° = 1.876, so 0.249 mm too much; 2/tan 15° +
  /// 2 = 9.4641.
  @Test
  void overlappingBlocks() {
    assertEquals(
        "layout STIR-IN rev A: slots 1 and 2 overlap by 0.25 mm at radius 7.00 mm; raise "
            + "slotRadiusMillimetres to at least 9.47",
        assertThrows(
                IllegalArgumentException.class,
                () ->
                    RingDesign.checked(
                        Rings.layout(3, 4, Focus.OUT, 9, 13), Rings.block(4, 4, 10), null))
            .getMessage());
  }

  /// By hand: rods of 5 mm on 12 slots need 2·R·sin 15° = 5, R = 9.659; at R = 9 they lack 0.341 mm
  /// across, 0.353 along the ring.
  @Test
  void overlappingRods() {
    assertEquals(
        List.of(
            "layout STIR-IN rev A: slots 1 and 2 overlap by 0.35 mm at radius 9.00 mm; raise "
                + "slotRadiusMillimetres to at least 9.66"),
        faults(Rings.layout(3, 4, Focus.OUT, 9, 13), Rings.rod(5, 10)).stream().toList());
  }

  /// By hand: at the outer corners 2·12·sin 0.5° = 0.209 mm across, 0.217 along the ring, at 12·cos
  /// 15.5°.
  @Test
  void overlappingArcs() {
    assertEquals(
        List.of(
            "layout STIR-IN rev A: slots 1 and 2 overlap by 0.22 mm at radius 11.56 mm; choose an "
                + "arc of at most 30° instead of type ARC"),
        faults(Rings.layout(3, 4, Focus.OUT, 10, 13), Rings.arc(8, 12, 31, 10)));
    assertEquals(
        List.of(), faults(Rings.layout(3, 4, Focus.OUT, 10, 13), Rings.arc(8, 12, 30, 10)));
  }

  @Test
  void arcsOffTheAxis() {
    assertEquals(
        List.of(
            "layout STIR-IN rev A: slotRadiusMillimetres is 11.00, but arc segments of type ARC "
                + "have their middle at 10.00 mm; set slotRadiusMillimetres to 10.00"),
        faults(Rings.layout(3, 4, Focus.OUT, 11, 14), Rings.arc(8, 12, 25, 10)));
  }

  /// By hand: the side magnet's thickness of 5.2 lies along the ring; its corner (R − 2, −2.6),
  /// turned by 30°, clears its neighbour's edge at 2 when R ≥ 2 + (2 + 2.6·cos 30°)/sin 30°.
  @Test
  void sideMagnetsStandAlongTheRing() {
    Layout layout = Rings.layout(3, 4, Focus.OUT, 10, 13);
    RingDesign design = new RingDesign(layout, Rings.block(4, 4, 10), Rings.block(5.2, 4, 10));
    assertEquals(
        List.of(
            "layout STIR-IN rev A: slots 1 and 2 overlap by 0.31 mm at radius 8.00 mm; raise "
                + "slotRadiusMillimetres to at least 10.51"),
        design.faults());
  }

  @Test
  void workingCircleAndProbeStayOutside() {
    assertEquals(
        List.of(
            "layout STIR-IN rev A: workingRadiusMillimetres 11.50 lies inside the magnets, which "
                + "reach from 8.00 to 12.17 mm; raise it to at least 12.17",
            "layout STIR-IN rev A: probe.radiusMillimetres 11.50 puts the probe inside the magnet "
                + "of slot 1; raise it to at least 12.17"),
        faults(Rings.layout(3, 4, Focus.OUT, 10, 11.5), Rings.block(4, 4, 10)));
  }

  @Test
  void turningBodiesRestrictFacings() {
    Layout turning = Rings.turning(Rings.layout(3, 4, Focus.OUT, 12, 16));
    assertEquals(
        List.of(
            "layout STIR-IN rev A: slot 2 would face 270°, but a block that is not square of type "
                + "BLK can only face 0° or 180° there; set bodyTurns to false, name a sideMagnetType "
                + "or choose square blocks or rods"),
        faults(turning, Rings.block(3, 4, 10)));
    assertEquals(List.of(), faults(turning, Rings.block(4, 4, 10)));
    assertEquals(
        List.of(), new RingDesign(turning, Rings.block(3, 4, 10), Rings.block(3, 4, 10)).faults());
  }

  @Test
  void segmentsPerPolePair() {
    assertEquals(
        List.of("layout STIR-IN rev A: segmentsPerPolePair is 7; it must be 2, 3, 4, 5, 6 or 8"),
        faults(Rings.layout(3, 7, Focus.OUT, 30, 36), Rings.block(4, 4, 10)));
  }
}
