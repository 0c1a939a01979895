package lodebook.reports.film;

import java.awt.Color;
import java.awt.image.BufferedImage;
import java.nio.charset.StandardCharsets;
import java.util.function.BiFunction;
import lodebook.reports.canvas.Drawing;
import lodebook.reports.canvas.PixelCanvas;
import lodebook.reports.canvas.Png;
import lodebook.reports.canvas.SvgCanvas;
import lodebook.reports.canvas.Typeface;
import lodebook.reports.sheet.Flow;
import lodebook.reports.sheet.Sheet;
import lodebook.reports.sheet.SheetFacts;

/// A drawing as a file of its own.
///
/// @param title what the sheet is called
/// @param layOut lays the drawing out for a width in millimetres
public record PictureFiles(String title, BiFunction<Typeface, Double, Drawing> layOut) {
  private static final double WIDTH = 180;
  private static final double BORDER = 6;
  private static final double PIXELS_PER_MILLIMETRE = 8;

  private Drawing drawing(Typeface typeface) {
    return layOut.apply(typeface, WIDTH - 2 * BORDER);
  }

  /// A PNG file of 8 pixels to the millimetre.
  public byte[] png() {
    var typeface = new Typeface();
    Drawing drawing = drawing(typeface);
    int width = (int) Math.ceil(WIDTH * PIXELS_PER_MILLIMETRE);
    int height = (int) Math.ceil((drawing.height() + 2 * BORDER) * PIXELS_PER_MILLIMETRE);
    var image = new BufferedImage(width, height, BufferedImage.TYPE_INT_RGB);
    var graphics = image.createGraphics();
    graphics.setColor(Color.WHITE);
    graphics.fillRect(0, 0, width, height);
    drawing.draw(new PixelCanvas(graphics, typeface, PIXELS_PER_MILLIMETRE).moved(BORDER, BORDER));
    graphics.dispose();
    return Png.of(image);
  }

  /// An SVG file, 180 mm wide.
  public byte[] svg() {
    var typeface = new Typeface();
    Drawing drawing = drawing(typeface);
    var canvas = new SvgCanvas(typeface, WIDTH, drawing.height() + 2 * BORDER);
    drawing.draw(canvas.moved(BORDER, BORDER));
    return canvas.file().getBytes(StandardCharsets.UTF_8);
  }

  /// A PDF/A-2b sheet.
  public byte[] pdf(SheetFacts facts) {
    var typeface = new Typeface();
    try (var sheet = new Sheet(title, facts, typeface)) {
      var flow = new Flow(sheet);
      flow.heading(title + " " + facts.code(), 0);
      Drawing drawing = layOut.apply(typeface, flow.width());
      drawing.draw(flow.take(drawing.height()));
      return sheet.finish();
    }
  }
}
