package lodebook.reports.canvas;

import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.AffineTransform;

/// A canvas whose origin stands elsewhere on another one.
record MovedCanvas(Canvas ground, double dx, double dy) implements Canvas {
  private AffineTransform move() {
    return AffineTransform.getTranslateInstance(dx, dy);
  }

  @Override
  public Typeface typeface() {
    return ground.typeface();
  }

  @Override
  public void fill(Shape shape, Color color) {
    ground.fill(move().createTransformedShape(shape), color);
  }

  @Override
  public void stroke(Shape shape, Color color, double widthMillimetres, double... dashMillimetres) {
    ground.stroke(move().createTransformedShape(shape), color, widthMillimetres, dashMillimetres);
  }

  @Override
  public void text(String text, AffineTransform place, Lettering lettering, Anchor anchor) {
    AffineTransform both = move();
    both.concatenate(place);
    ground.text(text, both, lettering, anchor);
  }
}
