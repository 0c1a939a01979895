package lodebook.reports.ring;

import java.awt.Color;
import java.awt.image.BufferedImage;
import java.nio.charset.StandardCharsets;
import lodebook.reports.canvas.PixelCanvas;
import lodebook.reports.canvas.Png;
import lodebook.reports.canvas.SvgCanvas;
import lodebook.reports.canvas.Typeface;
import lodebook.reports.sheet.Flow;
import lodebook.reports.sheet.Sheet;
import lodebook.reports.sheet.SheetFacts;
import lodebook.reports.words.Words;

/// The picture of a ring as a file of its own.
public final class RingFiles {
  /// Size of a picture file, millimetres.
  private static final double WIDTH = 180;

  private static final double HEIGHT = 200;
  private static final double BORDER = 6;
  private static final double PIXELS_PER_MILLIMETRE = 8;

  private RingFiles() {}

  private static RingDrawing drawing(RingPicture picture, Typeface typeface) {
    return RingDrawing.fitting(picture, typeface, WIDTH - 2 * BORDER, HEIGHT - 2 * BORDER);
  }

  /// A PNG file, 1440 pixels wide.
  public static byte[] png(RingPicture picture) {
    var typeface = new Typeface();
    RingDrawing drawing = drawing(picture, typeface);
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
  public static byte[] svg(RingPicture picture) {
    var typeface = new Typeface();
    RingDrawing drawing = drawing(picture, typeface);
    var canvas = new SvgCanvas(typeface, WIDTH, drawing.height() + 2 * BORDER);
    drawing.draw(canvas.moved(BORDER, BORDER));
    return canvas.file().getBytes(StandardCharsets.UTF_8);
  }

  /// A PDF/A-2b sheet of one page: at true size where the ring fits the paper and is not tiny, else
  /// as large as the paper allows.
  public static byte[] pdf(RingPicture picture, SheetFacts facts) {
    var typeface = new Typeface();
    String kind = new Words(facts.language()).say("ring.title");
    try (var sheet = new Sheet(kind, facts, typeface)) {
      var flow = new Flow(sheet);
      flow.heading(kind + " " + facts.code(), 0);
      RingDrawing drawing = RingSizes.best(picture, typeface, flow.width(), flow.room() - 1);
      drawing.draw(flow.take(drawing.height()));
      return sheet.finish();
    }
  }
}
