package lodebook.assembly.survey;

import static java.util.Objects.requireNonNull;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.layout.Spot;
import org.junit.jupiter.api.Test;

/// Two people, two meters, one ring.
class RepeatedSurveysTest {
  private static final RingDesign TWELVE = Rings.blocks12(Rings.BOTH);
  private static final ProbeResponses RESPONSES = new ProbeResponses(TWELVE);
  private static final Meter FIRST = new Meter("GM-1 in S-1", 0.01, 0.2e-3);
  private static final Meter SECOND = new Meter("GM-2 in S-2", 0.02, 0.5e-3);

  private static Map<String, List<Reading>> two(RingTruth truth, double secondGain) {
    Map<String, List<Reading>> surveys = new LinkedHashMap<>();
    surveys.put("S-1", truth.read(12, FIRST, 0.01, 0));
    surveys.put("S-2", truth.read(12, SECOND, secondGain, 0));
    return surveys;
  }

  private static RingTruth truth(List<Fault> faults, long seed) {
    return new RingTruth(TWELVE, 12, faults, new SplittableRandom(seed));
  }

  private static Diagnosis explain(RingTruth truth, Map<String, List<Reading>> surveys) {
    return new RepeatedSurveys(truth.recorded(), Priors.DEFAULT, RESPONSES).explain(surveys);
  }

  @Test
  void surveysThatAgreeAreOneSurvey() {
    for (long seed = 1; seed <= 20; seed++) {
      RingTruth right = truth(List.of(), seed);
      Diagnosis said = explain(right, two(right, -0.02));
      assertEquals(Verdict.PASS, said.verdict(), said::toString);
      assertEquals(List.of(), said.disagreements());
    }
  }

  @Test
  void aFaultIsSeenByBoth() {
    RingTruth reversed = truth(List.of(Fault.of(6, FaultKind.REVERSED)), 3);
    Diagnosis said = explain(reversed, two(reversed, 0.02));
    assertEquals(Verdict.FAULT, said.verdict());
    assertEquals(7, said.findings().getFirst().slot());
    assertEquals(List.of(), said.disagreements());
  }

  /// Between the surveys somebody turned a magnet and did not record it.
  @Test
  void whatChangedBetweenThemIsNamed() {
    RingTruth before = truth(List.of(), 4);
    RingTruth after = truth(List.of(Fault.of(8, FaultKind.REVERSED)), 4);
    Map<String, List<Reading>> surveys = new LinkedHashMap<>();
    surveys.put("S-1", before.read(12, FIRST, 0, 0));
    surveys.put("S-2", after.read(12, SECOND, 0, 0));
    Diagnosis said = explain(before, surveys);
    assertTrue(said.verdict() != Verdict.PASS, said::toString);
    Disagreement worst = said.disagreements().getFirst();
    assertEquals(9, worst.point().slot());
    assertEquals(List.of("S-1", "S-2"), worst.surveys());
    assertTrue(Math.abs(worst.differenceTesla()) > 3 * worst.bandTesla(), worst::toString);
    assertTrue(
        said.measureNext()
            .contains(new MeasureNext(worst.point(), MeasureNext.Why.READ_AGAIN, List.of())));
  }

  @Test
  void aRightRingDoesNotPassWhereOneReadingDiffers() {
    RingTruth right = truth(List.of(), 5);
    Map<String, List<Reading>> surveys = two(right, 0);
    List<Reading> second = new ArrayList<>(requireNonNull(surveys.get("S-2")));
    Reading old = second.get(4);
    second.set(4, RingTruth.withValue(old, old.fluxTesla() + 0.2));
    surveys.put("S-2", second);
    Diagnosis said = explain(right, surveys);
    assertEquals(Verdict.CANNOT_TELL, said.verdict());
    assertEquals(
        new ProbePoint(3, Spot.CENTRE, Component.RADIAL), said.disagreements().getFirst().point());
  }

  /// One of the two people had all signs inverted: freed of that, they agree.
  @Test
  void eachIsFreedOfItsOwnSlip() {
    RingTruth reversed = truth(List.of(Fault.of(2, FaultKind.REVERSED)), 6);
    Map<String, List<Reading>> surveys = two(reversed, 0);
    surveys.put(
        "S-2",
        reversed.read(12, SECOND, 0, 0).stream()
            .map(r -> RingTruth.withValue(r, -r.fluxTesla()))
            .toList());
    Diagnosis said = explain(reversed, surveys);
    assertEquals(Verdict.FAULT, said.verdict(), said::toString);
    assertEquals(3, said.findings().getFirst().slot());
    assertEquals(Measuring.Sign.INVERTED, said.measuring().sign());
    assertEquals(List.of(), said.disagreements());
  }
}
