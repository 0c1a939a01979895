package lodebook.assembly.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import lodebook.assembly.layout.RingDesign;

/// The order in which the empty slots of a ring are filled, and what each magnet does on its way
/// in.
///
/// Of the patterns a person can follow, begun at each slot of a pole pair, the one is taken whose
/// greatest force out of a pocket is least, be it on the magnet going in or on its neighbours.
///
/// @param pattern the pattern that was taken
/// @param steps one for each slot that was empty
public record FillingOrder(OrderPattern pattern, List<FillingStep> steps) {
  /// Below this a force is not worth a word: the weight of some tens of grams, newtons.
  public static final double NOT_WORTH_A_WORD = 0.2;

  /// A harder pattern must spare so much push, newtons.
  private static final double WORTH_A_HARDER_ORDER = 0.05;

  public FillingOrder {
    steps = List.copyOf(steps);
  }

  /// The order with the least worst push-out.
  ///
  /// @param design the ring
  /// @param remanencesTesla of what stands or is to stand in each slot, slot 1 first, tesla
  /// @param filled slots that are filled already
  public static FillingOrder of(RingDesign design, double[] remanencesTesla, Set<Integer> filled) {
    return of(new UnitForces(design), remanencesTesla, filled);
  }

  /// The same with forces that are known already; for many rings of one design.
  ///
  /// @param unitForces between the magnets of the design
  public static FillingOrder of(
      UnitForces unitForces, double[] remanencesTesla, Set<Integer> filled) {
    RingDesign design = unitForces.design();
    StepForces forces = new StepForces(design, unitForces, remanencesTesla);
    FillingOrder best = null;
    for (OrderPattern pattern : OrderPattern.values()) {
      for (int start = 1; start <= design.layout().segmentsPerPolePair(); start++) {
        FillingOrder order =
            new FillingOrder(pattern, steps(forces, filled, pattern.from(start, design.slots())));
        if (best == null || order.worstPushOut() < best.worstPushOut() - WORTH_A_HARDER_ORDER) {
          best = order;
        }
      }
    }
    if (best == null) {
      throw new IllegalArgumentException("layout " + design.layout().name() + " has no slots");
    }
    return best;
  }

  /// The greatest force out of a pocket in the whole order, newtons; 0 where there is none.
  public double worstPushOut() {
    double worst = 0;
    for (FillingStep step : steps) {
      worst = Math.max(worst, step.force().pushOutNewtons());
      for (SlotForce neighbour : step.neighbours()) {
        worst = Math.max(worst, neighbour.pushOutNewtons());
      }
    }
    return worst;
  }

  private static List<FillingStep> steps(
      StepForces forces, Set<Integer> filled, List<Integer> slots) {
    Set<Integer> standing = new TreeSet<>(filled);
    List<FillingStep> steps = new ArrayList<>();
    for (int slot : slots) {
      if (!standing.contains(slot)) {
        steps.add(forces.step(steps.size() + 1, slot, standing));
        standing.add(slot);
      }
    }
    return steps;
  }
}
