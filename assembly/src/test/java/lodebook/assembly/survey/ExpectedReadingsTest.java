package lodebook.assembly.survey;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.magnet.Strength;
import org.junit.jupiter.api.Test;

class ExpectedReadingsTest {
  private static final RingDesign TWELVE = Rings.blocks12(Rings.BOTH);

  private static SurveyedRing ring(int filled) {
    Map<Integer, PlacedMagnet> magnets = new HashMap<>();
    for (int slot = 1; slot <= filled; slot++) {
      magnets.put(slot, new PlacedMagnet(new Strength(1.3, 0.013), -0.0012));
    }
    return new SurveyedRing(TWELVE, magnets);
  }

  /// Two independent programs: a slot facing in reads −453.5 mT, one along the ring 357.8 mT.
  @Test
  void wholeRingReadsAsTwoOtherProgramsSay() {
    List<ExpectedReading> expected = new ExpectedReadings(ring(12), Trials.METER).all();
    assertEquals(24, expected.size());
    assertEquals(new ProbePoint(3, Spot.CENTRE, Component.RADIAL), expected.get(4).point());
    assertEquals(-0.4535, expected.get(4).valueTesla(), 5e-5);
    assertEquals(0.3578, expected.get(3).valueTesla(), 5e-5);
    assertTrue(expected.get(4).bandTesla() > 0.03 && expected.get(4).bandTesla() < 0.07);
  }

  @Test
  void aLoneMagnetReadsLessThanInTheWholeRing() {
    ExpectedReading alone = new ExpectedReadings(ring(1), Trials.METER).of(1).getFirst();
    ExpectedReading whole = new ExpectedReadings(ring(12), Trials.METER).of(1).getFirst();
    assertEquals(alone.point(), whole.point());
    assertTrue(alone.valueTesla() < 0.9 * whole.valueTesla(), alone + " and " + whole);
  }
}
