package lodebook.reports.canvas;

import java.awt.Color;

/// How a text is set.
///
/// @param sizePoints size of the letters, points of 1/72 inch
/// @param bold whether the heavy cut is used
/// @param color colour of the letters
public record Lettering(double sizePoints, boolean bold, Color color) {
  /// Millimetres in a point.
  public static final double MILLIMETRES_PER_POINT = 25.4 / 72;

  /// Graphite letters of normal weight.
  public static Lettering plain(double sizePoints) {
    return new Lettering(sizePoints, false, Palette.GRAPHITE);
  }

  /// Graphite letters of heavy weight.
  public static Lettering bold(double sizePoints) {
    return new Lettering(sizePoints, true, Palette.GRAPHITE);
  }

  /// The same in another size.
  public Lettering sized(double points) {
    return new Lettering(points, bold, color);
  }

  /// The same in another colour.
  public Lettering in(Color other) {
    return new Lettering(sizePoints, bold, other);
  }

  /// Size in millimetres.
  public double sizeMillimetres() {
    return sizePoints * MILLIMETRES_PER_POINT;
  }

  /// Height of a capital letter, millimetres.
  public double capitalMillimetres() {
    return 0.729 * sizeMillimetres();
  }
}
