package lodebook.assembly.survey;

/// Cholesky factor of a symmetric positive definite matrix.
final class Cholesky {
  private final double[][] lower;
  private final double logDeterminant;

  /// Factors a matrix in place; only its lower triangle is read.
  ///
  /// @throws IllegalArgumentException if the matrix is not positive definite
  Cholesky(double[][] matrix) {
    double sum = 0;
    for (int i = 0; i < matrix.length; i++) {
      double[] row = matrix[i];
      for (int j = 0; j < i; j++) {
        double[] other = matrix[j];
        double s = row[j];
        for (int k = 0; k < j; k++) {
          s -= row[k] * other[k];
        }
        row[j] = s / other[j];
      }
      double s = row[i];
      for (int k = 0; k < i; k++) {
        s -= row[k] * row[k];
      }
      if (!(s > 0)) {
        throw new IllegalArgumentException("matrix is not positive definite in row " + i);
      }
      row[i] = Math.sqrt(s);
      sum += Math.log(row[i]);
    }
    this.lower = matrix;
    this.logDeterminant = 2 * sum;
  }

  /// Natural logarithm of the determinant of the matrix.
  double logDeterminant() {
    return logDeterminant;
  }

  /// Solves L·x = b.
  double[] whiten(double[] b) {
    double[] x = b.clone();
    for (int i = 0; i < x.length; i++) {
      double[] row = lower[i];
      double s = x[i];
      for (int k = 0; k < i; k++) {
        s -= row[k] * x[k];
      }
      x[i] = s / row[i];
    }
    return x;
  }

  /// Solves A·x = b.
  double[] solve(double[] b) {
    double[] x = whiten(b);
    for (int i = x.length - 1; i >= 0; i--) {
      double[] row = lower[i];
      double s = x[i] / row[i];
      x[i] = s;
      for (int k = 0; k < i; k++) {
        x[k] -= row[k] * s;
      }
    }
    return x;
  }

  /// Solves L·X = B for several right sides at once; `columns[row][column]` is overwritten.
  void whitenAll(double[][] columns) {
    for (int i = 0; i < columns.length; i++) {
      double[] row = lower[i];
      double[] target = columns[i];
      for (int k = 0; k < i; k++) {
        double factor = row[k];
        double[] source = columns[k];
        for (int c = 0; c < target.length; c++) {
          target[c] -= factor * source[c];
        }
      }
      double scale = 1 / row[i];
      for (int c = 0; c < target.length; c++) {
        target[c] *= scale;
      }
    }
  }

  /// Diagonal of the inverse.
  double[] inverseDiagonal() {
    int n = lower.length;
    double[] diagonal = new double[n];
    double[] column = new double[n];
    for (int start = 0; start < n; start++) {
      column[start] = 1 / lower[start][start];
      diagonal[start] += column[start] * column[start];
      for (int i = start + 1; i < n; i++) {
        double[] row = lower[i];
        double s = 0;
        for (int k = start; k < i; k++) {
          s -= row[k] * column[k];
        }
        column[i] = s / row[i];
        diagonal[start] += column[i] * column[i];
      }
    }
    return diagonal;
  }
}
