package lodebook.reports.ring;

import java.awt.Shape;
import java.awt.geom.Arc2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;

/// A piece of an annulus about the axis, millimetres and clock angles in radians.
record Sector(double inner, double outer, double from, double to) {
  /// A point by share of the way outwards and along the sector.
  Point2D at(double outwards, double along) {
    return polar(inner + outwards * (outer - inner), from + along * (to - from));
  }

  /// A point by radius and clock angle.
  static Point2D polar(double radius, double clockRadians) {
    return new Point2D.Double(radius * Math.sin(clockRadians), -radius * Math.cos(clockRadians));
  }

  /// A circle about the axis.
  static Shape circle(double radius) {
    return new Ellipse2D.Double(-radius, -radius, 2 * radius, 2 * radius);
  }

  /// The whole annulus between two radii.
  static Shape annulus(double inner, double outer) {
    var both = new Path2D.Double(Path2D.WIND_EVEN_ODD);
    both.append(circle(outer), false);
    both.append(circle(inner), false);
    return both;
  }

  Shape outline() {
    var path = new Path2D.Double();
    path.append(arc(outer, 0, 1), false);
    path.append(arc(inner, 1, 0), true);
    path.closePath();
    return path;
  }

  /// An arc at a radius between two shares of the way along the sector.
  Arc2D arc(double radius, double start, double end) {
    double a = 90 - Math.toDegrees(from + start * (to - from));
    double b = 90 - Math.toDegrees(from + end * (to - from));
    return new Arc2D.Double(-radius, -radius, 2 * radius, 2 * radius, a, b - a, Arc2D.OPEN);
  }

  /// A straight line between two points of the sector.
  Line2D line(double outwards1, double along1, double outwards2, double along2) {
    return new Line2D.Double(at(outwards1, along1), at(outwards2, along2));
  }
}
