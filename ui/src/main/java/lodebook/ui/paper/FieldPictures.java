package lodebook.ui.paper;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeSet;
import lodebook.assembly.field.Vector3;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Probe;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.layout.RingFlux;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.survey.ExpectedReading;
import lodebook.assembly.survey.ExpectedReadings;
import lodebook.assembly.survey.Meter;
import lodebook.assembly.survey.PlacedMagnet;
import lodebook.assembly.survey.Reading;
import lodebook.assembly.survey.SurveyedRing;
import lodebook.reports.film.FieldPicture;
import lodebook.reports.ring.ShownReading;

/// The radial flux density round a ring at the probe's radius and height: what is expected of what
/// stands in it, and what was read.
public final class FieldPictures {
  private static final Meter METER = new Meter("", 0.01, 0);
  private static final int PER_SLOT = 24;

  private FieldPictures() {}

  /// The picture of a ring.
  ///
  /// @param title the layout's or rotor's name
  /// @param magnets what stands in it
  /// @param readings what was read, perhaps nothing; only radial readings at the layout's radius
  ///   and height are shown, the last of each place
  public static FieldPicture of(
      String title,
      RingDesign design,
      Map<Integer, PlacedMagnet> magnets,
      List<Reading> readings,
      Locale language) {
    Map<ProbePoint, Double> read = new HashMap<>();
    for (Reading reading : readings) {
      if (reading.component() == Component.RADIAL
          && reading.radiusMetres() == null
          && reading.heightMetres() == null) {
        read.put(reading.point(), reading.fluxTesla());
      }
    }
    TreeSet<Spot> spots = new TreeSet<>(design.layout().probe().spots());
    read.keySet().forEach(point -> spots.add(point.spot()));
    List<ProbePoint> points = new ArrayList<>();
    for (int slot = 1; slot <= design.slots(); slot++) {
      for (Spot spot : spots) {
        points.add(new ProbePoint(slot, spot, Component.RADIAL));
      }
    }
    List<ShownReading> shown = new ArrayList<>();
    List<ExpectedReading> expected =
        new ExpectedReadings(new SurveyedRing(design, magnets), METER).at(points);
    for (ExpectedReading each : expected) {
      shown.add(
          new ShownReading(
              each.point(), each.valueTesla(), each.bandTesla(), read.get(each.point())));
    }
    return new FieldPicture(title, design.slots(), curve(design, magnets), shown, language);
  }

  private static double[] curve(RingDesign design, Map<Integer, PlacedMagnet> magnets) {
    double[] remanence = new double[design.slots()];
    magnets.forEach((slot, magnet) -> remanence[slot - 1] = magnet.strength().remanenceTesla());
    RingFlux flux = new RingFlux(design, remanence, design.ruleFacings());
    Probe probe = design.layout().probe();
    double[] curve = new double[PER_SLOT * design.slots()];
    for (int i = 0; i < curve.length; i++) {
      double angle = 2 * Math.PI * i / curve.length;
      Vector3 point =
          new Vector3(probe.radiusMetres(), 0, probe.heightMetres()).turnedAboutZ(angle);
      curve[i] = flux.at(point).turnedAboutZ(-angle).x();
    }
    return curve;
  }
}
