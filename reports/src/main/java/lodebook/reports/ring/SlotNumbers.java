package lodebook.reports.ring;

import java.awt.geom.AffineTransform;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import lodebook.reports.canvas.Anchor;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Palette;

/// Writes the slot numbers round the ring: upright where there is room, else along the radius.
final class SlotNumbers {
  /// Length of the pointer at a slot, millimetres.
  static final double POINTER = 5;

  private final Canvas canvas;
  private final RingView view;
  private final RingScale radii;

  SlotNumbers(Canvas canvas, RingView view, RingScale radii) {
    this.canvas = canvas;
    this.view = view;
    this.radii = radii;
  }

  void draw() {
    for (int slot = 1; slot <= view.layout().slots(); slot++) {
      var lettering = Lettering.bold(radii.numberPoints());
      double clock = view.clockRadians(slot);
      Point2D p = Sector.polar(radii.numbers(), clock);
      if (radii.numbersTurned()) {
        boolean right = Math.sin(clock) >= 0;
        var place = AffineTransform.getTranslateInstance(p.getX(), p.getY());
        place.rotate(clock + (right ? -Math.PI / 2 : Math.PI / 2));
        place.translate(0, lettering.capitalMillimetres() / 2);
        canvas.text(Integer.toString(slot), place, lettering, Anchor.MIDDLE);
      } else {
        canvas.centred(Integer.toString(slot), p.getX(), p.getY(), lettering);
      }
    }
  }

  /// Frames a slot with its number and points at it from the middle of the ring.
  void point(int slot) {
    double half = Math.PI / view.layout().slots();
    double clock = view.clockRadians(slot);
    double in = Math.max(innermost() - 0.5, 0);
    double out = 2 * radii.numbers() - radii.outermostDrawn() - 0.2;
    var frame = new Sector(in, out, clock - half, clock + half);
    canvas.stroke(frame.outline(), Palette.GRAPHITE, 0.7);
    double length = Math.min(POINTER, 0.6 * in);
    Point2D tip = Sector.polar(in - 0.6, clock);
    Point2D foot = Sector.polar(in - length, clock);
    double across = 0.4 * length;
    var pointer = new Path2D.Double();
    pointer.moveTo(tip.getX(), tip.getY());
    pointer.lineTo(foot.getX() + across * Math.cos(clock), foot.getY() + across * Math.sin(clock));
    pointer.lineTo(foot.getX() - across * Math.cos(clock), foot.getY() - across * Math.sin(clock));
    pointer.closePath();
    canvas.fill(pointer, Palette.GRAPHITE);
  }

  private double innermost() {
    return Math.min(radii.inner(), Math.min(radii.lotInner(), radii.shadeInner()));
  }
}
