package lodebook.reports.canvas;

import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.AffineTransform;

/// A surface to draw on, in millimetres, x to the right and y down from the upper left corner.
///
/// One drawing code serves paper, pixels and vector files; each has its own canvas.
public interface Canvas {
  /// The typeface in which this canvas sets its texts.
  Typeface typeface();

  /// Fills a shape.
  void fill(Shape shape, Color color);

  /// Draws the outline of a shape with round joins.
  ///
  /// @param widthMillimetres width of the line
  /// @param dashMillimetres lengths of dashes and gaps in turn, none for a solid line
  void stroke(Shape shape, Color color, double widthMillimetres, double... dashMillimetres);

  /// Sets one line of text on its baseline.
  ///
  /// @param place where the point (0, 0) of the text stands and how the text is turned
  void text(String text, AffineTransform place, Lettering lettering, Anchor anchor);

  /// Sets one upright line of text with its baseline at a point.
  default void text(String text, double x, double y, Lettering lettering, Anchor anchor) {
    text(text, AffineTransform.getTranslateInstance(x, y), lettering, anchor);
  }

  /// Sets one upright line of text whose capitals are centred on a point.
  default void centred(String text, double x, double y, Lettering lettering) {
    text(text, x, y + lettering.capitalMillimetres() / 2, lettering, Anchor.MIDDLE);
  }

  /// The same surface with its origin moved to a point.
  default Canvas moved(double dx, double dy) {
    return new MovedCanvas(this, dx, dy);
  }
}
