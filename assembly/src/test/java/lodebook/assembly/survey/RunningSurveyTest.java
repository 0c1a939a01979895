package lodebook.assembly.survey;

import static java.util.Objects.requireNonNull;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.MutualMagnetisation;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.magnet.Strength;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/// A ring judged after every reading.
class RunningSurveyTest {
  private static final RingDesign TWELVE = Rings.blocks12(Rings.BOTH);
  private static final ProbeResponses RESPONSES = new ProbeResponses(TWELVE);
  private static final NamedFault FIFTH = new NamedFault(5, FaultKind.REVERSED);

  private static List<NamedFault> named(Diagnosis said) {
    return said.findings().stream().map(f -> new NamedFault(f.slot(), f.kind())).toList();
  }

  /// The log odds that the readings give the truth against a right ring and everything else, with
  /// everything weighed afresh.
  private static boolean allowed(SurveyedRing ring, List<Reading> readings) {
    Diagnosis said = new SurveyExplainer(ring, Priors.DEFAULT, RESPONSES).explain(readings);
    return said.verdict() == Verdict.FAULT && named(said).equals(List.of(FIFTH));
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4})
  void aReversedMagnetIsNamedAsSoonAsTheReadingsAllowIt(long seed) {
    RingTruth truth =
        new RingTruth(
            TWELVE, 12, List.of(Fault.of(4, FaultKind.REVERSED)), new SplittableRandom(seed));
    RunningSurvey running = new RunningSurvey(TWELVE, Priors.DEFAULT, RESPONSES);
    truth.recorded().magnets().forEach(running::place);
    List<Reading> read = new ArrayList<>();
    int first = 0;
    for (Reading reading : truth.read(12, Trials.METER, 0, 0)) {
      read.add(reading);
      Diagnosis said = running.read(reading);
      boolean flagged = said.verdict() == Verdict.FAULT && named(said).equals(List.of(FIFTH));
      assertEquals(allowed(truth.recorded(), read), flagged, said::toString);
      if (flagged && first == 0) {
        first = read.size();
      }
    }
    assertTrue(first > 0 && first <= 10, "after reading " + first + " of 24");
  }

  /// Every magnet is read right after it is put in, so every reading is of another ring.
  @Test
  void aRingReadWhileItIsFilledIsJudgedByWhatStoodThen() {
    RingDesign recoil = Rings.recoil12(Rings.BOTH);
    MutualMagnetisation mutual = MutualMagnetisation.of(recoil);
    for (long seed = 1; seed <= 3; seed++) {
      RunningSurvey running = new RunningSurvey(recoil, Priors.DEFAULT);
      Diagnosis said = null;
      int flagged = 0;
      for (int filled = 1; filled <= 12; filled++) {
        List<Fault> faults = filled < 5 ? List.of() : List.of(Fault.of(4, FaultKind.REVERSED));
        RingTruth truth = new RingTruth(recoil, mutual, filled, faults, new SplittableRandom(seed));
        PlacedMagnet magnet = truth.recorded().magnets().get(filled);
        running.place(filled, requireNonNull(magnet));
        for (Reading reading : truth.read(filled, Trials.METER, 0, 0)) {
          if (reading.slot() == filled) {
            said = running.read(reading);
            assertTrue(
                filled >= 5 || said.verdict() != Verdict.FAULT, "slot " + filled + " " + said);
            boolean named = said.verdict() == Verdict.FAULT && named(said).equals(List.of(FIFTH));
            flagged = named && flagged == 0 ? filled : flagged;
          }
        }
      }
      assertTrue(flagged == 5 || flagged == 6, "flagged at slot " + flagged + ", seed " + seed);
      assertEquals(List.of(FIFTH), named(requireNonNull(said)));
    }
  }

  @Test
  void whatIsOpenSaysWhichReadingWouldSettleIt() {
    RingTruth truth = new RingTruth(TWELVE, 12, List.of(), new SplittableRandom(1));
    RunningSurvey running = new RunningSurvey(TWELVE, Priors.DEFAULT, RESPONSES);
    truth.recorded().magnets().forEach(running::place);
    List<Reading> readings = truth.read(12, Trials.METER, 0, 0);
    Diagnosis said = running.read(readings.getFirst());
    assertEquals(Verdict.CANNOT_TELL, said.verdict());
    assertFalse(said.measureNext().isEmpty());
    for (Reading reading : readings.subList(1, readings.size())) {
      said = running.read(reading);
      assertTrue(said.verdict() != Verdict.FAULT, said::toString);
    }
    assertEquals(Verdict.PASS, said.verdict());
  }

  @Test
  void aSlotIsFilledOnce() {
    RunningSurvey running = new RunningSurvey(TWELVE, Priors.DEFAULT, RESPONSES);
    PlacedMagnet magnet = new PlacedMagnet(new Strength(1.3, 0.01), -0.0012);
    running.place(3, magnet);
    assertEquals(
        "slot 3 is filled already",
        assertThrows(IllegalArgumentException.class, () -> running.place(3, magnet)).getMessage());
    assertEquals(
        new ProbePoint(3, Spot.CENTRE, Component.RADIAL),
        new Reading(
                3,
                Spot.CENTRE,
                Component.RADIAL,
                0.1,
                StatedUnit.TESLA,
                null,
                null,
                null,
                Trials.METER)
            .point());
  }
}
