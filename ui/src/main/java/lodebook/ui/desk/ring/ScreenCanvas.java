package lodebook.ui.desk.ring;

import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.PathIterator;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.shape.FillRule;
import javafx.scene.shape.StrokeLineCap;
import javafx.scene.shape.StrokeLineJoin;
import lodebook.reports.canvas.Anchor;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Typeface;

/// Draws on the screen what is drawn on paper, in the screen's colours. Letters are filled outlines
/// of the papers' typeface.
final class ScreenCanvas implements Canvas {
  private final GraphicsContext graphics;
  private final Typeface typeface;
  private final RingColours colours;
  private final double pixels;

  /// @param pixelsPerMillimetre size of a millimetre on the graphics
  ScreenCanvas(
      GraphicsContext graphics,
      Typeface typeface,
      RingColours colours,
      double pixelsPerMillimetre) {
    this.graphics = graphics;
    this.typeface = typeface;
    this.colours = colours;
    this.pixels = pixelsPerMillimetre;
  }

  @Override
  public Typeface typeface() {
    return typeface;
  }

  @Override
  public void fill(Shape shape, java.awt.Color color) {
    graphics.setFill(colours.of(color));
    int rule = path(shape);
    graphics.setFillRule(
        rule == PathIterator.WIND_EVEN_ODD ? FillRule.EVEN_ODD : FillRule.NON_ZERO);
    graphics.fill();
  }

  @Override
  public void stroke(
      Shape shape, java.awt.Color color, double widthMillimetres, double... dashMillimetres) {
    graphics.setStroke(colours.of(color));
    graphics.setLineWidth(widthMillimetres * pixels);
    graphics.setLineCap(StrokeLineCap.BUTT);
    graphics.setLineJoin(StrokeLineJoin.ROUND);
    double[] dashes = new double[dashMillimetres.length];
    for (int i = 0; i < dashes.length; i++) {
      dashes[i] = dashMillimetres[i] * pixels;
    }
    graphics.setLineDashes(dashes);
    path(shape);
    graphics.stroke();
  }

  private int path(Shape shape) {
    graphics.beginPath();
    double[] p = new double[6];
    PathIterator i = shape.getPathIterator(AffineTransform.getScaleInstance(pixels, pixels));
    int rule = i.getWindingRule();
    for (; !i.isDone(); i.next()) {
      switch (i.currentSegment(p)) {
        case PathIterator.SEG_MOVETO -> graphics.moveTo(p[0], p[1]);
        case PathIterator.SEG_LINETO -> graphics.lineTo(p[0], p[1]);
        case PathIterator.SEG_QUADTO -> graphics.quadraticCurveTo(p[0], p[1], p[2], p[3]);
        case PathIterator.SEG_CUBICTO -> graphics.bezierCurveTo(p[0], p[1], p[2], p[3], p[4], p[5]);
        default -> graphics.closePath();
      }
    }
    return rule;
  }

  @Override
  public void text(String text, AffineTransform place, Lettering lettering, Anchor anchor) {
    double share =
        switch (anchor) {
          case START -> 0;
          case MIDDLE -> 0.5;
          case END -> 1;
        };
    AffineTransform whole = new AffineTransform(place);
    whole.translate(-share * typeface.width(text, lettering), 0);
    fill(whole.createTransformedShape(typeface.outline(text, lettering)), lettering.color());
  }
}
