package lodebook.ui.craft;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.DoubleConsumer;
import java.util.function.Supplier;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.plan.BatchTask;
import lodebook.assembly.plan.FillingOrder;
import lodebook.assembly.plan.FillingStep;
import lodebook.assembly.plan.Placement;
import lodebook.assembly.plan.RotorPlan;
import lodebook.assembly.plan.UnitForces;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.builds.Plan;
import lodebook.db.builds.PlanDraft;
import lodebook.db.builds.PlanOutdated;
import lodebook.db.builds.PlanStock;
import lodebook.db.builds.Plans;
import lodebook.db.builds.Rotor;
import lodebook.db.builds.Rotors;

/// Plans rotors from common stock: the stock is read, the plan computed with the book closed, then
/// stored; where the stock changed meanwhile, once more.
public final class Planning {
  private final Supplier<Book> opening;
  private final StepWords words;
  private final String programVersion;
  private final DoubleConsumer progress;

  /// @param opening opens the book
  /// @param words what a builder is told about a step
  /// @param programVersion what plans are marked with
  /// @param progress told the unwanted harmonics, a ratio, whenever they fell; by several threads
  public Planning(
      Supplier<Book> opening, StepWords words, String programVersion, DoubleConsumer progress) {
    this.opening = opening;
    this.words = words;
    this.programVersion = programVersion;
    this.progress = progress;
  }

  /// Plans and stores.
  ///
  /// @throws PiecesShort where magnets are short
  public Planned plan(Act act, PlanWish wish) {
    try {
      return planOnce(act, wish);
    } catch (PlanOutdated outdated) {
      return planOnce(act, wish);
    }
  }

  private Planned planOnce(Act act, PlanWish wish) {
    PlanStock stock = stock(wish);
    PlanSearch.Found found = new PlanSearch(stock, wish, progress).search(false);
    List<PlanDraft> drafts = new ArrayList<>();
    Map<RingDesign, UnitForces> forces = new HashMap<>();
    for (BatchTask.Ring ring : stock.rings()) {
      UnitForces ofRing = forces.computeIfAbsent(ring.design(), UnitForces::new);
      drafts.add(draft(ring, planOf(found, ring), wish, ofRing));
    }
    List<Plan> stored;
    try (Book book = opening.get()) {
      stored = new Plans(book).store(act, stock, drafts);
    }
    return new Planned(
        stored,
        found.plans(),
        found.leftOver(),
        found.amplitudeSpread(),
        found.freelyMixed(),
        found.cutShort());
  }

  /// Sets the pieces as they come, sorted and planned side by side; stores nothing.
  ///
  /// @throws PiecesShort where magnets are short
  public WhatIf compare(PlanWish wish) {
    PlanStock stock;
    List<Rotor> rotors = new ArrayList<>();
    try (Book book = opening.get()) {
      stock = new Plans(book).stockFor(wish.rotors(), wish.lots());
      stock.rings().forEach(ring -> rotors.add(new Rotors(book).show(ring.rotor()).rotor()));
    }
    return new WhatIf(rotors, new PlanSearch(stock, wish, progress).search(true).compared());
  }

  private PlanStock stock(PlanWish wish) {
    try (Book book = opening.get()) {
      return new Plans(book).stockFor(wish.rotors(), wish.lots());
    }
  }

  private static RotorPlan planOf(PlanSearch.Found found, BatchTask.Ring ring) {
    RotorPlan plan = found.plans().get(ring.rotor());
    if (plan == null) {
      throw new IllegalStateException("no plan for " + ring.rotor());
    }
    return plan;
  }

  private PlanDraft draft(BatchTask.Ring ring, RotorPlan plan, PlanWish wish, UnitForces forces) {
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
    for (FillingStep step : FillingOrder.of(forces, remanences, filled).steps()) {
      steps.put(step.slot(), step.step());
      String remark = words.of(ring.design().layout(), step);
      if (!remark.isEmpty()) {
        told.put(step.slot(), remark);
      }
    }
    return new PlanDraft(ring.rotor(), plan, steps, told, wish.settings(), programVersion);
  }
}
