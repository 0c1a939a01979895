package lodebook.ui.craft;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.DoubleConsumer;
import lodebook.assembly.plan.Arranged;
import lodebook.assembly.plan.BatchPlan;
import lodebook.assembly.plan.BatchPlanner;
import lodebook.assembly.plan.BatchTask;
import lodebook.assembly.plan.Effort;
import lodebook.assembly.plan.RingFigures;
import lodebook.assembly.plan.RotorPlan;
import lodebook.assembly.plan.RotorPlanner;
import lodebook.assembly.plan.RotorTask;
import lodebook.assembly.plan.Shortage;
import lodebook.db.builds.PlanStock;
import org.jspecify.annotations.Nullable;

/// Searches plans for some rotors from a stock that was read; the book is closed meanwhile.
final class PlanSearch {
  private final PlanStock stock;
  private final PlanWish wish;
  private final DoubleConsumer progress;
  private final WishedStock wished;

  /// What was found.
  ///
  /// @param plans for each rotor
  /// @param leftOver names of measured pieces that no rotor of a batch takes; empty for one rotor
  /// @param amplitudeSpread for each layout of a batch the relative standard deviation of the
  ///   rotors' amplitudes; empty for one rotor
  /// @param freelyMixed unwanted harmonics (mean of the rotors) where all lots may be mixed, or
  ///   null where that is no other question
  /// @param cutShort whether the clock ended the search
  /// @param compared where that was asked for the rotors' figures as the pieces come, sorted and
  ///   planned; else empty
  record Found(
      Map<String, RotorPlan> plans,
      List<String> leftOver,
      Map<String, Double> amplitudeSpread,
      @Nullable Double freelyMixed,
      boolean cutShort,
      Map<Arranged, Map<String, RingFigures>> compared) {}

  /// @param progress told the unwanted harmonics whenever they fell
  /// @throws PiecesShort where magnets are short
  PlanSearch(PlanStock stock, PlanWish wish, DoubleConsumer progress) {
    this.stock = stock;
    this.wish = wish;
    this.progress = progress;
    wished = WishedStock.of(stock, wish);
  }

  /// Searches.
  ///
  /// @param compare whether the other arrangements are wanted too
  Found search(boolean compare) {
    return stock.rings().size() == 1 ? one(compare) : several(compare);
  }

  private Found one(boolean compare) {
    BatchTask.Ring ring = stock.rings().getFirst();
    RotorTask task =
        new RotorTask(
            ring.design().layout(),
            wished.candidates(),
            stock.unmeasured(),
            ring.kept(),
            wish.mix(),
            null,
            Set.copyOf(wished.wished().keySet()),
            wished.apart());
    refuseShort(RotorPlanner.shortages(task));
    int slots = ring.design().slots();
    Double seconds = wish.seconds();
    Deadline deadline = new Deadline(seconds);
    Effort effort =
        (seconds == null ? Effort.usual(slots) : Effort.seconds(slots, seconds))
            .whilst(deadline::goesOn)
            .telling(progress);
    RotorPlanner planner = RotorPlanner.of(ring.design(), task);
    RotorPlan plan = planner.plan(wish.seed(), effort);
    Map<Arranged, Map<String, RingFigures>> compared = new LinkedHashMap<>();
    if (compare) {
      planner.compare(plan).forEach((how, each) -> compared.put(how, Map.of(ring.rotor(), each)));
    }
    return new Found(
        Map.of(ring.rotor(), plan),
        List.of(),
        Map.of(),
        plan.freelyMixed(),
        deadline.wasHit(),
        compared);
  }

  private Found several(boolean compare) {
    BatchTask task =
        new BatchTask(
            stock.rings(),
            wished.candidates(),
            stock.unmeasured(),
            wish.mix(),
            wished.wished(),
            wished.apart());
    refuseShort(BatchPlanner.shortages(task));
    Double seconds = wish.seconds();
    Deadline deadline = new Deadline(seconds);
    Effort effort =
        (seconds == null ? BatchPlanner.usualEffort(task) : BatchPlanner.seconds(seconds))
            .whilst(deadline::goesOn)
            .telling(progress);
    BatchPlanner planner = new BatchPlanner(task);
    BatchPlan plan = planner.plan(wish.seed(), effort);
    return new Found(
        new LinkedHashMap<>(plan.plans()),
        plan.leftOver(),
        plan.amplitudeSpread(),
        planner.freelyMixed(wish.seed(), effort),
        deadline.wasHit(),
        compare ? planner.compare(plan) : Map.of());
  }

  private static void refuseShort(List<Shortage> shortages) {
    if (!shortages.isEmpty()) {
      throw new PiecesShort(shortages);
    }
  }
}
