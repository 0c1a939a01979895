package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.List;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.Spot;

/// What a right ring reads at its layout's probe points, at 20 °C, with two standard deviations.
///
/// The band holds for one reading: strengths, pockets, facings, probe position and tilt, the
/// meter's gain and floor, all as the layout's spread and the meter say.
public final class ExpectedReadings {
  private final RingModel ring;
  private final Meter meter;

  /// @param ring the ring as planned, or as far as it is filled
  /// @param meter the meter that will be used
  public ExpectedReadings(SurveyedRing ring, Meter meter) {
    this(ring, meter, new ProbeResponses(ring.design()));
  }

  /// @param ring the ring as planned, or as far as it is filled
  /// @param meter the meter that will be used
  /// @param responses of the same design, perhaps shared with other rings
  public ExpectedReadings(SurveyedRing ring, Meter meter, ProbeResponses responses) {
    this.ring = new RingModel(ring, responses);
    this.meter = meter;
  }

  /// Expected readings at all probe points of the layout: slot by slot, spots and components in the
  /// layout's order.
  public List<ExpectedReading> all() {
    List<ProbePoint> points = new ArrayList<>();
    for (int slot = 1; slot <= ring.slots(); slot++) {
      points.addAll(pointsOf(slot));
    }
    return at(points);
  }

  /// Expected readings at the probe points of one slot.
  public List<ExpectedReading> of(int slot) {
    return at(pointsOf(slot));
  }

  /// Expected readings at any points.
  public List<ExpectedReading> at(List<ProbePoint> points) {
    List<ExpectedReading> expected = new ArrayList<>();
    for (ProbePoint point : points) {
      RowModel row = new RowModel(ring, List.of(row(point)));
      double sd = Math.sqrt(row.covariance(Explanation.NONE)[0][0]);
      expected.add(new ExpectedReading(point, row.mean(Explanation.NONE)[0], 2 * sd));
    }
    return List.copyOf(expected);
  }

  private List<ProbePoint> pointsOf(int slot) {
    List<ProbePoint> points = new ArrayList<>();
    for (Spot spot : ring.layout().probe().spots()) {
      for (Component component : ring.layout().probe().components()) {
        points.add(new ProbePoint(slot, spot, component));
      }
    }
    return points;
  }

  private Row row(ProbePoint point) {
    Layout layout = ring.layout();
    return new Row(
        point,
        layout.probe().radiusMetres(),
        layout.probe().heightMetres(),
        0,
        0,
        true,
        meter,
        null);
  }
}
