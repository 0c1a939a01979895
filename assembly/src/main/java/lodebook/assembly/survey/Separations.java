package lodebook.assembly.survey;

import java.util.List;

/// How far the readings of explanations lie apart, in standard deviations of one covariance half
/// way between that of the plan and the widest that a reversed magnet makes.
final class Separations {
  private final double[] right;
  private final double[][] product;

  Separations(RowModel rows) {
    right = rows.ring().rightPolarisation();
    int width = right.length;
    double[][] white = rows.responses();
    Search.screening(rows).whitenAll(white);
    product = new double[width][width];
    for (double[] line : white) {
      for (int c = 0; c < width; c++) {
        double value = line[c];
        double[] target = product[c];
        for (int d = 0; d <= c; d++) {
          target[d] += value * line[d];
        }
      }
    }
    for (int c = 0; c < width; c++) {
      for (int d = 0; d < c; d++) {
        product[d][c] = product[c][d];
      }
    }
  }

  /// Square of the separation of two explanations.
  double square(List<Fault> one, List<Fault> other) {
    int count = one.size() + other.size();
    int[] at = new int[count];
    double[][] changes = new double[count][];
    for (int n = 0; n < count; n++) {
      Fault fault = n < one.size() ? one.get(n) : other.get(n - one.size());
      double[] change = fault.change(right);
      double sign = n < one.size() ? 1 : -1;
      at[n] = 2 * fault.place();
      changes[n] = new double[] {sign * change[0], sign * change[1]};
    }
    double sum = 0;
    for (int n = 0; n < count; n++) {
      for (int m = 0; m < count; m++) {
        for (int p = 0; p < 2; p++) {
          double[] line = product[at[n] + p];
          sum += changes[n][p] * (line[at[m]] * changes[m][0] + line[at[m] + 1] * changes[m][1]);
        }
      }
    }
    return Math.max(0, sum);
  }
}
