package lodebook.ui.desk.survey;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.survey.Diagnosis;
import lodebook.assembly.survey.ExpectedReading;
import lodebook.db.builds.RotorShown;
import lodebook.db.surveys.RecordedReading;
import lodebook.db.surveys.Survey;
import lodebook.reports.ring.ShownReading;
import org.jspecify.annotations.Nullable;

/// A rotor with a round of readings, as far as it has come.
///
/// @param rotor the rotor
/// @param surveys all its surveys, the latest last
/// @param survey the survey that is shown, or null before the first reading of a new one
/// @param readings its readings in the order in which they were recorded
/// @param expected what a right ring reads, at each point of the layout
/// @param diagnosis what the readings show, or null where they have not been judged
public record Round(
    RotorShown rotor,
    List<Survey> surveys,
    @Nullable Survey survey,
    List<RecordedReading> readings,
    List<ExpectedReading> expected,
    @Nullable Diagnosis diagnosis) {
  public Round {
    surveys = List.copyOf(surveys);
    readings = List.copyOf(readings);
    expected = List.copyOf(expected);
  }

  /// The rotor's number.
  public String code() {
    return rotor.rotor().code();
  }

  /// The points at which a layout is read, in order.
  static List<ProbePoint> points(Layout layout) {
    List<ProbePoint> points = new ArrayList<>();
    for (int slot = 1; slot <= layout.slots(); slot++) {
      for (Spot spot : layout.probe().spots()) {
        for (Component component : layout.probe().components()) {
          points.add(new ProbePoint(slot, spot, component));
        }
      }
    }
    return points;
  }

  /// The points not yet read, in order.
  public List<ProbePoint> missing() {
    List<ProbePoint> missing = points(rotor.design().layout());
    readings.forEach(r -> missing.remove(r.reading().point()));
    return missing;
  }

  /// The band round the ring: expected values, and the last reading at each point.
  public List<ShownReading> band() {
    Map<ProbePoint, Double> read = new HashMap<>();
    readings.forEach(r -> read.put(r.reading().point(), r.reading().fluxTesla()));
    return expected.stream()
        .map(e -> new ShownReading(e.point(), e.valueTesla(), e.bandTesla(), read.get(e.point())))
        .toList();
  }

  /// The same round with what its readings show.
  Round judged(Diagnosis shown) {
    return new Round(rotor, surveys, survey, readings, expected, shown);
  }
}
