package lodebook.reports.canvas;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.Shape;
import java.awt.geom.AffineTransform;

/// Draws on a [Graphics2D]: pictures of pixels and the screen.
///
/// Letters are filled outlines, so no font of the computer is asked for.
public final class PixelCanvas implements Canvas {
  private final Graphics2D graphics;
  private final Typeface typeface;

  /// @param graphics what to draw on; its scale is set to millimetres and its edges to smooth
  /// @param pixelsPerMillimetre size of a millimetre
  public PixelCanvas(Graphics2D graphics, Typeface typeface, double pixelsPerMillimetre) {
    this.graphics = graphics;
    this.typeface = typeface;
    graphics.scale(pixelsPerMillimetre, pixelsPerMillimetre);
    graphics.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    graphics.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
  }

  @Override
  public Typeface typeface() {
    return typeface;
  }

  @Override
  public void fill(Shape shape, Color color) {
    graphics.setColor(color);
    graphics.fill(shape);
  }

  @Override
  public void stroke(Shape shape, Color color, double widthMillimetres, double... dashMillimetres) {
    graphics.setColor(color);
    graphics.setStroke(strokeOf(widthMillimetres, dashMillimetres));
    graphics.draw(shape);
  }

  private static BasicStroke strokeOf(double width, double... dash) {
    if (dash.length == 0) {
      return new BasicStroke((float) width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND);
    }
    float[] lengths = new float[dash.length];
    for (int i = 0; i < dash.length; i++) {
      lengths[i] = (float) dash[i];
    }
    return new BasicStroke(
        (float) width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10, lengths, 0);
  }

  @Override
  public void text(String text, AffineTransform place, Lettering lettering, Anchor anchor) {
    var whole = new AffineTransform(place);
    whole.translate(-anchor.share() * typeface.width(text, lettering), 0);
    fill(whole.createTransformedShape(typeface.outline(text, lettering)), lettering.color());
  }
}
