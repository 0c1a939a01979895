package lodebook.reports.ring;

import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Spot;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Palette;

/// The band of readings round a ring, one for each component: the expected value as a thin line,
/// its band in grey, the value read as a dot; a dot outside its band has a circle round it.
///
/// The middle of a band is zero, its outer edge is plus.
final class ReadingBand {
  private final Canvas canvas;
  private final RingView view;
  private final RingScale radii;
  private final List<ShownReading> readings;
  private final double fullTesla;

  ReadingBand(Canvas canvas, RingPicture picture, RingScale radii) {
    this.canvas = canvas;
    this.view = new RingView(picture.layout(), picture.face());
    this.radii = radii;
    this.readings = picture.readings();
    this.fullTesla = fullTesla(readings);
  }

  /// The components that readings hold, radial first.
  static List<Component> components(List<ShownReading> readings) {
    return Stream.of(Component.values())
        .filter(c -> readings.stream().anyMatch(r -> r.point().component() == c))
        .toList();
  }

  /// The value at a band's edge: the largest shown, rounded up to a tenth of its power of ten.
  static double fullTesla(List<ShownReading> readings) {
    double most = 1e-6;
    for (ShownReading r : readings) {
      most = Math.max(most, Math.abs(r.expectedTesla()) + r.bandTesla());
      if (r.readTesla() != null) {
        most = Math.max(most, Math.abs(r.readTesla()));
      }
    }
    double power = Math.pow(10, Math.floor(Math.log10(most)) - 1);
    return Math.ceil(1.04 * most / power) * power;
  }

  void draw() {
    List<Component> components = components(readings);
    double height =
        components.isEmpty() ? 0 : (radii.bandOuter() - radii.bandInner()) / components.size();
    for (int i = 0; i < components.size(); i++) {
      double inner = radii.bandInner() + i * height;
      one(components.get(i), inner + 0.4, inner + height - 0.4);
    }
  }

  private double place(ShownReading r) {
    return r.point().slot() + (r.point().spot() == Spot.CENTRE ? 0 : 0.5);
  }

  private void one(Component component, double inner, double outer) {
    double zero = (inner + outer) / 2;
    double perTesla = (outer - inner) / 2 / fullTesla;
    canvas.stroke(Sector.circle(inner), Palette.RULE, 0.12);
    canvas.stroke(Sector.circle(outer), Palette.RULE, 0.12);
    canvas.stroke(Sector.circle(zero), Palette.RULE, 0.12, 0.6, 0.6);
    List<ShownReading> round = new ArrayList<>();
    for (ShownReading r : readings) {
      if (r.point().component() == component) {
        round.add(r);
      }
    }
    round.sort(Comparator.comparingDouble(this::place));
    double pitch = 2 * Math.PI * zero / view.layout().slots();
    double bar = Math.clamp(0.28 * pitch, 0.4, 1.8);
    for (ShownReading r : round) {
      double clock = view.clockRadians(place(r));
      double low = zero + perTesla * (r.expectedTesla() - r.bandTesla());
      double high = zero + perTesla * (r.expectedTesla() + r.bandTesla());
      canvas.stroke(
          new Line2D.Double(
              Sector.polar(Math.min(low, zero + perTesla * r.expectedTesla() - 0.3), clock),
              Sector.polar(Math.max(high, zero + perTesla * r.expectedTesla() + 0.3), clock)),
          Palette.RULE,
          bar);
    }
    line(round, zero, perTesla);
    for (ShownReading r : round) {
      if (r.readTesla() != null) {
        double clock = view.clockRadians(place(r));
        dot(Sector.polar(zero + perTesla * r.readTesla(), clock), 0.32 * bar + 0.15, r.outside());
      }
    }
  }

  private void line(List<ShownReading> round, double zero, double perTesla) {
    if (round.size() < 2) {
      return;
    }
    var path = new Path2D.Double();
    boolean whole = round.size() >= view.layout().slots();
    for (int i = 0; i < round.size() + (whole ? 1 : 0); i++) {
      ShownReading r = round.get(i % round.size());
      Point2D p = Sector.polar(zero + perTesla * r.expectedTesla(), view.clockRadians(place(r)));
      if (i == 0) {
        path.moveTo(p.getX(), p.getY());
      } else {
        path.lineTo(p.getX(), p.getY());
      }
    }
    canvas.stroke(path, Palette.GRAPHITE, 0.16);
  }

  private void dot(Point2D p, double radius, boolean outside) {
    canvas.fill(circle(p, radius), Palette.GRAPHITE);
    if (outside) {
      canvas.stroke(circle(p, radius + 0.75), Palette.GRAPHITE, 0.35);
    }
  }

  private static Ellipse2D circle(Point2D p, double radius) {
    return new Ellipse2D.Double(p.getX() - radius, p.getY() - radius, 2 * radius, 2 * radius);
  }
}
