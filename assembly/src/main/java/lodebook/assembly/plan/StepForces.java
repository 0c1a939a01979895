package lodebook.assembly.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import lodebook.assembly.field.Vector3;
import lodebook.assembly.layout.InsertFrom;
import lodebook.assembly.layout.RingDesign;
import org.jspecify.annotations.Nullable;

/// Forces while one magnet goes into a ring in which some stand.
final class StepForces {
  private final RingDesign design;
  private final UnitForces forces;
  private final double[] remanence;

  /// @param remanence of what stands or is to stand in each slot, slot 1 first, tesla
  StepForces(RingDesign design, UnitForces forces, double[] remanence) {
    this.design = design;
    this.forces = forces;
    this.remanence = remanence.clone();
  }

  /// @param number number of the step
  /// @param slot the slot that is filled
  /// @param standing slots that are filled already
  FillingStep step(int number, int slot, Set<Integer> standing) {
    Vector3[] onMagnet = total(slot, standing);
    double pushOut = Double.NEGATIVE_INFINITY;
    for (Vector3 each : onMagnet) {
      pushOut = Math.max(pushOut, outOfPocket(each));
    }
    SlotForce force = force(slot, onMagnet[0], fromFace() ? onMagnet[1].z() : 0, pushOut);
    Wall wall = wall(force);
    Behaviour behaviour =
        pushOut > FillingOrder.NOT_WORTH_A_WORD
            ? Behaviour.LIFTS
            : wall == null ? Behaviour.HOLDS : Behaviour.PRESSES;
    return new FillingStep(number, slot, force, behaviour, wall, neighbours(slot, standing));
  }

  private boolean fromFace() {
    return design.layout().insertFrom() == InsertFrom.FACE;
  }

  private double outOfPocket(Vector3 force) {
    return switch (design.layout().insertFrom()) {
      case FACE -> force.z();
      case OUTSIDE -> force.x();
      case INSIDE -> -force.x();
    };
  }

  private static SlotForce force(int slot, Vector3 inPlace, double axial, double pushOut) {
    return new SlotForce(slot, inPlace.x(), inPlace.y(), axial, pushOut);
  }

  /// Force on a magnet from all that stand, at each part of the way.
  private Vector3[] total(int slot, Set<Integer> standing) {
    Vector3[] total = new Vector3[UnitForces.DRAWN_OUT.length];
    for (int i = 0; i < total.length; i++) {
      total[i] = Vector3.ZERO;
      for (int other : standing) {
        if (other != slot) {
          double strengths = remanence[slot - 1] * remanence[other - 1];
          total[i] = total[i].plus(forces.on(slot, other)[i].times(strengths));
        }
      }
    }
    return total;
  }

  private List<SlotForce> neighbours(int slot, Set<Integer> standing) {
    List<SlotForce> neighbours = new ArrayList<>();
    for (int neighbour : new int[] {design.layout().previous(slot), design.layout().next(slot)}) {
      if (standing.contains(neighbour) && neighbour != slot) {
        neighbours.add(onNeighbour(neighbour, slot, standing));
      }
    }
    return neighbours;
  }

  /// What a standing neighbour feels: in place from all others, the new one among them; its push
  /// out is the greatest while the new one comes in, the reaction to what the new one feels.
  private SlotForce onNeighbour(int neighbour, int slot, Set<Integer> standing) {
    Vector3 before = total(neighbour, standing)[0];
    double strengths = remanence[slot - 1] * remanence[neighbour - 1];
    double turn =
        design.layout().angleFromFirstRadians(slot)
            - design.layout().angleFromFirstRadians(neighbour);
    double pushOut = Double.NEGATIVE_INFINITY;
    for (Vector3 onNew : forces.on(slot, neighbour)) {
      Vector3 reaction = onNew.times(-strengths).turnedAboutZ(turn);
      pushOut = Math.max(pushOut, outOfPocket(before.plus(reaction)));
    }
    Vector3 last = forces.on(slot, neighbour)[0].times(-strengths).turnedAboutZ(turn);
    double axial = fromFace() ? -strengths * forces.on(slot, neighbour)[1].z() : 0;
    return force(neighbour, before.plus(last), axial, pushOut);
  }

  /// The wall that takes the greatest part of what presses sideways; the open side is none.
  private @Nullable Wall wall(SlotForce force) {
    double radial = force.radialNewtons();
    boolean open =
        switch (design.layout().insertFrom()) {
          case FACE -> false;
          case OUTSIDE -> radial > 0;
          case INSIDE -> radial < 0;
        };
    double pressing = open ? 0 : Math.abs(radial);
    double along = Math.abs(force.tangentialNewtons());
    if (Math.max(pressing, along) < FillingOrder.NOT_WORTH_A_WORD) {
      return null;
    }
    if (pressing >= along) {
      return radial > 0 ? Wall.OUTER : Wall.INNER;
    }
    return force.tangentialNewtons() > 0 ? Wall.NEXT : Wall.PREVIOUS;
  }
}
