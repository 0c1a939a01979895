package lodebook.assembly.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.magnet.Strength;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/// The best plan there is, and bounds that no plan goes below.
class ProofTest {

  /// Every one of the 40 320 orders of eight pieces in eight slots is tried, in 100 instances.
  @Test
  void eightSlotsReachTheBestOfAllOrders() {
    for (int seed = 0; seed < 100; seed++) {
      int k = List.of(2, 4, 8).get(seed % 3);
      Layout layout = Examples.layout(8 / k, k, seed % 2 == 0 ? Focus.OUT : Focus.IN, null);
      List<Candidate> stock = Examples.lot("L", "MAIN", 8, 1.3, seed);
      RotorPlan plan =
          Examples.planner(RotorTask.of(layout, stock))
              .plan(seed, new Effort(20_000, () -> true, ratio -> {}));
      double best = bestOfAll(layout, stock);
      assertEquals(best, plan.unwantedHarmonics(), 1e-9 * best, "instance " + seed);
      assertEquals(plan.unwantedHarmonics(), plan.lowerBound(), "instance " + seed);
    }
  }

  /// Eight of ten: every choice and every order, 1.8 million, in one instance.
  @Test
  void eightOfTenReachTheBestOfAllChoices() {
    Layout layout = Examples.layout(2, 4, Focus.OUT, null);
    List<Candidate> stock = Examples.lot("L", "MAIN", 10, 1.3, 5);
    double best = bestOfAll(layout, stock);
    RotorPlan plan =
        Examples.planner(RotorTask.of(layout, stock))
            .plan(1, new Effort(20_000, () -> true, ratio -> {}));
    assertEquals(best, plan.unwantedHarmonics(), 1e-9 * best);
  }

  @ParameterizedTest
  @CsvSource({
    "3,4,12", "3,4,15", "4,3,12", "4,3,15", "6,2,12", "2,6,14", "2,8,16", "2,5,10", "5,4,20"
  })
  void noPlanGoesBelowTheBoundOfRelaxation(int p, int k, int pieces) {
    Layout layout = Examples.layout(p, k, Focus.OUT, null);
    for (int seed = 0; seed < 5; seed++) {
      SlotHarmonics ring = Examples.ring(layout).harmonics(Examples.ring(layout).ruleFacings());
      Puzzle puzzle = puzzle(ring, Examples.lot("L", "MAIN", pieces, 1.3, seed));
      HarmlessClasses classes = new HarmlessClasses(puzzle, k);
      Double bound = LowerBound.of(puzzle, classes);
      assertNotNull(bound);
      Effort effort = new Effort(400_000, () -> true, ratio -> {});
      double found = puzzle.unwanted(new Annealing(puzzle, classes, seed, effort).search());
      assertTrue(bound <= found, "seed " + seed + ": " + bound + " > " + found);
      assertTrue(bound > 0.5 * found, "seed " + seed + ": " + bound + " for " + found);
    }
  }

  @Test
  void fewEmptySlotsAmongKeptOnesAreProvenAsWell() {
    Layout layout = Examples.layout(6, 4, Focus.OUT, null);
    List<Candidate> stock = Examples.lot("L", "MAIN", 60, 1.3, 5);
    List<Kept> kept = new ArrayList<>();
    for (int slot = 1; slot <= 23; slot++) {
      Candidate in = stock.get(slot);
      kept.add(new Kept(slot, in.piece(), "L", layout.ruleFacing(slot), in.strength()));
    }
    List<Candidate> free = stock.subList(24, 32);
    RotorPlan plan =
        Examples.planner(new RotorTask(layout, free, List.of(), kept, MixPolicy.FEW, null))
            .plan(1, new Effort(1000, () -> true, ratio -> {}));
    DipoleRing ring = Examples.ring(layout);
    double best = Double.MAX_VALUE;
    for (Candidate each : free) {
      double[] strength = new double[24];
      double mean = each.strength().remanenceTesla() / 24;
      for (Kept in : kept) {
        Strength known = in.strength();
        strength[in.slot() - 1] = known.remanenceTesla();
        mean += known.remanenceTesla() / 24;
      }
      strength[23] = each.strength().remanenceTesla();
      double[] ideal = new double[24];
      Arrays.fill(ideal, mean);
      best = Math.min(best, ring.unwanted(strength, ring.ruleFacings(), ideal));
    }
    assertEquals(best, plan.unwantedHarmonics(), 1e-9 * best);
    assertEquals(plan.unwantedHarmonics(), plan.lowerBound());
  }

  private static Puzzle puzzle(SlotHarmonics ring, List<Candidate> stock) {
    HarmonicForm form = HarmonicForm.of(ring, ring, new int[ring.slots()]);
    double[] strength =
        stock.stream().mapToDouble(each -> each.strength().remanenceTesla()).toArray();
    int[] all = new int[strength.length];
    Arrays.setAll(all, i -> i);
    return new Puzzle(form, strength, new double[all.length], new int[][] {all}, 1, 10);
  }

  private static double bestOfAll(Layout layout, List<Candidate> stock) {
    SlotHarmonics ring = Examples.ring(layout).harmonics(Examples.ring(layout).ruleFacings());
    HarmonicForm form = HarmonicForm.of(ring, ring, new int[layout.slots()]);
    double[] strength =
        stock.stream().mapToDouble(each -> each.strength().remanenceTesla()).toArray();
    return best(form, strength, 0);
  }

  static double best(HarmonicForm form, double[] strength, int from) {
    if (from == form.slots) {
      return form.unwanted(strength);
    }
    double best = Double.MAX_VALUE;
    for (int i = from; i < strength.length; i++) {
      exchange(strength, from, i);
      best = Math.min(best, best(form, strength, from + 1));
      exchange(strength, from, i);
    }
    return best;
  }

  private static void exchange(double[] values, int i, int j) {
    double value = values[i];
    values[i] = values[j];
    values[j] = value;
  }
}
