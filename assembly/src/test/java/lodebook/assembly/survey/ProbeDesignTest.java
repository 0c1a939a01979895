package lodebook.assembly.survey;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.magnet.Strength;
import org.junit.jupiter.api.Test;

class ProbeDesignTest {
  private static ProbeDesign design(RingDesign ring) {
    Map<Integer, PlacedMagnet> magnets = new HashMap<>();
    for (int slot = 1; slot <= ring.slots(); slot++) {
      magnets.put(slot, new PlacedMagnet(new Strength(1.3, 0.013), -0.0012));
    }
    return new ProbeDesign(new SurveyedRing(ring, magnets), Trials.METER);
  }

  @Test
  void bothComponentsOverEverySlotTellAll() {
    ProbeReport report = design(Rings.blocks12(Rings.BOTH)).ofLayout();
    assertEquals(24, report.points().size());
    assertTrue(report.tellsAll());
    assertTrue(report.worstSingle().errorRate() < 1e-6, report.worstSingle()::toString);
  }

  /// Each of the six magnets along the ring can be absent for right or for reversed (12), for
  /// another of them absent (15 pairs); each of the other six can be absent for turned a quarter
  /// either way (12).
  @Test
  void radialReadingsAloneLeaveAbsencesOpen() {
    ProbeReport report = design(Rings.blocks12(Rings.RADIAL)).ofLayout();
    assertFalse(report.tellsAll());
    assertTrue(report.pairsAlike().isEmpty());
    List<ToldApart> often =
        report.singlesAlike().stream().filter(t -> t.errorRate() > 0.01).toList();
    assertEquals(39, often.size(), often::toString);
    for (ToldApart alike : often) {
      List<NamedFault> both = new ArrayList<>(alike.one());
      both.addAll(alike.other());
      assertTrue(both.stream().anyMatch(f -> f.kind() == FaultKind.MISSING), alike::toString);
    }
  }

  /// Surveys of rings with slot 2 reversed, counted where slot 2 missing fits better.
  @Test
  void errorRatesAreThoseCounted() {
    RingDesign ring = Rings.blocks12(Rings.RADIAL);
    double stated =
        design(ring).ofLayout().singlesAlike().stream()
            .filter(t -> t.one().equals(List.of(new NamedFault(2, FaultKind.REVERSED))))
            .filter(t -> t.other().equals(List.of(new NamedFault(2, FaultKind.MISSING))))
            .findFirst()
            .orElseThrow()
            .errorRate();
    ProbeResponses responses = new ProbeResponses(ring);
    Explanation reversed = Explanation.NONE.with(Fault.of(1, FaultKind.REVERSED));
    Explanation missing = Explanation.NONE.with(Fault.of(1, FaultKind.MISSING));
    int trials = 400;
    int wrong = 0;
    for (int i = 0; i < trials; i++) {
      RingTruth truth = new RingTruth(ring, 12, reversed.faults(), new SplittableRandom(i));
      RowModel rows =
          new RowModel(
              new RingModel(truth.recorded(), responses),
              Slip.NONE.rows(truth.read(12, Trials.METER, 0, 0), ring.layout()));
      Judge judge = new Judge(rows, Priors.DEFAULT);
      double other = judge.judge(missing).logWeight() - missing.logPrior(Priors.DEFAULT);
      double right = judge.judge(reversed).logWeight() - reversed.logPrior(Priors.DEFAULT);
      wrong += other > right ? 1 : 0;
    }
    double counted = (double) wrong / trials;
    double sd = Math.sqrt(stated * (1 - stated) / trials);
    assertEquals(stated, counted, 3 * sd, "stated " + stated + ", counted " + counted);
  }

  @Test
  void fewerReadingsTellAllAndNoneCanBeLeftOut() {
    ProbeDesign design = design(Rings.blocks12(Rings.RADIAL));
    ProbeReport report = design.cheapest();
    assertTrue(report.tellsAll());
    assertTrue(report.points().size() <= 15, report.points()::toString);
    assertTrue(report.points().stream().anyMatch(p -> p.component() == Component.TANGENTIAL));
    for (ProbePoint point : report.points()) {
      List<ProbePoint> fewer = new ArrayList<>(report.points());
      fewer.remove(point);
      assertFalse(design.of(fewer).tellsAll(), () -> "without " + point);
    }
  }
}
