package lodebook.assembly.survey;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.ProbePoint;

/// How far the readings of explanations lie apart, in standard deviations of one covariance half
/// way between that of the plan and the widest that a reversed magnet makes.
final class Separations {
  private final double[][] overlap;

  private Separations(double[][] overlap) {
    this.overlap = overlap;
  }

  /// Square of the separation of two explanations.
  ///
  /// @param one numbers of the faults that one names
  /// @param other numbers of the faults that the other names
  double square(int[] one, int[] other) {
    double sum = within(one) + within(other);
    for (int a : one) {
      for (int b : other) {
        sum -= 2 * overlap[a][b];
      }
    }
    return Math.max(0, sum);
  }

  private double within(int[] faults) {
    double sum = 0;
    for (int a : faults) {
      for (int b : faults) {
        sum += overlap[a][b];
      }
    }
    return sum;
  }

  /// The answers of many points, from which the separations by any of them follow.
  static final class Of {
    private final Map<ProbePoint, Integer> numbers = new HashMap<>();
    private final double[][] covariance;
    private final double[][] shifts;

    /// @param points all points that will be asked for
    /// @param rows a reading at each of them, in the same order
    /// @param faults the faults, by their numbers
    Of(List<ProbePoint> points, RowModel rows, List<Fault> faults) {
      for (int i = 0; i < points.size(); i++) {
        numbers.put(points.get(i), i);
      }
      covariance = Search.screeningCovariance(rows);
      shifts = new double[points.size()][faults.size()];
      double[] right = rows.ring().rightPolarisation();
      for (int f = 0; f < faults.size(); f++) {
        double[] change = faults.get(f).change(right);
        double[] shift = rows.answer(faults.get(f).place(), change[0], change[1]);
        for (int i = 0; i < shift.length; i++) {
          shifts[i][f] = shift[i];
        }
      }
    }

    /// What one reading at each of some points tells.
    Separations at(List<ProbePoint> points) {
      int[] at = new int[points.size()];
      for (int i = 0; i < at.length; i++) {
        Integer number = numbers.get(points.get(i));
        if (number == null) {
          throw new IllegalArgumentException("no response was prepared for " + points.get(i));
        }
        at[i] = number;
      }
      double[][] matrix = new double[at.length][at.length];
      double[][] white = new double[at.length][];
      for (int i = 0; i < at.length; i++) {
        white[i] = shifts[at[i]].clone();
        for (int j = i; j < at.length; j++) {
          matrix[i][j] = covariance[Math.min(at[i], at[j])][Math.max(at[i], at[j])];
        }
      }
      new Cholesky(matrix).whitenAll(white);
      int faults = shifts[0].length;
      double[][] overlap = new double[faults][faults];
      for (double[] line : white) {
        for (int f = 0; f < faults; f++) {
          RowAnswers.add(overlap[f], line[f], line);
        }
      }
      return new Separations(overlap);
    }
  }
}
