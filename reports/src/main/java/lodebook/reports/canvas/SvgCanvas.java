package lodebook.reports.canvas;

import java.awt.Color;
import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.PathIterator;
import java.util.Arrays;
import java.util.stream.Collectors;

/// Writes what is drawn as an SVG 1.1 file (W3C recommendation) in millimetres.
///
/// Letters are outlines, so the file looks the same without the typeface; each text is kept as an
/// `aria-label` beside its outline.
public final class SvgCanvas implements Canvas {
  private final Typeface typeface;
  private final double width;
  private final double height;
  private final StringBuilder body = new StringBuilder();

  /// An empty file of the given size.
  public SvgCanvas(Typeface typeface, double widthMillimetres, double heightMillimetres) {
    this.typeface = typeface;
    this.width = widthMillimetres;
    this.height = heightMillimetres;
  }

  @Override
  public Typeface typeface() {
    return typeface;
  }

  @Override
  public void fill(Shape shape, Color color) {
    path(shape, " fill=\"" + hex(color) + "\"" + rule(shape));
  }

  @Override
  public void stroke(Shape shape, Color color, double widthMillimetres, double... dashMillimetres) {
    String dashes =
        dashMillimetres.length == 0
            ? ""
            : Arrays.stream(dashMillimetres)
                .mapToObj(PathText::number)
                .collect(Collectors.joining(" ", " stroke-dasharray=\"", "\""));
    path(
        shape,
        " fill=\"none\" stroke=\""
            + hex(color)
            + "\" stroke-width=\""
            + PathText.number(widthMillimetres)
            + "\" stroke-linejoin=\"round\""
            + dashes);
  }

  @Override
  public void text(String text, AffineTransform place, Lettering lettering, Anchor anchor) {
    var whole = new AffineTransform(place);
    whole.translate(-anchor.share() * typeface.width(text, lettering), 0);
    Shape outline = whole.createTransformedShape(typeface.outline(text, lettering));
    path(
        outline,
        " aria-label=\""
            + escaped(typeface.settable(text))
            + "\" fill=\""
            + hex(lettering.color())
            + "\"");
  }

  /// The whole file.
  public String file() {
    String w = PathText.number(width);
    String h = PathText.number(height);
    return "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n"
        + "<svg xmlns=\"http://www.w3.org/2000/svg\" version=\"1.1\" width=\""
        + w
        + "mm\" height=\""
        + h
        + "mm\" viewBox=\"0 0 "
        + w
        + " "
        + h
        + "\">\n"
        + body
        + "</svg>\n";
  }

  private void path(Shape shape, String attributes) {
    body.append("<path d=\"")
        .append(PathText.of(shape))
        .append('"')
        .append(attributes)
        .append("/>\n");
  }

  private static String rule(Shape shape) {
    return shape.getPathIterator(null).getWindingRule() == PathIterator.WIND_EVEN_ODD
        ? " fill-rule=\"evenodd\""
        : "";
  }

  private static String hex(Color color) {
    return String.format("#%06x", color.getRGB() & 0xFFFFFF);
  }

  private static String escaped(String text) {
    return text.replace("&", "&amp;").replace("<", "&lt;").replace("\"", "&quot;");
  }
}
