package lodebook.assembly.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.RingDesign;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/// Pieces that must be used, and lots that must not meet.
class WishesTest {
  private static final Layout TWELVE = Examples.layout(3, 4, Focus.OUT, null);

  /// The weakest and the strongest of sixteen, which no plan would take by itself.
  @ParameterizedTest
  @ValueSource(ints = {8, 12})
  void wishedPiecesAreInTheRing(int slots) {
    Layout layout = Examples.layout(slots / 4, 4, Focus.OUT, null);
    List<Candidate> stock = Examples.lot("L", "MAIN", 16, 1.3, 5);
    List<String> byStrength =
        stock.stream()
            .sorted(Comparator.comparingDouble(each -> each.strength().remanenceTesla()))
            .map(Candidate::piece)
            .toList();
    Set<String> wished = Set.of(byStrength.getFirst(), byStrength.getLast());
    RotorTask task =
        new RotorTask(
            layout, stock, List.of(), List.of(), MixPolicy.FEW, null, wished, LotsApart.NONE);
    RotorPlanner planner = Examples.planner(task);
    RotorPlan plan = planner.plan(1, new Effort(50_000, () -> true, ratio -> {}));
    assertTrue(used(plan).containsAll(wished), plan.toString());
    RotorPlan without =
        Examples.planner(RotorTask.of(layout, stock))
            .plan(1, new Effort(50_000, () -> true, ratio -> {}));
    assertTrue(used(without).stream().noneMatch(wished::contains), without.toString());
    assertTrue(plan.unwantedHarmonics() > without.unwantedHarmonics());
    Double bound = plan.lowerBound();
    assertTrue(bound != null && bound <= plan.unwantedHarmonics());
  }

  /// Of ten pieces two must be among eight: every choice and order that has them is tried.
  @Test
  void theBestPlanWithWishedPiecesIsProven() {
    Layout layout = Examples.layout(2, 4, Focus.OUT, null);
    List<Candidate> stock = Examples.lot("L", "MAIN", 9, 1.3, 7);
    SlotHarmonics ring = Examples.ring(layout).harmonics(Examples.ring(layout).ruleFacings());
    HarmonicForm form = HarmonicForm.of(ring, ring, new int[8]);
    for (Candidate out : List.of(stock.get(0), stock.get(4), stock.get(8))) {
      Set<String> wished =
          stock.stream()
              .map(Candidate::piece)
              .filter(each -> !each.equals(out.piece()))
              .collect(Collectors.toSet());
      RotorTask task =
          new RotorTask(
              layout, stock, List.of(), List.of(), MixPolicy.FEW, null, wished, LotsApart.NONE);
      RotorPlan plan = Examples.planner(task).plan(1, new Effort(20_000, () -> true, r -> {}));
      assertEquals(wished, used(plan));
      double[] strength =
          stock.stream()
              .filter(each -> !each.equals(out))
              .mapToDouble(each -> each.strength().remanenceTesla())
              .toArray();
      double best = ProofTest.best(form, strength, 0);
      assertEquals(best, plan.unwantedHarmonics(), 1e-9 * best, "without " + out.piece());
    }
  }

  @Test
  void wishesThatCannotBeAreRefused() {
    List<Candidate> stock = Examples.lot("L", "MAIN", 30, 1.3, 5);
    assertEquals(
        "a piece that is wished is not offered",
        assertThrows(IllegalArgumentException.class, () -> wishing(stock, Set.of("L/99")))
            .getMessage());
    Set<String> thirteen =
        stock.stream().limit(13).map(Candidate::piece).collect(Collectors.toSet());
    assertEquals(
        "13 pieces of type MAIN are wished for 12 empty slots",
        assertThrows(IllegalArgumentException.class, () -> wishing(stock, thirteen)).getMessage());
  }

  private static RotorTask wishing(List<Candidate> stock, Set<String> wished) {
    return new RotorTask(
        TWELVE, stock, List.of(), List.of(), MixPolicy.FEW, null, wished, LotsApart.NONE);
  }

