package lodebook.assembly.survey;

/// Cholesky factor of a symmetric positive definite matrix.
///
/// The factor is kept as its transpose, so that all inner loops run along rows of it.
final class Cholesky {
  private final double[][] upper;
  private final double logDeterminant;

  /// Factors a square matrix in place; only its upper triangle is read.
  ///
  /// @throws IllegalArgumentException if the matrix is not positive definite
  Cholesky(double[][] matrix) {
    int n = matrix.length;
    double sum = 0;
    for (int k = 0; k < n; k++) {
      double[] row = matrix[k];
      if (!(row[k] > 0)) {
        throw new IllegalArgumentException("matrix is not positive definite in row " + k);
      }
      double pivot = Math.sqrt(row[k]);
      sum += Math.log(pivot);
      double scale = 1 / pivot;
      row[k] = pivot;
      for (int i = k + 1; i < n; i++) {
        row[i] *= scale;
      }
      for (int i = k + 1; i < n; i++) {
        subtract(row[i], row, matrix[i], i, n);
      }
    }
    this.upper = matrix;
    this.logDeterminant = 2 * sum;
  }

  private static void subtract(double factor, double[] source, double[] target, int from, int to) {
    for (int j = from; j < to; j++) {
      target[j] -= factor * source[j];
    }
  }

  /// Natural logarithm of the determinant of the matrix.
  double logDeterminant() {
    return logDeterminant;
  }

  /// Solves L·x = b.
  double[] whiten(double[] b) {
    double[] x = b.clone();
    whiten(x, 0);
    return x;
  }

  private void whiten(double[] x, int from) {
    for (int k = from; k < x.length; k++) {
      double[] row = upper[k];
      x[k] /= row[k];
      subtract(x[k], row, x, k + 1, x.length);
    }
  }

  /// Solves A·x = b.
  double[] solve(double[] b) {
    double[] x = whiten(b);
    for (int i = x.length - 1; i >= 0; i--) {
      double[] row = upper[i];
      double s = x[i];
      for (int k = i + 1; k < x.length; k++) {
        s -= row[k] * x[k];
      }
      x[i] = s / row[i];
    }
    return x;
  }

  /// Solves L·X = B for several right sides at once; `columns[row][column]` is overwritten.
  void whitenAll(double[][] columns) {
    for (int k = 0; k < columns.length; k++) {
      double[] row = upper[k];
      double[] source = columns[k];
      double scale = 1 / row[k];
      for (int c = 0; c < source.length; c++) {
        source[c] *= scale;
      }
      for (int i = k + 1; i < columns.length; i++) {
        subtract(row[i], source, columns[i], 0, source.length);
      }
    }
  }

  /// Diagonal of the inverse.
  double[] inverseDiagonal() {
    int n = upper.length;
    double[] diagonal = new double[n];
    for (int start = 0; start < n; start++) {
      double[] column = new double[n];
      column[start] = 1;
      whiten(column, start);
      for (int i = start; i < n; i++) {
        diagonal[start] += column[i] * column[i];
      }
    }
    return diagonal;
  }
}
