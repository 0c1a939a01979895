package lodebook.assembly.layout;

import java.util.Locale;

/// Numbers in refusals: millimetres with two places, remedies rounded to the safe side.
final class Rounded {
  private Rounded() {}

  /// The nearest.
  static String millimetres(double metres) {
    return String.format(Locale.ROOT, "%.2f", 1e3 * metres);
  }

  /// Not below the value.
  static String up(double metres) {
    return millimetres(Math.ceil(1e5 * metres - 1e-6) / 1e5);
  }

  /// Not above the value.
  static String down(double metres) {
    return millimetres(Math.floor(1e5 * metres + 1e-6) / 1e5);
  }

  /// Degrees without needless places.
  static String degrees(double degrees) {
    String text = String.format(Locale.ROOT, "%.2f", degrees);
    return text.replaceAll("\\.?0+$", "") + "°";
  }
}
