package lodebook.reports.ring;

import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Palette;

/// An arrow with a filled head.
public final class Arrow {
  private Arrow() {}

  /// Draws an arrow.
  ///
  /// @param barb length of its head, millimetres
  /// @param width width of its shaft, millimetres
  public static void draw(Canvas canvas, Point2D tail, Point2D head, double barb, double width) {
    double dx = (head.getX() - tail.getX()) / tail.distance(head);
    double dy = (head.getY() - tail.getY()) / tail.distance(head);
    double neckX = head.getX() - barb * dx;
    double neckY = head.getY() - barb * dy;
    canvas.stroke(
        new Line2D.Double(tail.getX(), tail.getY(), neckX, neckY), Palette.GRAPHITE, width);
    var triangle = new Path2D.Double();
    triangle.moveTo(head.getX(), head.getY());
    triangle.lineTo(neckX - 0.45 * barb * dy, neckY + 0.45 * barb * dx);
    triangle.lineTo(neckX + 0.45 * barb * dy, neckY - 0.45 * barb * dx);
    triangle.closePath();
    canvas.fill(triangle, Palette.GRAPHITE);
  }
}
