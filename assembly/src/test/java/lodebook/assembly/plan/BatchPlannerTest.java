package lodebook.assembly.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.IntStream;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.magnet.Strength;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class BatchPlannerTest {

  @ParameterizedTest
  @ValueSource(ints = {2, 3, 4, 6})
  void rotorsAreAlikeAndLowInHarmonics(int k) {
    RingDesign design = Examples.design(Examples.layout(24 / k, k, Focus.OUT, null));
    BatchTask task =
        new BatchTask(
            rings(6, design), Examples.lot("L", "MAIN", 180, 1.3, k), List.of(), MixPolicy.FEW);
    BatchPlan plan = new BatchPlanner(task).plan(1, BatchPlanner.usualEffort(task));
    assertNoPieceTwiceAndTheRestLeftOver(task, plan);
    double planned = mean(plan, true);
    double asTheyCome = mean(plan, false);
    assertTrue(planned < 0.8 * asTheyCome, planned + " of " + asTheyCome);
    for (RotorPlan each : plan.plans().values()) {
      Double bound = each.lowerBound();
      assertNotNull(bound);
      assertTrue(bound <= each.unwantedHarmonics());
      assertTrue(each.withinTolerance());
    }
    Double spread = plan.amplitudeSpread().get("EX@A");
    assertNotNull(spread);
    assertTrue(spread < 0.001, "k = " + k + ": spread of amplitudes " + spread);
  }

  @Test
  void sameSeedSamePlans() {
    RingDesign design = Examples.design(Examples.layout(3, 4, Focus.OUT, null));
    BatchTask task =
        new BatchTask(
            rings(4, design), Examples.lot("L", "MAIN", 60, 1.3, 1), List.of(), MixPolicy.FEW);
    assertEquals(
        new BatchPlanner(task).plan(3, BatchPlanner.usualEffort(task)),
        new BatchPlanner(task).plan(3, BatchPlanner.usualEffort(task)));
  }

  /// Inner and outer rotors, side magnets, slots filled already, an unmeasured lot of side magnets.
  @Test
  void rotorsOfTwoLayoutsShareOneStock() {
    RingDesign inner = Examples.design(Examples.layout(2, 4, Focus.OUT, "SIDE"));
    Layout outerLayout = Examples.layout(5, 4, Focus.IN, null);
    RingDesign outer = Examples.design(outerLayout);
    Kept kept =
        new Kept(3, "K/1", "K", outerLayout.ruleFacing(3).turned(2), new Strength(1.31, 0.01));
    List<BatchTask.Ring> rings = new ArrayList<>(rings(3, inner));
    rings.add(new BatchTask.Ring("R-X", outer, List.of(kept)));
    List<Candidate> stock = new ArrayList<>(Examples.lot("A", "MAIN", 20, 1.3, 1));
    stock.addAll(Examples.lot("B", "MAIN", 20, 1.29, 2));
    LotSupply sides = new LotSupply("S", "SIDE", 30, new Strength(1.35, 0.02));
    BatchTask task = new BatchTask(rings, stock, List.of(sides), MixPolicy.FEW);
    assertEquals(List.of(), BatchPlanner.shortages(task));
    BatchPlan plan = new BatchPlanner(task).plan(1, BatchPlanner.usualEffort(task));
    assertNoPieceTwiceAndTheRestLeftOver(task, plan);
    RotorPlan last = plan.plans().get("R-X");
    assertNotNull(last);
    assertEquals(
        new Placement(3, "K/1", "K", kept.facing(), kept.strength(), true),
        last.placements().get(2));
  }

  @Test
  void eachRotorKeepsToOneLotWhereItCan() {
    RingDesign design = Examples.design(Examples.layout(3, 4, Focus.OUT, null));
    List<Candidate> stock = new ArrayList<>(Examples.lot("A", "MAIN", 30, 1.3, 1));
    stock.addAll(Examples.lot("B", "MAIN", 31, 1.3, 2));
    stock.addAll(Examples.lot("C", "MAIN", 11, 1.3, 3));
    BatchTask four = new BatchTask(rings(4, design), stock, List.of(), MixPolicy.FEW);
    BatchPlan plan = new BatchPlanner(four).plan(1, BatchPlanner.usualEffort(four));
    assertEquals(
        List.of(List.of("B"), List.of("A"), List.of("B"), List.of("A")),
        plan.plans().values().stream().map(RotorPlan::lots).toList());
    BatchTask never = new BatchTask(rings(5, design), stock, List.of(), MixPolicy.NEVER);
    assertEquals(List.of(new Shortage("MAIN", 60, 48)), BatchPlanner.shortages(never));
    BatchTask five = new BatchTask(rings(5, design), stock, List.of(), MixPolicy.FEW);
    BatchPlan mixed = new BatchPlanner(five).plan(1, BatchPlanner.usualEffort(five));
    assertEquals(
        4, mixed.plans().values().stream().filter(each -> each.lots().size() == 1).count());
    assertNoPieceTwiceAndTheRestLeftOver(five, mixed);
  }

  @Test
  void shortPiecesAreCountedBeforePlanning() {
    RingDesign design = Examples.design(Examples.layout(3, 4, Focus.OUT, "SIDE"));
    BatchTask task =
        new BatchTask(
            rings(4, design), Examples.lot("A", "MAIN", 23, 1.3, 1), List.of(), MixPolicy.FEW);
    assertEquals(
        "pieces are short for the batch: [Shortage[type=MAIN, needed=24, available=23],"
            + " Shortage[type=SIDE, needed=24, available=0]]",
        assertThrows(
                IllegalArgumentException.class,
                () -> new BatchPlanner(task).plan(1, BatchPlanner.usualEffort(task)))
            .getMessage());
  }

  /// 50 rotors of 48 slots from 3 000 pieces.
  @Test
  @Tag("slow")
  void aLargeBatchIsPlannedInTime() {
    RingDesign design = Examples.design(Examples.layout(12, 4, Focus.OUT, null));
    BatchTask task =
        new BatchTask(
            rings(50, design), Examples.lot("L", "MAIN", 3000, 1.3, 1), List.of(), MixPolicy.FEW);
    long began = System.nanoTime();
    BatchPlan plan = new BatchPlanner(task).plan(1, BatchPlanner.usualEffort(task));
    double seconds = (System.nanoTime() - began) / 1e9;
    assertNoPieceTwiceAndTheRestLeftOver(task, plan);
    assertEquals(600, plan.leftOver().size());
    assertTrue(seconds < 60, seconds + " s");
    assertTrue(mean(plan, true) < 0.05 * mean(plan, false), "harmonics " + mean(plan, true));
  }

  private static List<BatchTask.Ring> rings(int count, RingDesign design) {
    return IntStream.rangeClosed(1, count)
        .mapToObj(i -> new BatchTask.Ring("R-" + i, design, List.of()))
        .toList();
  }

  private static double mean(BatchPlan plan, boolean planned) {
    return plan.plans().values().stream()
        .mapToDouble(each -> planned ? each.unwantedHarmonics() : each.asTheyCome())
        .average()
        .orElseThrow();
  }

  private static void assertNoPieceTwiceAndTheRestLeftOver(BatchTask task, BatchPlan plan) {
    Map<String, Candidate> stock = new HashMap<>();
    task.candidates().forEach(each -> stock.put(each.piece(), each));
    Set<String> used = new HashSet<>();
    for (BatchTask.Ring ring : task.rings()) {
      RotorPlan rotor = plan.plans().get(ring.rotor());
      assertNotNull(rotor);
      Layout layout = ring.design().layout();
      assertEquals(layout.slots(), rotor.placements().size());
      for (Placement placed : rotor.placements()) {
        if (!placed.kept()) {
          assertEquals(layout.ruleFacing(placed.slot()), placed.facing());
        }
        if (!placed.kept() && placed.piece() != null) {
          Candidate piece = stock.get(placed.piece());
          assertNotNull(piece);
          assertEquals(layout.typeAt(placed.slot()), piece.type());
          assertTrue(used.add(placed.piece()), placed.piece() + " twice");
        }
      }
    }
    assertEquals(
        stock.size() - used.size(), plan.leftOver().size(), "left over: " + plan.leftOver());
    assertTrue(plan.leftOver().stream().noneMatch(used::contains));
  }
}
