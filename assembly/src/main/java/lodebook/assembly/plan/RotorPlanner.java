package lodebook.assembly.plan;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.RingDesign;
import org.jspecify.annotations.Nullable;

/// Plans one rotor: facings by the rule, pieces so that the unwanted harmonics are least while the
/// working amplitude stays within the layout's tolerance.
public final class RotorPlanner {
  /// Up to so many empty slots the best plan is proven unless time runs out, up to the second
  /// number where it comes easily.
  private static final int ALWAYS_PROVEN = 8;

  private static final int MOST_PROVEN = 16;
  private static final long NODES_TO_PROVE = 2_000_000;

  private final RotorTask task;
  private final HarmonicForm form;
  private final HarmonicForm ideal;

  /// A planner for a task's ring.
  ///
  /// @param design the ring's layout with its magnet types
  /// @param task what is asked of that layout
  public static RotorPlanner of(RingDesign design, RotorTask task) {
    SlotHarmonics byRule = SlotHarmonics.of(design, design.ruleFacings());
    if (task.kept().isEmpty()) {
      return new RotorPlanner(task, byRule, byRule);
    }
    List<Facing> facings = new ArrayList<>(design.ruleFacings());
    task.kept().forEach(kept -> facings.set(kept.slot() - 1, kept.facing()));
    return new RotorPlanner(task, SlotHarmonics.of(design, facings), byRule);
  }

  /// @param task what is asked
  /// @param asPlaced harmonics of the task's ring, kept magnets facing as they were built
  /// @param byRule harmonics of the same ring with every facing by the rule
  public RotorPlanner(RotorTask task, SlotHarmonics asPlaced, SlotHarmonics byRule) {
    this.task = task;
    int[] pool = new int[task.layout().slots()];
    Arrays.setAll(pool, i -> task.types().indexOf(task.layout().typeAt(i + 1)));
    form = HarmonicForm.of(asPlaced, byRule, pool);
    ideal = HarmonicForm.of(byRule, byRule, pool);
  }

  /// What is short before anything can be planned, type by type.
  public static List<Shortage> shortages(RotorTask task) {
    return new LotChoice(task).shortages();
  }

  /// The best plan found.
  ///
  /// @param seed the same seed gives the same plan
  /// @param effort how long to search
  /// @throws IllegalArgumentException where pieces are short; see [#shortages(RotorTask)]
  public RotorPlan plan(long seed, Effort effort) {
    LotChoice choice = new LotChoice(task);
    if (!choice.shortages().isEmpty()) {
      throw new IllegalArgumentException(
          "pieces are short for " + task.layout().name() + ": " + choice.shortages());
    }
    Stocked stocked = chosen(choice.sets(), seed, effort);
    Puzzle puzzle = stocked.puzzle();
    HarmlessClasses classes = classes(puzzle);
    int[] found = new Annealing(puzzle, classes, seed, effort).search();
    int[] proven = proven(puzzle, found, effort);
    int[] best = proven != null ? proven : found;
    List<Placement> placements = stocked.placements(best);
    double amplitude = form.workingAmplitude(puzzle.inSlots(best));
    double target = 2 * puzzle.target;
    boolean withinTolerance =
        Math.abs(amplitude / target - 1) <= task.layout().workingAmplitudeTolerance() + 1e-12;
    Double bound =
        proven != null && withinTolerance
            ? Double.valueOf(puzzle.unwanted(best))
            : LowerBound.of(puzzle, classes);
    return new RotorPlan(
        placements,
        seed,
        puzzle.unwanted(best),
        bound,
        puzzle.unwanted(puzzle.asTheyCome()),
        amplitude,
        target,
        withinTolerance,
        Stocked.lotsOf(placements),
        freelyMixed(placements, seed, effort));
  }

