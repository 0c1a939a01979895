package lodebook.reports.ring;

import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.Arc2D;
import java.awt.geom.Area;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.magnet.MagnetType;

/// The outline of a magnet, seen along the rotor's axis, in its slot's frame.
///
/// Coordinates in millimetres from the magnet's centre: first away from the axis, second towards
/// the next slot. A disc is seen from its side. An arc keeps its own curvature.
///
/// @param outline the body
/// @param north direction of its north, radians from out towards next
/// @param curvatureCentre where the axis of the rings that bound an arc stands on the first
///   coordinate, or NaN for other shapes
record MagnetBody(Shape outline, double north, double curvatureCentre) {
  /// The body of a magnet in a slot.
  ///
  /// @param turns whether bodies turn with their facing
  /// @param alongRing whether the body lies with its thickness along the ring (side magnets of a
  ///   type of their own)
  static MagnetBody of(MagnetType type, Facing facing, boolean turns, boolean alongRing) {
    double stands =
        turns
            ? facing.radians() - Math.toRadians(type.magnetisationDegrees())
            : alongRing ? Math.PI / 2 : 0;
    Shape square =
        switch (type.shape()) {
          case BLOCK -> plate(type.thicknessMetres(), type.widthMetres());
          case DISC -> plate(type.thicknessMetres(), type.diameterMetres());
          case ROD -> {
            double d = 1e3 * type.diameterMetres();
            yield new Ellipse2D.Double(-d / 2, -d / 2, d, d);
          }
          case ARC -> segment(type);
        };
    boolean arc = type.shape() == lodebook.assembly.magnet.Shape.ARC;
    if (arc) {
      return new MagnetBody(square, facing.radians(), -meanRadius(type));
    }
    Shape turned = AffineTransform.getRotateInstance(stands).createTransformedShape(square);
    return new MagnetBody(turned, facing.radians(), Double.NaN);
  }

  private static Shape plate(double thicknessMetres, double widthMetres) {
    double t = 1e3 * thicknessMetres;
    double w = 1e3 * widthMetres;
    return new Rectangle2D.Double(-t / 2, -w / 2, t, w);
  }

  private static double meanRadius(MagnetType type) {
    return 1e3 * (type.diameterMetres() + type.innerDiameterMetres()) / 4;
  }

  private static Shape segment(MagnetType type) {
    double half = type.arcDegrees() / 2;
    var path = new Path2D.Double();
    path.append(arc(type.diameterMetres(), -half, type.arcDegrees()), false);
    path.append(arc(type.innerDiameterMetres(), half, -type.arcDegrees()), true);
    path.closePath();
    return AffineTransform.getTranslateInstance(-meanRadius(type), 0).createTransformedShape(path);
  }

  private static Arc2D arc(double diameterMetres, double startDegrees, double extentDegrees) {
    double d = 1e3 * diameterMetres;
    return new Arc2D.Double(-d / 2, -d / 2, d, d, startDegrees, extentDegrees, Arc2D.OPEN);
  }

  /// The part of the body on the side of its north.
  Shape northHalf() {
    var half = new Area(outline);
    half.intersect(new Area(northSide()));
    return half;
  }

  private Shape northSide() {
    double reach =
        4 * Math.max(outline.getBounds2D().getWidth(), outline.getBounds2D().getHeight());
    boolean radial = Math.abs(Math.sin(north)) < 1e-6;
    if (!Double.isNaN(curvatureCentre) && radial) {
      double r = -curvatureCentre;
      var inner = new Area(new Ellipse2D.Double(-2 * r, -r, 2 * r, 2 * r));
      if (Math.cos(north) < 0) {
        return inner;
      }
      var outer = new Area(new Rectangle2D.Double(-reach, -reach, 2 * reach, 2 * reach));
      outer.subtract(inner);
      return outer;
    }
    return AffineTransform.getRotateInstance(north)
        .createTransformedShape(new Rectangle2D.Double(0, -reach, reach, 2 * reach));
  }

  /// How far the body reaches from its centre in a direction until it ends, millimetres.
  ///
  /// @param radians direction from out towards next
  double reach(double radians) {
    double far = Math.hypot(outline.getBounds2D().getWidth(), outline.getBounds2D().getHeight());
    double near = 0;
    for (int i = 0; i < 30; i++) {
      double middle = (near + far) / 2;
      if (outline.contains(middle * Math.cos(radians), middle * Math.sin(radians))) {
        near = middle;
      } else {
        far = middle;
      }
    }
    return near;
  }
}
