package lodebook.assembly.plan;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.field.Load;
import lodebook.assembly.field.Pose;
import lodebook.assembly.field.PosedBody;
import lodebook.assembly.field.PosedMagnet;
import lodebook.assembly.field.Vector3;
import lodebook.assembly.layout.InsertFrom;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.magnet.MagnetType;

/// Forces between the magnets of a ring, pair by pair, for a remanence of 1 T each: one stands
/// where it belongs, the other there or drawn out of its pocket by some part of its size.
///
/// Facings are those of the rule and polarisations stay as they are, whatever the field (recoil
/// makes forces a few per cent smaller). Magnets more than twelve slots away are left out.
public final class UnitForces {
  /// How far the magnet is drawn out, as a part of its size in that direction.
  static final double[] DRAWN_OUT = {0, 0.05, 0.25, 0.5, 0.75, 1, 1.2};

  private static final int FARTHEST = 12;

  private final RingDesign design;
  private final int slots;
  private final int period;
  private final Map<Integer, Vector3[]> known = new HashMap<>();

  /// Forces in a ring; each is computed when it is asked for first. Not for several threads.
  public UnitForces(RingDesign design) {
    this.design = design;
    slots = design.slots();
    period = design.layout().segmentsPerPolePair();
  }

  RingDesign design() {
    return design;
  }

  /// Force on one magnet from another in the first one's slot directions (radial, to next, axial),
  /// newtons per square tesla, one for each of [#DRAWN_OUT].
  ///
  /// @param slot the magnet that feels the force and is drawn out, from 1
  /// @param from the one that exerts it
  Vector3[] on(int slot, int from) {
    int apart = Math.floorMod(from - slot, slots);
    int kind = (slot - 1) % period;
    return known.computeIfAbsent(
        kind * slots + apart,
        key -> computed(kind + 1, (kind + apart) % slots + 1, Math.min(apart, slots - apart)));
  }

  private Vector3[] computed(int slot, int from, int distance) {
    Vector3[] forces = new Vector3[DRAWN_OUT.length];
    PosedMagnet source = magnet(from, 0);
    double angle = design.layout().angleFromFirstRadians(slot);
    for (int i = 0; i < forces.length; i++) {
      forces[i] =
          distance > FARTHEST
              ? Vector3.ZERO
              : Load.on(magnet(slot, DRAWN_OUT[i]), List.of(source)).force().turnedAboutZ(-angle);
    }
    return forces;
  }

  private PosedMagnet magnet(int slot, double drawnOut) {
    PosedBody body = design.bodyAt(slot);
    double angle = design.layout().angleFromFirstRadians(slot);
    double north = angle + design.layout().ruleFacing(slot).radians();
    InsertFrom from = design.layout().insertFrom();
    Vector3 radial = new Vector3(Math.cos(angle), Math.sin(angle), 0);
    Vector3 way =
        switch (from) {
          case FACE -> new Vector3(0, 0, 1);
          case OUTSIDE -> radial;
          case INSIDE -> radial.times(-1);
        };
    Pose pose = body.pose();
    Vector3 centre = pose.centre().plus(way.times(drawnOut * size(slot, from)));
    return new PosedMagnet(
        new PosedBody(body.body(), new Pose(centre, pose.xAxis(), pose.yAxis())),
        new Vector3(Math.cos(north), Math.sin(north), 0));
  }

  /// Size of a magnet along the way out, metres.
  private double size(int slot, InsertFrom from) {
    MagnetType type = design.typeAt(slot);
    return switch (from) {
      case FACE -> type.lengthMetres() > 0 ? type.lengthMetres() : type.diameterMetres();
      case OUTSIDE, INSIDE ->
          switch (type.shape()) {
            case BLOCK, DISC -> type.thicknessMetres();
            case ROD -> type.diameterMetres();
            case ARC -> (type.diameterMetres() - type.innerDiameterMetres()) / 2;
          };
    };
  }
}
