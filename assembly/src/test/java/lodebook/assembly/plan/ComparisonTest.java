package lodebook.assembly.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.MutualMagnetisation;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.layout.RingPolarisation;
import lodebook.assembly.layout.WorkingCircle;
import lodebook.assembly.magnet.MagnetType;
import org.junit.jupiter.api.Test;

class ComparisonTest {
  private static final Layout TWELVE = Examples.layout(3, 4, Focus.OUT, null);

  @Test
  void asTheyComeSortedAndPlanned() {
    List<Candidate> stock = Examples.lot("L", "MAIN", 15, 1.3, 4);
    RotorPlanner planner = Examples.planner(RotorTask.of(TWELVE, stock));
    RotorPlan plan = planner.plan(1, new Effort(200_000, () -> true, ratio -> {}));
    Map<Arranged, RingFigures> figures = planner.compare(plan);
    List<Candidate> strongestFirst = new ArrayList<>(stock);
    strongestFirst.sort(
        Comparator.comparingDouble((Candidate each) -> -each.strength().remanenceTesla()));
    assertEquals(
        Map.of(
            Arranged.AS_THEY_COME, judged(stock.subList(0, 12)),
            Arranged.SORTED, judged(strongestFirst.subList(0, 12)),
            Arranged.PLANNED, plan.unwantedHarmonics()),
        rounded(figures));
    assertEquals(plan.asTheyCome(), figure(figures, Arranged.AS_THEY_COME).unwantedHarmonics());
    assertEquals(
        plan.workingAmplitudeTesla(), figure(figures, Arranged.PLANNED).workingAmplitudeTesla());
  }

  @Test
  void aBatchBesideItsStockAsItComesAndSorted() {
    RingDesign design = Examples.design(TWELVE);
    List<BatchTask.Ring> rings =
        List.of(
            new BatchTask.Ring("R-1", design, List.of()),
            new BatchTask.Ring("R-2", design, List.of()));
    BatchTask task =
        new BatchTask(rings, Examples.lot("L", "MAIN", 30, 1.3, 4), List.of(), MixPolicy.FEW);
    BatchPlanner planner = new BatchPlanner(task);
    BatchPlan plan = planner.plan(1, BatchPlanner.usualEffort(task));
    Map<Arranged, Map<String, RingFigures>> figures = planner.compare(plan);
    assertTrue(
        spread(figures.getOrDefault(Arranged.SORTED, Map.of()))
            > 10 * spread(figures.getOrDefault(Arranged.PLANNED, Map.of())),
        "the strongest twelve first make rotors unlike: " + figures);
    plan.plans()
        .forEach(
            (rotor, each) -> {
              Map<String, RingFigures> asTheyCome =
                  figures.getOrDefault(Arranged.AS_THEY_COME, Map.of());
              RingFigures own = asTheyCome.get(rotor);
              assertTrue(own != null && own.unwantedHarmonics() == each.asTheyCome(), rotor);
            });
  }

  /// With recoil permeability 1.05 the stated harmonics are those of the polarised ring, solved as
  /// a whole.
  @Test
  void recoilPermeabilityCounts() {
    Layout layout = Examples.layout(3, 4, Focus.OUT, null);
    MagnetType plain = Examples.design(layout).mainType();
    MagnetType recoiling =
        new MagnetType(
            plain.code(),
            plain.shape(),
            plain.thicknessMetres(),
            plain.widthMetres(),
            plain.lengthMetres(),
            0,
            0,
            0,
            plain.grade(),
            plain.toleranceMetres(),
            plain.coating(),
            1.05,
            0);
    RingDesign design = new RingDesign(layout, recoiling, null);
    RotorTask task = RotorTask.of(layout, Examples.lot("L", "MAIN", 14, 1.3, 6));
    RotorPlan plan =
        RotorPlanner.of(design, task).plan(1, new Effort(200_000, () -> true, ratio -> {}));
    double[] strength =
        plan.placements().stream().mapToDouble(each -> each.strength().remanenceTesla()).toArray();
    double[] mean = new double[12];
    Arrays.fill(mean, Arrays.stream(strength).average().orElseThrow());
    MutualMagnetisation mutual = MutualMagnetisation.of(design);
    RingPolarisation actual = mutual.answerTo(RingPolarisation.of(strength, design.ruleFacings()));
    RingPolarisation equal = mutual.answerTo(RingPolarisation.of(mean, design.ruleFacings()));
    WorkingCircle ring = new WorkingCircle(design);
    assertEquals(
        ring.unwantedHarmonics(actual, equal),
        plan.unwantedHarmonics(),
        1e-9 * plan.unwantedHarmonics());
    assertEquals(ring.workingAmplitude(actual), plan.workingAmplitudeTesla(), 1e-12);
    double rigid =
        RotorPlanner.of(Examples.design(layout), task)
            .plan(1, new Effort(1000, () -> true, ratio -> {}))
            .workingAmplitudeTesla();
    assertTrue(plan.workingAmplitudeTesla() < 0.995 * rigid, "recoil weakens a ring");
  }

  /// (1.1·1.0, 0.9·1.0, 1.0·1.0): mean 1, standard deviation 0.1.
  @Test
  void spreadOfPullOutTorques() {
    assertEquals(
        0.1, PullOutSpread.relative(new double[] {1.1, 0.9, 1}, new double[] {1, 1, 1}), 1e-12);
    assertEquals(
        "a spread needs two gears or more with two rings each, not 1 inner and 2 outer rings",
        assertThrows(
                IllegalArgumentException.class,
                () -> PullOutSpread.relative(new double[1], new double[2]))
            .getMessage());
  }

  private static double judged(List<Candidate> inSlots) {
    double[] strength =
        inSlots.stream().mapToDouble(each -> each.strength().remanenceTesla()).toArray();
    double[] mean = new double[12];
    Arrays.fill(mean, Arrays.stream(strength).average().orElseThrow());
    DipoleRing ring = Examples.ring(TWELVE);
    return Math.round(1e9 * ring.unwanted(strength, ring.ruleFacings(), mean)) / 1e9;
  }

  private static Map<Arranged, Double> rounded(Map<Arranged, RingFigures> figures) {
    double planned = figure(figures, Arranged.PLANNED).unwantedHarmonics();
    return Map.of(
        Arranged.AS_THEY_COME, nine(figure(figures, Arranged.AS_THEY_COME).unwantedHarmonics()),
        Arranged.SORTED, nine(figure(figures, Arranged.SORTED).unwantedHarmonics()),
        Arranged.PLANNED, planned);
  }

  private static double nine(double value) {
    return Math.round(1e9 * value) / 1e9;
  }

  private static RingFigures figure(Map<Arranged, RingFigures> figures, Arranged how) {
    return figures.getOrDefault(how, new RingFigures(Double.NaN, Double.NaN));
  }

  private static double spread(Map<String, RingFigures> rings) {
    double[] values =
        rings.values().stream().mapToDouble(RingFigures::workingAmplitudeTesla).sorted().toArray();
    return values[values.length - 1] - values[0];
  }
}