  /// Freely mixed the best plan takes pieces of all three lots.
  @ParameterizedTest
  @EnumSource(
      value = MixPolicy.class,
      names = {"FEW", "FREE"})
  void lotsApartNeverMeet(MixPolicy mix) {
    List<Candidate> stock = new ArrayList<>(Examples.lot("A", "MAIN", 8, 1.3, 1));
    stock.addAll(Examples.lot("B", "MAIN", 9, 1.3, 2));
    stock.addAll(Examples.lot("C", "MAIN", 7, 1.3, 3));
    LotsApart apart = new LotsApart(List.of(Set.of("A", "B")));
    RotorTask task = new RotorTask(TWELVE, stock, List.of(), List.of(), mix, null, Set.of(), apart);
    RotorPlan plan = Examples.planner(task).plan(1, new Effort(50_000, () -> true, ratio -> {}));
    assertEquals(2, plan.lots().size());
    assertTrue(plan.lots().contains("C"), plan.toString());
    RotorTask all =
        new RotorTask(
            TWELVE,
            stock,
            List.of(),
            List.of(),
            mix,
            null,
            Set.of(),
            new LotsApart(List.of(Set.of("A", "B", "C"))));
    assertEquals(List.of(new Shortage("MAIN", 12, 9)), RotorPlanner.shortages(all));
  }

  @Test
  void inABatchEachRotorHasItsOwnPiecesAndNoLotsThatAreApart() {
    RingDesign design = Examples.design(TWELVE);
    List<BatchTask.Ring> rings =
        IntStream.rangeClosed(1, 4)
            .mapToObj(i -> new BatchTask.Ring("R-" + i, design, List.of()))
            .toList();
    List<Candidate> stock = new ArrayList<>();
    for (String lot : List.of("A", "B", "C", "D")) {
      stock.addAll(Examples.lot(lot, "MAIN", 17, 1.3, lot.charAt(0)));
    }
    Map<String, String> wished =
        Map.of("A/0003", "R-2", "A/0007", "R-2", "B/0001", "R-3", "D/0017", "R-4");
    LotsApart apart = new LotsApart(List.of(Set.of("A", "B"), Set.of("C", "D")));
    for (MixPolicy mix : List.of(MixPolicy.FEW, MixPolicy.FREE, MixPolicy.NEVER)) {
      BatchTask task = new BatchTask(rings, stock, List.of(), mix, wished, apart);
      assertEquals(List.of(), BatchPlanner.shortages(task));
      BatchPlan plan = new BatchPlanner(task).plan(1, BatchPlanner.usualEffort(task));
      Map<String, String> rotorOf = new HashMap<>();
      plan.plans().forEach((rotor, each) -> used(each).forEach(piece -> rotorOf.put(piece, rotor)));
      assertEquals(48, rotorOf.size(), "a piece is used twice");
      wished.forEach((piece, rotor) -> assertEquals(rotor, rotorOf.get(piece), piece));
      for (RotorPlan each : plan.plans().values()) {
        assertTrue(apart.allow(Set.copyOf(each.lots()), Set.of()), mix + ": " + each.lots());
        assertTrue(mix != MixPolicy.NEVER || each.lots().size() == 1, each.lots().toString());
      }
    }
  }

  /// Three lots of eleven serve two rotors of twelve: each takes two lots, not three.
  @Test
  void aRotorOfABatchThatNoLotCanFillTakesTwoLots() {
    RingDesign design = Examples.design(TWELVE);
    List<Candidate> stock = new ArrayList<>();
    for (String lot : List.of("A", "B", "C")) {
      stock.addAll(Examples.lot(lot, "MAIN", 11, 1.3, lot.charAt(0)));
    }
    List<BatchTask.Ring> rings =
        List.of(
            new BatchTask.Ring("R-1", design, List.of()),
            new BatchTask.Ring("R-2", design, List.of()));
    BatchTask task = new BatchTask(rings, stock, List.of(), MixPolicy.FEW);
    BatchPlan plan = new BatchPlanner(task).plan(1, BatchPlanner.usualEffort(task));
    for (String rotor : List.of("R-1", "R-2")) {
      RotorPlan each = plan.plans().get(rotor);
      assertNotNull(each);
      assertEquals(2, each.lots().size(), each.lots().toString());
    }
  }

  private static Set<String> used(RotorPlan plan) {
    return plan.placements().stream()
        .map(each -> String.valueOf(each.piece()))
        .collect(Collectors.toSet());
  }
}
