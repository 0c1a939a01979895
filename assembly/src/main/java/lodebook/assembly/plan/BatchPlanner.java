package lodebook.assembly.plan;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.RingDesign;
import org.jspecify.annotations.Nullable;

/// Plans all rotors of a batch from common stock: rotors of a layout alike in working amplitude,
/// each low in unwanted harmonics.
public final class BatchPlanner {
  /// Tried exchanges for each slot of the batch.
  private static final long STEPS_A_SLOT = 10_000;

  private static final double STEPS_A_SECOND = 2.4e6;

  private final BatchTask task;
  private final HarmonicForm[] forms;

  /// @param task what is asked
  public BatchPlanner(BatchTask task) {
    this.task = task;
    forms = forms(task);
  }

  /// What is short before anything can be planned, type by type.
  public static List<Shortage> shortages(BatchTask task) {
    return task.types().stream()
        .map(type -> new BatchLots(task, type).shortage())
        .filter(each -> each.missing() > 0)
        .toList();
  }

  /// The usual effort for a batch, about 10 s of one processor for 50 rotors of 48 slots.
  public static Effort usualEffort(BatchTask task) {
    long slots = task.rings().stream().mapToLong(ring -> ring.design().slots()).sum();
    return new Effort(STEPS_A_SLOT * slots, () -> true, ratio -> {});
  }

  /// An effort of about so many seconds.
  ///
  /// @param seconds seconds of one processor, by experience and not by a clock
  public static Effort seconds(double seconds) {
    return new Effort(Math.max(1, Math.round(STEPS_A_SECOND * seconds)), () -> true, ratio -> {});
  }

  /// Mean unwanted harmonics of the rotors where any lots may go together, to set beside those of a
  /// plan in which they may not; null where they may. A quarter of the effort is taken.
  public @Nullable Double freelyMixed(long seed, Effort effort) {
    if (task.mix() == MixPolicy.FREE || task.lots().size() < 2) {
      return null;
    }
    BatchTask free =
        new BatchTask(
            task.rings(),
            task.candidates(),
            task.unmeasured(),
            MixPolicy.FREE,
            task.wished(),
            task.apart());
    Effort quick = new Effort(effort.steps() / 4 + 1, effort.keepGoing(), ratio -> {});
    return new BatchPlanner(free)
        .plan(seed, quick).plans().values().stream()
            .mapToDouble(RotorPlan::unwantedHarmonics)
            .average()
            .orElse(0);
  }

  /// The best plans found.
  ///
  /// @param seed the same seed gives the same plans
  /// @param effort how long to search; it is told the root mean square over the rings of harmonics
  ///   and weighted deviation of amplitudes
  /// @throws IllegalArgumentException where pieces are short; see [#shortages(BatchTask)]
  public BatchPlan plan(long seed, Effort effort) {
    List<Shortage> shortages = shortages(task);
    if (!shortages.isEmpty()) {
      throw new IllegalArgumentException("pieces are short for the batch: " + shortages);
    }
    BatchHolders holders = new BatchHolders(task, forms, buckets(task));
    BatchPuzzle puzzle = holders.puzzle();
    int[] order = new BatchAnnealing(puzzle, seed, effort).search(holders.dealt());
    Map<String, RotorPlan> plans = new LinkedHashMap<>();
    Map<String, List<Double>> amplitudes = new TreeMap<>();
    Set<String> used = new HashSet<>();
    for (int ring = 0; ring < forms.length; ring++) {
      RotorPlan plan = plan(ring, holders, order, seed);
      plans.put(task.rings().get(ring).rotor(), plan);
      amplitudes
          .computeIfAbsent(layout(ring).name(), name -> new ArrayList<>())
          .add(plan.workingAmplitudeTesla());
      for (Placement each : plan.placements()) {
        used.add(String.valueOf(each.piece()));
      }
    }
    Map<String, Double> spread = new LinkedHashMap<>();
    amplitudes.forEach((name, values) -> spread.put(name, relativeSpread(values)));
    return new BatchPlan(
        plans,
        spread,
        task.candidates().stream()
            .map(Candidate::piece)
            .filter(piece -> !used.contains(piece))
            .toList());
  }

