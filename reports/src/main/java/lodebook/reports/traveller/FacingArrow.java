package lodebook.reports.traveller;

import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Numbering;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Palette;
import lodebook.reports.ring.Arrow;

/// A small picture of a facing: the slot stands on top of the ring, seen on the marked face, so up
/// is away from the axis.
final class FacingArrow {
  /// Size of the picture, millimetres.
  static final double SIZE = 9;

  private FacingArrow() {}

  static void draw(Canvas canvas, Layout layout, Facing facing) {
    int sense = layout.numbering() == Numbering.CLOCKWISE ? 1 : -1;
    double dx = sense * Math.sin(facing.radians());
    double dy = -Math.cos(facing.radians());
    double middle = SIZE / 2;
    canvas.fill(new Rectangle2D.Double(0.4, 0.4, SIZE - 0.8, SIZE - 0.8), Palette.PAPER);
    canvas.stroke(new Rectangle2D.Double(0.4, 0.4, SIZE - 0.8, SIZE - 0.8), Palette.RULE, 0.2);
    // the side towards the axis is a double line
    canvas.stroke(new Line2D.Double(0.4, SIZE - 0.2, SIZE - 0.4, SIZE - 0.2), Palette.PENCIL, 0.5);
    var tail = new Point2D.Double(middle - 3.6 * dx, middle - 3.6 * dy);
    var head = new Point2D.Double(middle + 1.0 * dx, middle + 1.0 * dy);
    Arrow.draw(canvas, tail, head, 1.9, 0.55);
    canvas.centred("N", middle + 2.5 * dx, middle + 2.5 * dy, Lettering.bold(8.5));
  }
}
