package lodebook.reports.ring;

import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.Area;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import lodebook.reports.canvas.Anchor;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Typeface;

/// Keeps what is drawn on it.
final class Recorder implements Canvas {
  private final Typeface typeface;
  final List<Filled> fills = new ArrayList<>();
  final List<Shape> strokes = new ArrayList<>();
  final List<Written> texts = new ArrayList<>();

  Recorder(Typeface typeface) {
    this.typeface = typeface;
  }

  record Filled(Shape shape, Color color) {}

  /// A text and the box of its capitals, millimetres.
  record Written(String text, Shape box, double points) {
    double x() {
      return box.getBounds2D().getCenterX();
    }

    double y() {
      return box.getBounds2D().getCenterY();
    }

    boolean covers(Written other) {
      if (!box.getBounds2D().intersects(other.box.getBounds2D())) {
        return false;
      }
      var both = new Area(box);
      both.intersect(new Area(other.box));
      return !both.isEmpty();
    }
  }

  @Override
  public Typeface typeface() {
    return typeface;
  }

  @Override
  public void fill(Shape shape, Color color) {
    fills.add(new Filled(shape, color));
  }

  @Override
  public void stroke(Shape shape, Color color, double widthMillimetres, double... dashMillimetres) {
    strokes.add(shape);
  }

  @Override
  public void text(String text, AffineTransform place, Lettering lettering, Anchor anchor) {
    double width = typeface.width(text, lettering);
    double left =
        switch (anchor) {
          case START -> 0;
          case MIDDLE -> -width / 2;
          case END -> -width;
        };
    double height = lettering.capitalMillimetres();
    var box = new Rectangle2D.Double(left, -height, width, height);
    texts.add(new Written(text, place.createTransformedShape(box), lettering.sizePoints()));
  }
}
