package lodebook.assembly.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.Set;
import java.util.stream.Stream;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.InsertFrom;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Numbering;
import lodebook.assembly.magnet.Strength;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class RotorPlannerTest {
  private static final Layout TWELVE = Examples.layout(3, 4, Focus.OUT, null);

  /// The stated value against fields summed dipole by dipole, with harmonics left out one by one.
  @ParameterizedTest
  @CsvSource({
    "3,4,OUT", "3,4,IN", "6,2,OUT", "4,3,IN", "2,5,OUT", "2,6,IN", "2,8,OUT", "2,8,IN", "1,4,IN"
  })
  void statedHarmonicsAndAmplitudeAreThoseOfTheField(int p, int k, Focus focus) {
    Layout layout = Examples.layout(p, k, focus, null);
    RotorTask task = RotorTask.of(layout, Examples.lot("L", "MAIN", p * k + 3, 1.3, 1));
    RotorPlan plan = Examples.planner(task).plan(1, small());
    DipoleRing ring = Examples.ring(layout);
    double[] strengths = strengths(plan);
    double[] mean = new double[strengths.length];
    Arrays.fill(mean, Arrays.stream(strengths).average().orElseThrow());
    double judged = ring.unwanted(strengths, ring.ruleFacings(), mean);
    assertEquals(judged, plan.unwantedHarmonics(), 1e-9 * judged);
    assertEquals(
        ring.workingAmplitude(ring.radialField(strengths, ring.ruleFacings())),
        plan.workingAmplitudeTesla(),
        1e-12);
    assertTrue(plan.unwantedHarmonics() < 0.7 * plan.asTheyCome(), plan.toString());
  }

  /// Everything a plan must hold, on random tasks: types, kept slots, facings, no piece twice.
  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16, 17, 18, 19, 20})
  void everyPlanHoldsTheRules(long seed) {
    Random random = new Random(seed);
    int[] segments = {2, 3, 4, 5, 6, 8};
    int k = segments[random.nextInt(segments.length)];
    Layout layout =
        Examples.layout(
            1 + random.nextInt(3),
            k,
            random.nextBoolean() ? Focus.IN : Focus.OUT,
            random.nextBoolean() ? "SIDE" : null);
    List<Candidate> stock = new ArrayList<>(Examples.lot("A", "MAIN", 2 * k + 3, 1.3, seed));
    stock.addAll(Examples.lot("B", "MAIN", 2 * k, 1.28, seed + 1));
    stock.addAll(Examples.lot("C", "SIDE", 3 * k, 1.35, seed + 2));
    stock.addAll(Examples.lot("D", "OTHER", 9, 1.4, seed + 3));
    List<Kept> kept = new ArrayList<>();
    for (int slot = 1; slot <= layout.slots(); slot++) {
      if (random.nextInt(4) == 0) {
        kept.add(
            new Kept(
                slot,
                "K/" + slot,
                "K",
                layout.ruleFacing(slot).turned(3 * random.nextGaussian()),
                new Strength(1.3, 0.01)));
      }
    }
    RotorTask task = new RotorTask(layout, stock, List.of(), kept, MixPolicy.FREE, null);
    RotorPlan plan = Examples.planner(task).plan(seed, small());
    String context = "seed " + seed + ": " + plan;
    Map<String, Candidate> byName = new HashMap<>();
    stock.forEach(each -> byName.put(each.piece(), each));
    Set<String> used = new HashSet<>();
    for (int slot = 1; slot <= layout.slots(); slot++) {
      Placement placed = plan.placements().get(slot - 1);
      int number = slot;
      assertEquals(slot, placed.slot(), context);
      Kept before = kept.stream().filter(each -> each.slot() == number).findAny().orElse(null);
      if (before != null) {
        assertEquals(
            new Placement(
                slot, before.piece(), before.lot(), before.facing(), before.strength(), true),
            placed,
            context);
      } else {
        Candidate piece = byName.get(String.valueOf(placed.piece()));
        assertNotNull(piece, context);
        assertEquals(layout.typeAt(slot), piece.type(), context);
        assertEquals(piece.strength(), placed.strength(), context);
        assertEquals(layout.ruleFacing(slot), placed.facing(), context);
        assertTrue(used.add(piece.piece()), context);
      }
    }
  }

  /// f_i = f_1 ± (i − 1)·360°/k, plus with focus in, minus with focus out, whatever the numbering.
  @ParameterizedTest
  @ValueSource(ints = {2, 3, 4, 5, 6, 8})
  void everyFacingIsByTheRule(int k) {
    for (Focus focus : Focus.values()) {
      for (Numbering numbering : Numbering.values()) {
        for (double first : new double[] {0, 90, 180}) {
          Layout layout = numbered(Examples.layout(2, k, focus, null), numbering, first);
          RotorTask task = RotorTask.of(layout, Examples.lot("L", "MAIN", 2 * k + 2, 1.3, k));
          RotorPlan plan =
              RotorPlanner.of(Examples.design(layout), task)
                  .plan(1, new Effort(1000, () -> true, ratio -> {}));
          for (Placement each : plan.placements()) {
            double sense = focus == Focus.IN ? 1 : -1;
            double facing = first + sense * (each.slot() - 1) * 360.0 / k;
            assertEquals(
                0,
                Math.IEEEremainder(facing - each.facing().degrees(), 360),
                1e-9,
                () -> layout + ": " + each);
          }
        }
      }
    }
  }

  private static Layout numbered(Layout plain, Numbering numbering, double firstFacing) {
    return new Layout(
        plain.code(),
        plain.revision(),
        plain.polePairs(),
        plain.segmentsPerPolePair(),
        plain.focus(),
        numbering,
        30,
        new Facing(firstFacing),
        plain.slotRadiusMetres(),
        plain.magnetType(),
        plain.sideMagnetType(),
        plain.workingRadiusMetres(),
        plain.probe(),
        plain.spread(),
        "",
        null,
        false,
        InsertFrom.FACE,
        0.03);
  }

  @Test
  void sameSeedSamePlan() {
    RotorTask task = RotorTask.of(TWELVE, Examples.lot("L", "MAIN", 15, 1.3, 3));
    assertEquals(Examples.planner(task).plan(7, small()), Examples.planner(task).plan(7, small()));
  }

  @Test
  void aDeadlineKeepsTheBestSoFar() {
    RotorTask task = RotorTask.of(TWELVE, Examples.lot("L", "MAIN", 12, 1.3, 3));
    RotorPlan plan = Examples.planner(task).plan(1, Effort.seconds(12, 1000).whilst(() -> false));
    assertTrue(plan.unwantedHarmonics() < plan.asTheyCome(), plan.toString());
  }

  @Test
  void shortPiecesAreCountedByTypeBeforePlanning() {
    Layout layout = Examples.layout(3, 4, Focus.OUT, "SIDE");
    List<Candidate> stock = new ArrayList<>(Examples.lot("A", "MAIN", 4, 1.3, 1));
    stock.addAll(Examples.lot("B", "MAIN", 3, 1.3, 2));
    stock.addAll(Examples.lot("C", "SIDE", 1, 1.3, 3));
    RotorTask few = RotorTask.of(layout, stock);
    assertEquals(List.of(new Shortage("SIDE", 6, 1)), RotorPlanner.shortages(few));
    assertEquals(
        List.of(new Shortage("MAIN", 6, 4), new Shortage("SIDE", 6, 1)),
        RotorPlanner.shortages(few.withMix(MixPolicy.NEVER)));
    IllegalArgumentException refused =
        assertThrows(IllegalArgumentException.class, () -> Examples.planner(few).plan(1, small()));
    assertEquals(
        "pieces are short for EX@A: [Shortage[type=SIDE, needed=6, available=1]]",
        refused.getMessage());
  }

  @Test
  void fewTakesOneLotWhereOneIsEnoughAndStatesThePrice() {
    List<Candidate> stock = new ArrayList<>(Examples.lot("A", "MAIN", 8, 1.3, 1));
    stock.addAll(Examples.lot("B", "MAIN", 12, 1.3, 2));
    stock.addAll(Examples.lot("C", "MAIN", 9, 1.3, 3));
    RotorPlan few = Examples.planner(RotorTask.of(TWELVE, stock)).plan(1, small());
    assertEquals(List.of("B"), few.lots());
    Double free = few.freelyMixed();
    assertNotNull(free);
    assertTrue(free < few.unwantedHarmonics(), few.toString());
    RotorPlan mixed =
        Examples.planner(RotorTask.of(TWELVE, stock).withMix(MixPolicy.FREE)).plan(1, small());
    assertNull(mixed.freelyMixed());
    assertEquals(free, mixed.unwantedHarmonics(), 0.15 * free);
  }

  /// Three magnets per pole pair: with four, the weaker lot along the ring would cost nothing.
  @Test
  void ofTwoPairsOfLotsThatSufficeTheBetterIsTaken() {
    Layout threes = Examples.layout(4, 3, Focus.OUT, null);
    List<Candidate> stock = new ArrayList<>(Examples.lot("A", "MAIN", 7, 1.3, 1));
    stock.addAll(Examples.lot("FAR", "MAIN", 7, 1.15, 2));
    stock.addAll(Examples.lot("B", "MAIN", 7, 1.3, 3));
    RotorTask task = new RotorTask(threes, stock, List.of(), List.of(), MixPolicy.FEW, null);
    assertEquals(List.of("A", "B"), Examples.planner(task).plan(1, small()).lots());
  }

  @Test
  void lotsInPlaceAreDrawnFromFirst() {
    List<Candidate> stock = new ArrayList<>(Examples.lot("A", "MAIN", 12, 1.3, 1));
    stock.addAll(Examples.lot("B", "MAIN", 11, 1.3, 2));
    Kept kept = new Kept(5, "B/0099", "B", TWELVE.ruleFacing(5), new Strength(1.31, 0.01));
    RotorTask task = new RotorTask(TWELVE, stock, List.of(), List.of(kept), MixPolicy.FEW, null);
    assertEquals(List.of("B"), Examples.planner(task).plan(1, small()).lots());
  }

  @Test
  void anUnmeasuredLotIsPlacedByTheRuleWithTheSpreadItLetsExpect() {
    RotorTask task =
        new RotorTask(
            TWELVE,
            List.of(),
            List.of(new LotSupply("U", "MAIN", 40, new Strength(1.3, 0.0195))),
            List.of(),
            MixPolicy.FEW,
            null);
    RotorPlan plan = Examples.planner(task).plan(1, small());
    assertNull(plan.lowerBound());
    for (Placement placed : plan.placements()) {
      assertEquals(
          new Placement(
              placed.slot(),
              null,
              "U",
              TWELVE.ruleFacing(placed.slot()),
              new Strength(1.3, 0.0195),
              false),
          placed);
    }
    double sum = 0;
    for (int seed = 0; seed < 12; seed++) {
      double asTheyCome =
          Examples.planner(RotorTask.of(TWELVE, Examples.lot("L", "MAIN", 12, 1.3, seed)))
              .plan(1, new Effort(1, () -> true, ratio -> {}))
              .asTheyCome();
      sum += asTheyCome * asTheyCome;
    }
    assertEquals(Math.sqrt(sum / 12), plan.unwantedHarmonics(), 0.2 * plan.unwantedHarmonics());
  }

  @Test
  void aReversedMagnetInPlaceCountsAsUnwanted() {
    Facing wrong = TWELVE.ruleFacing(4).reversed();
    Kept kept = new Kept(4, "X/1", "X", wrong, new Strength(1.3, 0.01));
    List<Candidate> stock = Examples.lot("L", "MAIN", 11, 1.3, 3);
    RotorTask task = new RotorTask(TWELVE, stock, List.of(), List.of(kept), MixPolicy.FEW, null);
    RotorPlan plan = Examples.planner(task).plan(1, small());
    DipoleRing ring = Examples.ring(TWELVE);
    double[] facings = ring.ruleFacings();
    facings[3] = wrong.degrees();
    double[] strengths = strengths(plan);
    double[] mean = new double[12];
    Arrays.fill(mean, Arrays.stream(strengths).average().orElseThrow());
    double judged = ring.unwanted(strengths, facings, mean);
    assertEquals(judged, plan.unwantedHarmonics(), 1e-9);
    assertTrue(judged > 0.1, "a reversed magnet is no small error: " + judged);
  }

  @Test
  void aWantedAmplitudeOutOfReachIsSaid() {
    List<Candidate> stock = Examples.lot("L", "MAIN", 14, 1.3, 3);
    RotorPlan free = Examples.planner(RotorTask.of(TWELVE, stock)).plan(1, small());
    assertTrue(free.withinTolerance());
    RotorTask task =
        new RotorTask(
            TWELVE, stock, List.of(), List.of(), MixPolicy.FEW, 1.1 * free.targetAmplitudeTesla());
    RotorPlan plan = Examples.planner(task).plan(1, small());
    assertEquals(1.1 * free.targetAmplitudeTesla(), plan.targetAmplitudeTesla());
    assertTrue(!plan.withinTolerance(), plan.toString());
    assertTrue(plan.workingAmplitudeTesla() > free.workingAmplitudeTesla());
  }

  @Test
  void aPieceOfferedTwiceIsRefused() {
    List<Candidate> stock = Examples.lot("L", "MAIN", 12, 1.3, 3);
    List<Candidate> twice = Stream.concat(stock.stream(), stock.stream().limit(1)).toList();
    assertEquals(
        "a piece is offered twice for EX@A",
        assertThrows(IllegalArgumentException.class, () -> RotorTask.of(TWELVE, twice))
            .getMessage());
  }

  private static Effort small() {
    return new Effort(200_000, () -> true, ratio -> {});
  }

  private static double[] strengths(RotorPlan plan) {
    return plan.placements().stream()
        .mapToDouble(each -> each.strength().remanenceTesla())
        .toArray();
  }
}
