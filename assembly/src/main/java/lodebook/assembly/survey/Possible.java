package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.List;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Shape;

/// Which faults a magnet can have in its slot, by its shape and the way it is held.
final class Possible {
  private static final double[] WEAK_STEPS = {0.75, 0.4};
  private static final double STRONG_STEP = 1.25;
  private static final double[] TURN_STEPS_DEGREES = {22, 45, 68, 112, 135, 158};

  private Possible() {}

  /// One fault per kind and step of its amount for a slot index from 0; nothing for an empty slot.
  static List<Fault> of(RingModel ring, int slot) {
    List<Fault> faults = new ArrayList<>();
    if (!ring.filled(slot)) {
      return faults;
    }
    faults.add(Fault.of(slot, FaultKind.REVERSED));
    faults.add(Fault.of(slot, FaultKind.MISSING));
    MagnetType type = ring.ring().design().typeAt(slot + 1);
    if (takesQuarterTurns(type, ring.layout().bodyTurns())) {
      faults.add(Fault.of(slot, FaultKind.QUARTER_TURN_FORWARD));
      faults.add(Fault.of(slot, FaultKind.QUARTER_TURN_BACK));
    }
    for (double share : WEAK_STEPS) {
      faults.add(new Fault(slot, FaultKind.WEAK, share));
    }
    faults.add(new Fault(slot, FaultKind.STRONG, STRONG_STEP));
    if (type.shape() == Shape.ROD) {
      for (double degrees : TURN_STEPS_DEGREES) {
        faults.add(new Fault(slot, FaultKind.TURNED, Math.toRadians(degrees)));
        faults.add(new Fault(slot, FaultKind.TURNED, Math.toRadians(-degrees)));
      }
    }
    return faults;
  }

  /// A body that turns with its facing fits its pocket a quarter on only if it is square or round
  /// there; one that stays square to the ring is taken as pressed at the angle it shows, so any
  /// quarter may be a magnet pressed for another slot.
  private static boolean takesQuarterTurns(MagnetType type, boolean bodyTurns) {
    return switch (type.shape()) {
      case ROD -> true;
      case BLOCK ->
          !bodyTurns
              || Math.abs(type.thicknessMetres() - type.widthMetres())
                  <= Math.max(2 * type.toleranceMetres(), 1e-6);
      case DISC, ARC -> !bodyTurns;
    };
  }
}
