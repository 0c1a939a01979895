package lodebook.reports.ring;

import lodebook.reports.canvas.Typeface;

/// Chooses at which size a ring is drawn on a sheet.
public final class RingSizes {
  /// Rings that would be narrower than this at true size are enlarged.
  private static final double LEAST = 100;

  private RingSizes() {}

  /// True size where that fits and can be read, else as large as fits.
  public static RingDrawing best(
      RingPicture picture, Typeface typeface, double widthMillimetres, double heightMillimetres) {
    RingDrawing trueSize = RingDrawing.scaled(picture, typeface, 1, widthMillimetres);
    boolean fits =
        trueSize.ringWidth() <= widthMillimetres && trueSize.height() <= heightMillimetres;
    return fits && trueSize.ringWidth() >= LEAST
        ? trueSize
        : RingDrawing.fitting(picture, typeface, widthMillimetres, heightMillimetres);
  }
}
