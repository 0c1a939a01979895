package lodebook.ui.desk.look;

import javafx.scene.paint.Color;

/// How well one colour is read on another.
///
/// Source: WCAG 2.2, definitions of contrast ratio and relative luminance.
public final class Contrast {
  private Contrast() {}

  /// The contrast ratio of two colours, 1 to 21.
  public static double between(Color one, Color other) {
    double a = luminance(one);
    double b = luminance(other);
    return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
  }

  private static double luminance(Color color) {
    return 0.2126 * linear(color.getRed())
        + 0.7152 * linear(color.getGreen())
        + 0.0722 * linear(color.getBlue());
  }

  private static double linear(double share) {
    return share <= 0.04045 ? share / 12.92 : Math.pow((share + 0.055) / 1.055, 2.4);
  }
}
