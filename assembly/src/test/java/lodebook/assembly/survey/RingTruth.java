package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.random.RandomGenerator;
import lodebook.assembly.field.Pose;
import lodebook.assembly.field.PosedBody;
import lodebook.assembly.field.Vector3;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.MutualMagnetisation;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.layout.RingPolarisation;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.layout.Spread;
import lodebook.assembly.magnet.MagnetBody;
import lodebook.assembly.magnet.Strength;

/// A ring as it really is: every magnet with its own strength, place and facing, and a person who
/// reads it with a probe that stands a little elsewhere each time. Readings come from the closed
/// forms at the true places, without any linearisation.
final class RingTruth {
  static final double MEAN_TESLA = 1.3;
  static final double LOT_SPREAD = 0.01;
  static final double PIECE_READING_ERROR = 0.01;

  private record Magnet(PosedBody body, Vector3 polarisation) {}

  private final RingDesign design;
  private final RandomGenerator random;
  private final Map<Integer, PlacedMagnet> recorded = new HashMap<>();
  private final List<Magnet> magnets = new ArrayList<>();

  RingTruth(RingDesign design, int filled, List<Fault> faults, RandomGenerator random) {
    this(design, MutualMagnetisation.of(design), filled, faults, random);
  }

  /// @param mutual how the magnets answer to each other's field, every slot filled
  /// @param filled number of slots filled, from slot 1 on
  /// @param faults what is wrong
  RingTruth(
      RingDesign design,
      MutualMagnetisation mutual,
      int filled,
      List<Fault> faults,
      RandomGenerator random) {
    this.design = design;
    this.random = random;
    Spread spread = design.layout().spread();
    double[] remanence = new double[design.slots()];
    double[] lean = new double[design.slots()];
    List<Facing> facings = new ArrayList<>(design.ruleFacings());
    Set<Integer> present = new TreeSet<>();
    for (int slot = 1; slot <= filled; slot++) {
      double tesla = MEAN_TESLA * (1 + LOT_SPREAD * random.nextGaussian());
      double measured = tesla * (1 + PIECE_READING_ERROR * random.nextGaussian());
      recorded.put(
          slot, new PlacedMagnet(new Strength(measured, PIECE_READING_ERROR * measured), -0.0012));
      lean[slot - 1] = spread.facingDegrees() * random.nextGaussian();
      double facing = design.layout().ruleFacing(slot).radians();
      double[] north = {tesla * Math.cos(facing), tesla * Math.sin(facing)};
      for (Fault fault : faults) {
        if (fault.place() == slot - 1) {
          fault.polarise(north[0], north[1], north, 0);
        }
      }
      remanence[slot - 1] = Math.hypot(north[0], north[1]);
      facings.set(
          slot - 1, new Facing(Math.toDegrees(Math.atan2(north[1], north[0])) + lean[slot - 1]));
      if (remanence[slot - 1] > 0) {
        present.add(slot);
      }
    }
    RingPolarisation polarisation =
        mutual.withOnly(present).answerTo(RingPolarisation.of(remanence, facings));
    for (int slot : present) {
      double out = spread.pocketMetres() * random.nextGaussian();
      double next = spread.pocketMetres() * random.nextGaussian();
      double angle = design.layout().angleFromFirstRadians(slot);
      Vector3 centre =
          new Vector3(design.layout().slotRadiusMetres() + out, next, 0).turnedAboutZ(angle);
      double turn =
          angle
              + design.bodyTurnRadians(slot, design.layout().ruleFacing(slot))
              + Math.toRadians(lean[slot - 1]);
      magnets.add(
          new Magnet(
              new PosedBody(MagnetBody.of(design.typeAt(slot)), Pose.turnedAboutZ(centre, turn)),
              new Vector3(polarisation.out(slot), polarisation.next(slot), 0).turnedAboutZ(angle)));
    }
  }

  /// The ring as the record says.
  SurveyedRing recorded() {
    return new SurveyedRing(design, recorded);
  }

  /// The whole survey of a person who does everything as set, slot by slot.
  ///
  /// @param slots how many slots are read, from slot 1 on
  /// @param gain true gain of the meter: its reading is (1 + gain) times the truth
  /// @param outwards how much farther out than stated the probe always stands, metres
  List<Reading> read(int slots, Meter meter, double gain, double outwards) {
    List<Reading> readings = new ArrayList<>();
    for (int slot = 1; slot <= slots; slot++) {
      for (Spot spot : design.layout().probe().spots()) {
        for (Component component : design.layout().probe().components()) {
          readings.add(
              new Reading(
                  slot,
                  spot,
                  component,
                  value(new ProbePoint(slot, spot, component), meter, gain, outwards),
                  StatedUnit.TESLA,
                  null,
                  null,
                  null,
                  meter));
        }
      }
    }
    return readings;
  }

  /// Reads a survey as a person with a slip does: every row is taken where the slip puts it.
  List<Reading> readWith(Slip slip, Meter meter, double gain) {
    Layout layout = design.layout();
    List<Reading> readings = new ArrayList<>();
    for (Reading row : read(recorded.size(), meter, gain, 0)) {
      ProbePoint real = slip.row(row, layout).point();
      double signed = value(real, meter, gain, 0);
      Reading probe = withValue(row, 1);
      readings.add(withValue(row, signed / slip.row(probe, layout).fluxTesla()));
    }
    return readings;
  }

  static Reading withValue(Reading row, double tesla) {
    return new Reading(
        row.slot(),
        row.spot(),
        row.component(),
        tesla,
        row.unit(),
        row.temperatureCelsius(),
        row.radiusMetres(),
        row.heightMetres(),
        row.meter());
  }

  private double value(ProbePoint point, Meter meter, double gain, double outwards) {
    Layout layout = design.layout();
    Spread spread = layout.spread();
    double angle =
        layout.angleFromFirstRadians(point.slot())
            + (point.spot() == Spot.TO_NEXT ? Math.PI / layout.slots() : 0);
    double error = spread.probeMetres();
    Vector3 at =
        new Vector3(
                layout.probe().radiusMetres() + outwards + error * random.nextGaussian(),
                error * random.nextGaussian(),
                layout.probe().heightMetres() + error * random.nextGaussian())
            .turnedAboutZ(angle);
    double tilt = Math.toRadians(spread.probeTiltDegrees()) * random.nextGaussian();
    double along = angle + tilt + (point.component() == Component.RADIAL ? 0 : Math.PI / 2);
    double sum = 0;
    for (Magnet magnet : magnets) {
      Vector3 flux = magnet.body().flux(at, magnet.polarisation());
      sum += flux.x() * Math.cos(along) + flux.y() * Math.sin(along);
    }
    return (1 + gain) * sum + meter.floorTesla() * random.nextGaussian();
  }
}
