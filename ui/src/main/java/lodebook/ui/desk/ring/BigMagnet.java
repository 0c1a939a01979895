package lodebook.ui.desk.ring;

import java.awt.geom.AffineTransform;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import lodebook.assembly.layout.Facing;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Palette;
import lodebook.reports.ring.Arrow;

/// One magnet drawn large in the middle of the ring, as it goes into the slot on top: an arrow from
/// south to north and a large N.
final class BigMagnet {
  /// What is cleared beyond the magnet's room, millimetres.
  private static final double CLEAR = 3;

  private BigMagnet() {}

  /// Draws it about the canvas's origin.
  ///
  /// @param radius room about the origin, millimetres
  /// @param sense +1 where slot numbers rise clockwise in the picture
  static void draw(Canvas canvas, double radius, Facing facing, int sense) {
    double clear = radius + CLEAR;
    canvas.fill(new Ellipse2D.Double(-clear, -clear, 2 * clear, 2 * clear), Palette.PAPER);
    double half = 0.88 * radius;
    double across = 0.44 * radius;
    AffineTransform turn = AffineTransform.getRotateInstance(sense * facing.radians());
    canvas.fill(
        turn.createTransformedShape(new Rectangle2D.Double(-across, -half, 2 * across, 2 * half)),
        Palette.SOUTH);
    canvas.fill(
        turn.createTransformedShape(new Rectangle2D.Double(-across, -half, 2 * across, half)),
        Palette.NORTH);
    canvas.stroke(
        turn.createTransformedShape(new Rectangle2D.Double(-across, -half, 2 * across, 2 * half)),
        Palette.GRAPHITE,
        0.5);
    Point2D tail = turn.transform(new Point2D.Double(0, 0.82 * half), null);
    Point2D head = turn.transform(new Point2D.Double(0, -0.16 * half), null);
    Arrow.draw(canvas, tail, head, 0.42 * half, 0.09 * half);
    Point2D letter = turn.transform(new Point2D.Double(0, -0.58 * half), null);
    double points = 0.52 * half / Lettering.bold(1).capitalMillimetres();
    canvas.centred("N", letter.getX(), letter.getY(), Lettering.bold(points));
  }
}