  /// A plan beside the same stock as it comes and sorted by strength; kept slots stay.
  public Map<Arranged, RingFigures> compare(RotorPlan plan) {
    Puzzle puzzle = stocked(Set.copyOf(plan.lots())).puzzle();
    Map<Arranged, RingFigures> figures = new EnumMap<>(Arranged.class);
    figures.put(Arranged.AS_THEY_COME, figures(puzzle, puzzle.asTheyCome()));
    figures.put(Arranged.SORTED, figures(puzzle, puzzle.sorted()));
    figures.put(Arranged.PLANNED, RingFigures.of(plan));
    return figures;
  }

  private RingFigures figures(Puzzle puzzle, int[] order) {
    return new RingFigures(puzzle.unwanted(order), form.workingAmplitude(puzzle.inSlots(order)));
  }

  /// The best order there is where the puzzle is small enough to prove it, else null.
  private static int @Nullable [] proven(Puzzle puzzle, int[] found, Effort effort) {
    int slots = puzzle.movable.length;
    if (!puzzle.certain() || slots > MOST_PROVEN) {
      return null;
    }
    long nodes = slots <= ALWAYS_PROVEN ? NODES_TO_PROVE : effort.steps() / 10;
    return new ExactSearch(puzzle, found, nodes, effort.keepGoing()).search();
  }

  private HarmlessClasses classes(Puzzle puzzle) {
    return new HarmlessClasses(puzzle, task.layout().segmentsPerPolePair());
  }

  private Stocked chosen(List<Set<String>> sets, long seed, Effort effort) {
    List<Stocked> each = sets.stream().map(this::stocked).toList();
    if (each.size() == 1) {
      return each.getFirst();
    }
    Effort quick = new Effort(effort.steps() / 10 / each.size() + 1, effort.keepGoing(), r -> {});
    double[] costs =
        each.stream()
            .map(Stocked::puzzle)
            .mapToDouble(
                puzzle -> puzzle.cost(new Annealing(puzzle, classes(puzzle), seed, quick).search()))
            .toArray();
    return each.get(
        IntStream.range(0, costs.length)
            .boxed()
            .min(Comparator.comparingDouble(i -> costs[i]))
            .orElseThrow());
  }

  private @Nullable Double freelyMixed(List<Placement> placements, long seed, Effort effort) {
    Set<String> offered =
        Stream.concat(
                task.candidates().stream().map(Candidate::lot),
                task.unmeasured().stream().map(LotSupply::lot))
            .collect(Collectors.toCollection(HashSet::new));
    offered.removeAll(Stocked.lotsOf(placements));
    if (task.mix() == MixPolicy.FREE || offered.isEmpty()) {
      return null;
    }
    Effort quick = new Effort(effort.steps() / 4 + 1, effort.keepGoing(), ratio -> {});
    List<Set<String>> sets = new LotChoice(task.withMix(MixPolicy.FREE)).sets();
    Puzzle free = chosen(sets, seed, quick).puzzle();
    return free.unwanted(new Annealing(free, classes(free), seed, quick).search());
  }

  private Stocked stocked(Set<String> lots) {
    Double wanted = task.targetAmplitudeTesla();
    return new Stocked(
        task, form, lots, wanted != null ? wanted : ideal.workingAmplitude(meanStrengths(lots)));
  }

  /// For each slot the mean strength of what may be used there, of some lots, or is kept.
  private double[] meanStrengths(Set<String> lots) {
    double[] means = new double[task.layout().slots()];
    for (String type : task.types()) {
      double sum = 0;
      double count = 0;
      for (Candidate each : task.candidates()) {
        if (each.type().equals(type) && lots.contains(each.lot())) {
          sum += each.strength().remanenceTesla();
          count++;
        }
      }
      for (LotSupply each : task.unmeasured()) {
        if (each.type().equals(type) && lots.contains(each.lot())) {
          sum += each.count() * each.strength().remanenceTesla();
          count += each.count();
        }
      }
      for (Kept each : task.kept()) {
        if (task.layout().typeAt(each.slot()).equals(type)) {
          sum += each.strength().remanenceTesla();
          count++;
        }
      }
      double mean = sum / Math.max(1, count);
      Arrays.setAll(means, i -> task.layout().typeAt(i + 1).equals(type) ? mean : means[i]);
    }
    return means;
  }
}
