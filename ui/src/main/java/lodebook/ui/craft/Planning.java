package lodebook.ui.craft;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Function;
import java.util.function.Supplier;
import lodebook.assembly.plan.BatchPlanner;
import lodebook.assembly.plan.BatchTask;
import lodebook.assembly.plan.Effort;
import lodebook.assembly.plan.FillingOrder;
import lodebook.assembly.plan.FillingStep;
import lodebook.assembly.plan.Placement;
import lodebook.assembly.plan.RotorPlan;
import lodebook.assembly.plan.RotorPlanner;
import lodebook.assembly.plan.RotorTask;
import lodebook.assembly.plan.Shortage;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.builds.Plan;
import lodebook.db.builds.PlanDraft;
import lodebook.db.builds.PlanOutdated;
import lodebook.db.builds.PlanStock;
import lodebook.db.builds.Plans;

/// Plans rotors from common stock: the stock is read, the plan computed with the book closed, then
/// stored; where the stock changed meanwhile, once more.
public final class Planning {
  private final Supplier<Book> opening;
  private final Function<FillingStep, String> remarks;
  private final String programVersion;

  /// @param opening opens the book
  /// @param remarks what a builder is told about a step, empty for nothing
  /// @param programVersion what plans are marked with
  public Planning(
      Supplier<Book> opening, Function<FillingStep, String> remarks, String programVersion) {
    this.opening = opening;
    this.remarks = remarks;
    this.programVersion = programVersion;
  }

  /// Plans and stores.
  ///
  /// @return the plans that count from now on, in the order of the wish
  /// @throws PiecesShort where magnets are short
  public List<Plan> plan(Act act, PlanWish wish) {
    try {
      return planOnce(act, wish);
    } catch (PlanOutdated outdated) {
      return planOnce(act, wish);
    }
  }

  private List<Plan> planOnce(Act act, PlanWish wish) {
    PlanStock stock;
    try (Book book = opening.get()) {
      stock = new Plans(book).stockFor(wish.rotors(), wish.lots());
    }
    Map<String, RotorPlan> plans = compute(stock, wish);
    List<PlanDraft> drafts = new ArrayList<>();
    for (BatchTask.Ring ring : stock.rings()) {
      RotorPlan plan = plans.get(ring.rotor());
      if (plan == null) {
        throw new IllegalStateException("no plan for " + ring.rotor());
      }
      drafts.add(draft(ring, plan, wish));
    }
    try (Book book = opening.get()) {
      return new Plans(book).store(act, stock, drafts);
    }
  }

  private static Map<String, RotorPlan> compute(PlanStock stock, PlanWish wish) {
    return stock.rings().size() == 1 ? one(stock, wish) : several(stock, wish);
  }

  private static Map<String, RotorPlan> one(PlanStock stock, PlanWish wish) {
    BatchTask.Ring ring = stock.rings().getFirst();
    RotorTask task =
        new RotorTask(
            ring.design().layout(),
            stock.candidates(),
            stock.unmeasured(),
            ring.kept(),
            wish.mix(),
            null);
    refuseShort(RotorPlanner.shortages(task));
    int slots = ring.design().slots();
    Double seconds = wish.seconds();
    Effort effort = seconds == null ? Effort.usual(slots) : Effort.seconds(slots, seconds);
    return Map.of(ring.rotor(), RotorPlanner.of(ring.design(), task).plan(wish.seed(), effort));
  }

  private static Map<String, RotorPlan> several(PlanStock stock, PlanWish wish) {
    BatchTask task =
        new BatchTask(stock.rings(), stock.candidates(), stock.unmeasured(), wish.mix());
    refuseShort(BatchPlanner.shortages(task));
    int slots = stock.rings().stream().mapToInt(r -> r.design().slots()).sum();
    Double seconds = wish.seconds();
    Effort effort =
        seconds == null ? BatchPlanner.usualEffort(task) : Effort.seconds(slots, seconds);
    return new LinkedHashMap<>(new BatchPlanner(task).plan(wish.seed(), effort).plans());
  }

  private static void refuseShort(List<Shortage> shortages) {
    if (!shortages.isEmpty()) {
      throw new PiecesShort(shortages);
    }
  }

  private PlanDraft draft(BatchTask.Ring ring, RotorPlan plan, PlanWish wish) {
    double[] remanences = new double[ring.design().slots()];
    Set<Integer> filled = new HashSet<>();
    for (Placement placement : plan.placements()) {
      remanences[placement.slot() - 1] = placement.strength().remanenceTesla();
      if (placement.kept()) {
        filled.add(placement.slot());
      }
    }
    Map<Integer, Integer> steps = new HashMap<>();
    Map<Integer, String> told = new HashMap<>();
    for (FillingStep step : FillingOrder.of(ring.design(), remanences, filled).steps()) {
      steps.put(step.slot(), step.step());
      String remark = remarks.apply(step);
      if (!remark.isEmpty()) {
        told.put(step.slot(), remark);
      }
    }
    return new PlanDraft(ring.rotor(), plan, steps, told, wish.settings(), programVersion);
  }
}
