package lodebook.reports.sheet;

import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Palette;
import uk.org.okapibarcode.backend.QrCode;

/// A QR code (ISO/IEC 18004) that holds one of the book's numbers and nothing else.
public final class ScanCode {
  /// Quiet zone round the code, modules, as the standard asks for.
  private static final int QUIET = 4;

  private ScanCode() {}

  /// Draws the code of a text with its quiet zone as a square at the canvas's origin.
  ///
  /// @param size side of the square, millimetres
  public static void draw(Canvas canvas, String text, double size) {
    var code = new QrCode();
    code.setPreferredEccLevel(QrCode.EccLevel.M);
    code.setContent(text);
    double module = size / (code.getWidth() + 2 * QUIET);
    var black = new Path2D.Double();
    code.getRectangles()
        .forEach(
            r ->
                black.append(
                    new Rectangle2D.Double(
                        module * (r.x + QUIET),
                        module * (r.y + QUIET),
                        module * r.width,
                        module * r.height),
                    false));
    canvas.fill(black, Palette.GRAPHITE);
  }
}
