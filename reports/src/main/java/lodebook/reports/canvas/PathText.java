package lodebook.reports.canvas;

import java.awt.Shape;
import java.awt.geom.PathIterator;
import java.math.BigDecimal;
import java.math.RoundingMode;

/// Shapes as the path text of a vector file.
final class PathText {
  private static final String[] LETTERS = {"M", "L", "Q", "C", "Z"};
  private static final int[] COORDINATES = {2, 2, 4, 6, 0};

  private PathText() {}

  /// A number with at most three decimals (micrometres, where the unit is the millimetre).
  static String number(double value) {
    return BigDecimal.valueOf(value)
        .setScale(3, RoundingMode.HALF_EVEN)
        .stripTrailingZeros()
        .toPlainString();
  }

  /// Path data of a shape.
  static String of(Shape shape) {
    var out = new StringBuilder();
    double[] points = new double[6];
    for (PathIterator i = shape.getPathIterator(null); !i.isDone(); i.next()) {
      int kind = i.currentSegment(points);
      out.append(LETTERS[kind]);
      for (int c = 0; c < COORDINATES[kind]; c++) {
        out.append(c == 0 ? "" : " ").append(number(points[c]));
      }
    }
    return out.toString();
  }
}