  /// Plans beside the same stock as it comes and sorted by strength, each rotor from its own lots.
  public Map<Arranged, Map<String, RingFigures>> compare(BatchPlan plan) {
    List<Candidate> strongestFirst = new ArrayList<>(task.candidates());
    strongestFirst.sort(
        Comparator.comparingDouble((Candidate each) -> -each.strength().remanenceTesla()));
    BatchTask sorted =
        new BatchTask(
            task.rings(),
            strongestFirst,
            task.unmeasured(),
            task.mix(),
            task.wished(),
            task.apart());
    Map<String, RingFigures> planned = new LinkedHashMap<>();
    plan.plans().forEach((rotor, each) -> planned.put(rotor, RingFigures.of(each)));
    Map<Arranged, Map<String, RingFigures>> figures = new EnumMap<>(Arranged.class);
    figures.put(Arranged.AS_THEY_COME, plain(task));
    figures.put(Arranged.SORTED, plain(sorted));
    figures.put(Arranged.PLANNED, planned);
    return figures;
  }

  private Map<String, RingFigures> plain(BatchTask inOrder) {
    BatchHolders holders = new BatchHolders(inOrder, forms, buckets(inOrder));
    Map<String, RingFigures> figures = new LinkedHashMap<>();
    for (int ring = 0; ring < forms.length; ring++) {
      List<Source> sources = holders.asTheyCome(ring);
      figures.put(
          task.rings().get(ring).rotor(),
          new RingFigures(
              unwanted(forms[ring], sources), forms[ring].workingAmplitude(strengths(sources))));
    }
    return figures;
  }

  private static Map<String, List<BatchLots.Bucket>> buckets(BatchTask task) {
    Map<String, List<BatchLots.Bucket>> buckets = new LinkedHashMap<>();
    for (String type : task.types()) {
      buckets.put(type, new BatchLots(task, type).buckets());
    }
    return buckets;
  }

  private RotorPlan plan(int ring, BatchHolders holders, int[] order, long seed) {
    Layout layout = layout(ring);
    HarmonicForm form = forms[ring];
    List<Source> sources = holders.inSlots(ring, order);
    List<Placement> placements = new ArrayList<>();
    for (int slot = 1; slot <= layout.slots(); slot++) {
      placements.add(sources.get(slot - 1).in(slot, layout.ruleFacing(slot)));
    }
    double target = 2 * holders.puzzle().target[ring];
    double amplitude = form.workingAmplitude(strengths(sources));
    Puzzle own = holders.alone(ring, sources);
    return new RotorPlan(
        placements,
        seed,
        unwanted(form, sources),
        LowerBound.of(own, new HarmlessClasses(own, layout.segmentsPerPolePair())),
        unwanted(form, holders.asTheyCome(ring)),
        amplitude,
        target,
        Math.abs(amplitude / target - 1) <= layout.workingAmplitudeTolerance() + 1e-12,
        Stocked.lotsOf(placements),
        null);
  }

  private Layout layout(int ring) {
    return task.rings().get(ring).design().layout();
  }

  private static double unwanted(HarmonicForm form, List<Source> sources) {
    return form.unwanted(
        strengths(sources), sources.stream().mapToDouble(Source::variance).toArray());
  }

  private static double[] strengths(List<Source> sources) {
    return sources.stream().mapToDouble(Source::remanence).toArray();
  }

  private static double relativeSpread(List<Double> values) {
    double mean = values.stream().mapToDouble(each -> each).average().orElse(1);
    double squares = values.stream().mapToDouble(each -> (each - mean) * (each - mean)).sum();
    return values.size() < 2 ? 0 : Math.sqrt(squares / (values.size() - 1)) / mean;
  }

  private static HarmonicForm[] forms(BatchTask task) {
    Map<RingDesign, SlotHarmonics> byRule = new HashMap<>();
    Map<RingDesign, HarmonicForm> known = new HashMap<>();
    HarmonicForm[] forms = new HarmonicForm[task.rings().size()];
    for (int ring = 0; ring < forms.length; ring++) {
      BatchTask.Ring each = task.rings().get(ring);
      RingDesign design = each.design();
      SlotHarmonics ideal =
          byRule.computeIfAbsent(design, d -> SlotHarmonics.of(d, d.ruleFacings()));
      List<String> types = task.types();
      int[] pool = new int[design.slots()];
      Arrays.setAll(pool, i -> types.indexOf(design.layout().typeAt(i + 1)));
      if (each.kept().isEmpty()) {
        forms[ring] = known.computeIfAbsent(design, d -> HarmonicForm.of(ideal, ideal, pool));
      } else {
        List<Facing> facings = new ArrayList<>(design.ruleFacings());
        each.kept().forEach(kept -> facings.set(kept.slot() - 1, kept.facing()));
        forms[ring] = HarmonicForm.of(SlotHarmonics.of(design, facings), ideal, pool);
      }
    }
    return forms;
  }
}
