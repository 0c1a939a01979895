package lodebook.assembly.layout;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class GearRuleTest {
  private static GearModel gear(int inner, int outer, int pieces, Member held) {
    return new GearModel(
        "G-1",
        "A",
        new RingDesign(Rings.layout(inner, 4, Focus.OUT, 40, 43), Rings.block(4, 4, 10), null),
        new RingDesign(Rings.layout(outer, 4, Focus.IN, 80, 76), Rings.block(4, 4, 10), null),
        pieces,
        held,
        0.045,
        0.050,
        0.010,
        null);
  }

  /// Atallah and Howe 2001, IEEE Trans. Magn. 37, 2844: 4 and 22 pole pairs with 26 pieces (from
  /// memory).
  @Test
  void ratios() {
    assertEquals(6.5, gear(4, 22, 26, Member.OUTER).ratio());
    assertEquals(-5.5, gear(4, 22, 26, Member.MODULATOR).ratio());
    assertEquals(26.0 / 22, gear(4, 22, 26, Member.INNER).ratio());
    assertEquals(4, gear(4, 12, 16, Member.OUTER).ratio());
  }

  /// Zhu and Howe 2000, IEEE Trans. Energy Convers. 15, 407 (from memory).
  @Test
  void coggingFactors() {
    assertEquals(2, gear(4, 22, 26, Member.OUTER).innerCoggingFactor());
    assertEquals(2, gear(4, 22, 26, Member.OUTER).outerCoggingFactor());
    assertEquals(8, gear(4, 12, 16, Member.OUTER).innerCoggingFactor());
    assertEquals(8, gear(4, 12, 16, Member.OUTER).outerCoggingFactor());
    assertEquals(1, gear(4, 11, 15, Member.OUTER).innerCoggingFactor());
    assertEquals(1, gear(4, 11, 15, Member.OUTER).outerCoggingFactor());
    assertEquals(
        Optional.of(new PolePairChoice(4, 11)), new PolePairChoice(4, 12).smootherNeighbour());
    assertEquals(Optional.empty(), new PolePairChoice(4, 11).smootherNeighbour());
  }

  @Test
  void roughGearIsWarnedOf() {
    assertEquals(
        List.of(
            "gear model G-1 rev A: runs roughly, cogging factors 8 (inner) and 8 (outer), 1 is "
                + "smoothest; 4 and 11 pole pairs with 15 pieces would run smoother (1 and 1)"),
        GearRule.warnings(gear(4, 12, 16, Member.OUTER)));
    assertEquals(List.of(), GearRule.warnings(gear(4, 11, 15, Member.OUTER)));
    assertEquals(List.of(), GearRule.faults(gear(4, 12, 16, Member.OUTER)));
  }

  @Test
  void numberOfPiecesIsTheSumOfPolePairs() {
    assertEquals(
        List.of(
            "gear model G-1 rev A: 17 modulator pieces, but 4 and 12 pole pairs need 16; set "
                + "modulatorPieces to 16"),
        GearRule.faults(gear(4, 12, 17, Member.OUTER)));
  }

  @Test
  void focusAndNesting() {
    GearModel right = gear(4, 12, 16, Member.OUTER);
    RingDesign small = right.inner();
    RingDesign large = right.outer();
    GearModel swapped =
        new GearModel("G-1", "A", large, small, 16, Member.OUTER, 0.045, 0.050, 0.010, null);
    assertEquals(
        List.of(
            "gear model G-1 rev A: the inner layout STIR-IN rev A focuses in; choose one with "
                + "\"focus\": \"out\"",
            "gear model G-1 rev A: the outer layout STIR-IN rev A focuses out; choose one with "
                + "\"focus\": \"in\"",
            "gear model G-1 rev A: the inner layout's magnets reach out to 82.02 mm, the iron "
                + "pieces begin at 45.00 mm; choose a smaller inner layout or raise "
                + "modulatorInnerRadiusMillimetres above 82.03",
            "gear model G-1 rev A: the iron pieces reach out to 50.00 mm, the outer layout's "
                + "magnets begin at 38.00 mm; lower modulatorOuterRadiusMillimetres below 38.00"),
        GearRule.faults(swapped));
  }
}
