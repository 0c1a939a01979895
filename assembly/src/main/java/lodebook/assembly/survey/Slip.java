package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.List;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.Spot;

/// What the person measuring did, in full.
///
/// @param measuring as people are told
/// @param tangentialTurned going the other way round, whether the tangential sign turned with the
///   person
record Slip(Measuring measuring, boolean tangentialTurned) {
  static final Slip NONE = new Slip(Measuring.AS_SET, false);

  /// Every slip that a ring allows, as set first.
  static List<Slip> all(int slots) {
    List<Slip> slips = new ArrayList<>();
    for (Measuring.UnitSlip unit : Measuring.UnitSlip.values()) {
      for (Measuring.Sign sign : Measuring.Sign.values()) {
        for (int start = 1; start <= slots; start++) {
          slips.add(
              new Slip(new Measuring(sign, start, Measuring.Direction.AS_NUMBERED, unit), false));
          Measuring back = new Measuring(sign, start, Measuring.Direction.OPPOSITE, unit);
          slips.add(new Slip(back, false));
          slips.add(new Slip(back, true));
        }
      }
    }
    return slips;
  }

  private boolean opposite() {
    return measuring.direction() == Measuring.Direction.OPPOSITE;
  }

  /// The slot that was really under the probe when a row of a slot was taken.
  int realSlot(int written, int slots) {
    int steps = written - 1;
    return Math.floorMod(measuring.startSlot() - 1 + (opposite() ? -steps : steps), slots) + 1;
  }

  /// The slot under which a real slot was written down.
  int writtenSlot(int real, int slots) {
    int steps = real - measuring.startSlot();
    return Math.floorMod(opposite() ? -steps : steps, slots) + 1;
  }

  /// Where a reading was really taken.
  ProbePoint realPoint(Reading reading, Layout layout) {
    int slot = realSlot(reading.slot(), layout.slots());
    if (opposite() && reading.spot() == Spot.TO_NEXT) {
      slot = layout.previous(slot);
    }
    return new ProbePoint(slot, reading.spot(), reading.component());
  }

  /// The reading as it was really taken.
  Row row(Reading reading, Layout layout) {
    Double radius = reading.radiusMetres();
    Double height = reading.heightMetres();
    Double temperature = reading.temperatureCelsius();
    return new Row(
        realPoint(reading, layout),
        radius == null ? layout.probe().radiusMetres() : radius,
        height == null ? layout.probe().heightMetres() : height,
        reading.fluxTesla() * freeing(reading.component()),
        temperature == null ? 0 : temperature - 20,
        temperature != null,
        reading.meter(),
        reading.filled());
  }

  /// Factor that frees a value of a component as written from the slip.
  double freeing(Component component) {
    boolean turned = tangentialTurned && component == Component.TANGENTIAL;
    boolean inverted = measuring.sign() == Measuring.Sign.INVERTED;
    return (turned == inverted ? 1 : -1) / unitFactor();
  }

  List<Row> rows(List<Reading> readings, Layout layout) {
    return readings.stream().map(reading -> row(reading, layout)).toList();
  }

  private double unitFactor() {
    return switch (measuring.unit()) {
      case AS_STATED -> 1;
      case GAUSS_AS_MILLITESLA -> 10;
      case MILLITESLA_AS_GAUSS -> 0.1;
    };
  }

  /// Natural logarithm of the prior odds of this slip against everything as set.
  double logPrior(Priors priors, int slots) {
    double log = 0;
    if (measuring.sign() == Measuring.Sign.INVERTED) {
      log += Math.log(priors.signInverted());
    }
    if (measuring.startSlot() != 1) {
      log += Math.log(priors.otherStart() * startShare(slots));
    }
    if (opposite()) {
      log += Math.log(priors.opposite() / 2);
    }
    if (measuring.unit() != Measuring.UnitSlip.AS_STATED) {
      log += Math.log(priors.unitSlip());
    }
    return log;
  }

  /// An explanation found under this slip, as another slip would have it: the same rows, other
  /// slots. Going the other way round exchanges forward and back.
  Explanation image(Explanation explanation, Slip other, int slots) {
    boolean mirrored = opposite() != other.opposite();
    List<Fault> faults = new ArrayList<>();
    for (Fault fault : explanation.faults()) {
      if (!fault.ofMagnet()) {
        faults.add(fault);
        continue;
      }
      int slot = other.realSlot(writtenSlot(fault.place() + 1, slots), slots) - 1;
      FaultKind kind = fault.kind();
      if (mirrored && kind == FaultKind.QUARTER_TURN_FORWARD) {
        kind = FaultKind.QUARTER_TURN_BACK;
      } else if (mirrored && kind == FaultKind.QUARTER_TURN_BACK) {
        kind = FaultKind.QUARTER_TURN_FORWARD;
      }
      boolean turnsBack = mirrored && kind == FaultKind.TURNED;
      faults.add(new Fault(slot, kind, turnsBack ? -fault.amount() : fault.amount()));
    }
    return new Explanation(faults);
  }

  /// Share of this start among all starts but slot 1: falls with the square of the distance.
  private double startShare(int slots) {
    double all = 0;
    for (int start = 2; start <= slots; start++) {
      all += closeness(start, slots);
    }
    return closeness(measuring.startSlot(), slots) / all;
  }

  private static double closeness(int start, int slots) {
    int distance = Math.min(start - 1, slots - start + 1);
    return 1.0 / (distance * distance);
  }
}
