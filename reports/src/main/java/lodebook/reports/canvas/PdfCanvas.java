package lodebook.reports.canvas;

import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.PathIterator;
import java.awt.geom.Point2D;
import java.io.IOException;
import java.io.UncheckedIOException;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.util.Matrix;
import org.jspecify.annotations.Nullable;

/// Draws on a page of a PDF; texts stay texts.
public final class PdfCanvas implements Canvas {
  private static final double POINTS = 72 / 25.4;
  private static final char NO_BREAK_SPACE = '\u00A0';

  private final PDPageContentStream content;
  private final Typeface typeface;
  private final PDFont plain;
  private final PDFont bold;
  private final AffineTransform toPage;
  private @Nullable Color filling;
  private @Nullable Color drawing;
  private double lineWidth = -1;
  private boolean dashed;

  /// @param content the page's content, still open
  /// @param plain the typeface's normal weight as embedded in the document
  /// @param bold its heavy weight
  /// @param heightMillimetres height of the page
  public PdfCanvas(
      PDPageContentStream content,
      Typeface typeface,
      PDFont plain,
      PDFont bold,
      double heightMillimetres) {
    this.content = content;
    this.typeface = typeface;
    this.plain = plain;
    this.bold = bold;
    this.toPage = new AffineTransform(POINTS, 0, 0, -POINTS, 0, heightMillimetres * POINTS);
  }

  @Override
  public Typeface typeface() {
    return typeface;
  }

  @Override
  public void fill(Shape shape, Color color) {
    try {
      fillWith(color);
      boolean evenOdd = path(shape) == PathIterator.WIND_EVEN_ODD;
      if (evenOdd) {
        content.fillEvenOdd();
      } else {
        content.fill();
      }
    } catch (IOException broken) {
      throw new UncheckedIOException(broken);
    }
  }

  @Override
  public void stroke(Shape shape, Color color, double widthMillimetres, double... dashMillimetres) {
    try {
      drawWith(color, widthMillimetres, dashMillimetres);
      path(shape);
      content.stroke();
    } catch (IOException broken) {
      throw new UncheckedIOException(broken);
    }
  }

  private void fillWith(Color color) throws IOException {
    if (!color.equals(filling)) {
      content.setNonStrokingColor(color);
      filling = color;
    }
  }

  private void drawWith(Color color, double width, double... dash) throws IOException {
    if (lineWidth < 0) {
      content.setLineJoinStyle(1);
    }
    if (!color.equals(drawing)) {
      content.setStrokingColor(color);
      drawing = color;
    }
    if (width != lineWidth) {
      content.setLineWidth((float) (width * POINTS));
      lineWidth = width;
    }
    if (dash.length > 0 || dashed) {
      float[] lengths = new float[dash.length];
      for (int i = 0; i < dash.length; i++) {
        lengths[i] = (float) (dash[i] * POINTS);
      }
      content.setLineDashPattern(lengths, 0);
      dashed = dash.length > 0;
    }
  }

  private int path(Shape shape) throws IOException {
    double[] p = new double[6];
    Point2D pen = new Point2D.Double();
    PathIterator i = shape.getPathIterator(toPage);
    int rule = i.getWindingRule();
    for (; !i.isDone(); i.next()) {
      pen = segment(i.currentSegment(p), p, pen);
    }
    return rule;
  }

  /// Adds one segment and says where the pen then is.
  private Point2D segment(int kind, double[] p, Point2D pen) throws IOException {
    return switch (kind) {
      case PathIterator.SEG_MOVETO -> {
        content.moveTo((float) p[0], (float) p[1]);
        yield new Point2D.Double(p[0], p[1]);
      }
      case PathIterator.SEG_LINETO -> {
        content.lineTo((float) p[0], (float) p[1]);
        yield new Point2D.Double(p[0], p[1]);
      }
      case PathIterator.SEG_QUADTO -> {
        curve(
            pen.getX() + (p[0] - pen.getX()) * 2 / 3,
            pen.getY() + (p[1] - pen.getY()) * 2 / 3,
            p[2] + (p[0] - p[2]) * 2 / 3,
            p[3] + (p[1] - p[3]) * 2 / 3,
            p[2],
            p[3]);
        yield new Point2D.Double(p[2], p[3]);
      }
      case PathIterator.SEG_CUBICTO -> {
        curve(p[0], p[1], p[2], p[3], p[4], p[5]);
        yield new Point2D.Double(p[4], p[5]);
      }
      default -> {
        content.closePath();
        yield pen;
      }
    };
  }

  private void curve(double x1, double y1, double x2, double y2, double x3, double y3)
      throws IOException {
    content.curveTo((float) x1, (float) y1, (float) x2, (float) y2, (float) x3, (float) y3);
  }

  @Override
  public void text(String text, AffineTransform place, Lettering lettering, Anchor anchor) {
    String line = typeface.settable(text);
    if (line.isEmpty()) {
      return;
    }
    var whole = new AffineTransform(toPage);
    whole.concatenate(place);
    if (anchor != Anchor.START) {
      whole.translate(-anchor.share() * typeface.width(line, lettering), 0);
    }
    whole.scale(1 / POINTS, -1 / POINTS);
    try {
      fillWith(lettering.color());
      content.beginText();
      content.setFont(lettering.bold() ? bold : plain, (float) lettering.sizePoints());
      content.setTextMatrix(new Matrix(whole));
      content.showText(line.replace(NO_BREAK_SPACE, ' '));
      content.endText();
    } catch (IOException broken) {
      throw new UncheckedIOException(broken);
    }
  }

  /// Ends the page's content.
  public void close() {
    try {
      content.close();
    } catch (IOException broken) {
      throw new UncheckedIOException(broken);
    }
  }
}
