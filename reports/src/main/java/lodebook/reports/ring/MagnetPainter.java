package lodebook.reports.ring;

import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.Point2D;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.magnet.MagnetType;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Palette;

/// Draws the magnet of a slot: its body, the half with its north tinted, an arrow from south to
/// north and the letter N at the arrow's head.
final class MagnetPainter {
  /// Where the letter stands and where the arrow ends, as shares of the way from the centre to the
  /// body's edge along the north.
  private static final double LETTER = 0.60;

  private static final double HEAD = 0.22;
  private static final double TAIL = 0.82;

  private final Canvas canvas;
  private final RingPicture picture;
  private final RingView view;
  private final double scale;

  MagnetPainter(Canvas canvas, RingPicture picture, double scale) {
    this.canvas = canvas;
    this.picture = picture;
    this.view = new RingView(picture.layout(), picture.face());
    this.scale = scale;
  }

  /// The body of a slot's magnet; an empty slot has the body that the layout's rule asks for.
  static MagnetBody body(RingPicture picture, DrawnSlot drawn) {
    var layout = picture.layout();
    Facing facing = drawn.facing() == null ? layout.ruleFacing(drawn.slot()) : drawn.facing();
    MagnetType type = picture.typeAt(drawn.slot());
    boolean along = picture.sideType() != null && layout.liesAlong(drawn.slot());
    return MagnetBody.of(type, facing, layout.bodyTurns(), along);
  }

  /// From millimetres of the ring about a slot's magnet to the picture.
  private AffineTransform place(int slot) {
    AffineTransform place = AffineTransform.getScaleInstance(scale, scale);
    place.concatenate(view.slotFrame(slot));
    place.translate(1e3 * picture.layout().slotRadiusMetres(), 0);
    return place;
  }

  void draw(DrawnSlot drawn) {
    MagnetBody body = body(picture, drawn);
    AffineTransform place = place(drawn.slot());
    Shape outline = place.createTransformedShape(body.outline());
    double line = Math.clamp(0.09 * scale, 0.12, 0.3);
    if (drawn.facing() == null) {
      canvas.stroke(outline, Palette.GRAPHITE, line, 0.8, 0.6);
      return;
    }
    canvas.fill(outline, Palette.SOUTH);
    canvas.fill(place.createTransformedShape(body.northHalf()), Palette.NORTH);
    canvas.stroke(outline, Palette.GRAPHITE, line);
    arrow(body, place);
  }

  private void arrow(MagnetBody body, AffineTransform place) {
    double ahead = body.reach(body.north());
    double behind = body.reach(body.north() + Math.PI);
    Point2D tail = along(place, body.north(), -TAIL * behind);
    Point2D head = along(place, body.north(), HEAD * ahead);
    Point2D letter = along(place, body.north(), LETTER * ahead);
    double length = tail.distance(head);
    double barb = Math.min(0.42 * length, 2.2);
    Arrow.draw(canvas, tail, head, barb, Math.clamp(0.07 * length, 0.15, 0.6));
    double across = body.reach(body.north() + Math.PI / 2) * scale;
    double capital = Math.min(0.62 * ahead * scale, 1.3 * across);
    double points = Math.min(capital / Lettering.bold(1).capitalMillimetres(), 11);
    canvas.centred("N", letter.getX(), letter.getY(), Lettering.bold(points));
  }

  private static Point2D along(AffineTransform place, double direction, double millimetres) {
    return place.transform(
        new Point2D.Double(millimetres * Math.cos(direction), millimetres * Math.sin(direction)),
        null);
  }
}
