package lodebook.reports.ring;

import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.AffineTransform;
import lodebook.reports.canvas.Anchor;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Typeface;

/// A canvas that shows nothing, to try whether something would fit.
record Silence(Typeface typeface) implements Canvas {
  @Override
  public void fill(Shape shape, Color color) {}

  @Override
  public void stroke(
      Shape shape, Color color, double widthMillimetres, double... dashMillimetres) {}

  @Override
  public void text(String text, AffineTransform place, Lettering lettering, Anchor anchor) {}
}
