package lodebook.ui.demo;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.random.RandomGenerator;
import java.util.random.RandomGeneratorFactory;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.FieldDerivatives;
import lodebook.assembly.layout.FieldMatrix;
import lodebook.assembly.layout.MutualMagnetisation;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.ReadingPlace;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.layout.RingField;
import lodebook.assembly.layout.RingPolarisation;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.layout.Spread;

/// A gaussmeter and a steady hand for practice: readings computed from the magnets that stand in a
/// ring, with the errors that the layout's spread expects.
///
/// Pocket positions, facings, the probe's place and tilt, the meter's gain (0.5 %) and its floor
/// (0.3 mT) are drawn from a seeded generator; shifts enter by the field's slopes.
final class PracticeGauge {
  private static final double GAIN = 0.005;
  private static final double FLOOR_TESLA = 0.3e-3;

  private final RingDesign design;
  private final RandomGenerator random;

  PracticeGauge(RingDesign design, long seed) {
    this.design = design;
    this.random = RandomGeneratorFactory.of("L64X128MixRandom").create(seed);
  }

  /// The rows of a survey file over every probe point of the layout.
  ///
  /// @param remanencesTesla what really stands in each slot, tesla at 20 °C, slot 1 first
  /// @param facings the way each magnet really faces, slot 1 first
  String survey(double[] remanencesTesla, List<Facing> facings) {
    Spread spread = design.layout().spread();
    List<Facing> leaning = new ArrayList<>();
    for (Facing facing : facings) {
      leaning.add(facing.turned(draw(spread.facingDegrees())));
    }
    RingPolarisation polarisation =
        MutualMagnetisation.of(design).answerTo(RingPolarisation.of(remanencesTesla, leaning));
    List<ReadingPlace> places = new ArrayList<>();
    StringBuilder file = new StringBuilder();
    List<String> rows = new ArrayList<>();
    for (int slot = 1; slot <= design.slots(); slot++) {
      for (Spot spot : design.layout().probe().spots()) {
        for (Component component : design.layout().probe().components()) {
          places.add(ReadingPlace.of(design.layout(), new ProbePoint(slot, spot, component)));
          rows.add(
              slot
                  + ","
                  + (spot == Spot.CENTRE ? "centre" : "to-next")
                  + ","
                  + component.name().toLowerCase(Locale.ROOT));
        }
      }
    }
    double[] flux = read(places, polarisation, spread);
    file.append("slot,spot,component,value,unit,temperature_C\n");
    for (int i = 0; i < flux.length; i++) {
      file.append(
          String.format(Locale.ROOT, "%s,%.1f,mT,20%n", rows.get(i), flux[i] * 1e3)
              .replace("\r", ""));
    }
    return file.toString();
  }

  private double[] read(List<ReadingPlace> places, RingPolarisation polarisation, Spread spread) {
    RingField field = new RingField(design);
    FieldDerivatives slopes = field.derivatives(places);
    List<ReadingPlace> across = places.stream().map(PracticeGauge::across).toList();
    double[] along = field.at(places).apply(polarisation);
    double[] turned = field.at(across).apply(polarisation);
    double[] out = new double[design.slots()];
    double[] next = new double[design.slots()];
    for (int i = 0; i < out.length; i++) {
      out[i] = draw(spread.pocketMetres());
      next[i] = draw(spread.pocketMetres());
    }
    double gain = 1 + draw(GAIN);
    double[] flux = new double[along.length];
    double[] probeOut = slopes.probeOut().apply(polarisation);
    double[] probeNext = slopes.probeNext().apply(polarisation);
    double[] probeUp = slopes.probeUp().apply(polarisation);
    for (int row = 0; row < flux.length; row++) {
      double tilt = Math.toRadians(draw(spread.probeTiltDegrees()));
      double shifted =
          along[row]
              + probeOut[row] * draw(spread.probeMetres())
              + probeNext[row] * draw(spread.probeMetres())
              + probeUp[row] * draw(spread.probeMetres());
      for (int slot = 1; slot <= design.slots(); slot++) {
        shifted += one(slopes.magnetOut(), row, slot, polarisation) * out[slot - 1];
        shifted += one(slopes.magnetNext(), row, slot, polarisation) * next[slot - 1];
      }
      flux[row] =
          gain * (shifted * Math.cos(tilt) + turned[row] * Math.sin(tilt)) + draw(FLOOR_TESLA);
    }
    return flux;
  }

  private static ReadingPlace across(ReadingPlace place) {
    Component other =
        place.component() == Component.RADIAL ? Component.TANGENTIAL : Component.RADIAL;
    return new ReadingPlace(
        place.radiusMetres(), place.angleRadians(), place.heightMetres(), other);
  }

  private static double one(FieldMatrix matrix, int row, int slot, RingPolarisation polarisation) {
    return matrix.perOut(row, slot) * polarisation.out(slot)
        + matrix.perNext(row, slot) * polarisation.next(slot);
  }

  private double draw(double standardDeviation) {
    return standardDeviation * random.nextGaussian();
  }
}
