package lodebook.assembly.survey;

import java.util.List;
import lodebook.assembly.layout.Component;

/// Inner products along one course from which the energy that any single fault leaves unexplained
/// follows, for readings freed of any sign and unit.
final class SingleFaultEnergies {
  private final double[] byMean;
  private final double[] byRadial;
  private final double[] byTangential;
  private final double[] squares;
  private final double[] crossed;
  private double meanSquare;
  private double radialSquare;
  private double tangentialSquare;
  private double meanByRadial;
  private double meanByTangential;

  SingleFaultEnergies(Courses.Course course, List<Reading> readings) {
    double[] mean = course.mean();
    int width = course.lines()[0].length;
    byMean = new double[width];
    byRadial = new double[width];
    byTangential = new double[width];
    squares = new double[width];
    crossed = new double[width / 2];
    for (int i = 0; i < mean.length; i++) {
      double[] line = course.lines()[i];
      double read = readings.get(i).fluxTesla();
      boolean tangential = readings.get(i).component() == Component.TANGENTIAL;
      meanSquare += mean[i] * mean[i];
      if (tangential) {
        tangentialSquare += read * read;
        meanByTangential += read * mean[i];
        RowAnswers.add(byTangential, read, line);
      } else {
        radialSquare += read * read;
        meanByRadial += read * mean[i];
        RowAnswers.add(byRadial, read, line);
      }
      RowAnswers.add(byMean, mean[i], line);
      for (int c = 0; c < width; c++) {
        squares[c] += line[c] * line[c];
      }
      for (int slot = 0; slot < crossed.length; slot++) {
        crossed[slot] += line[2 * slot] * line[2 * slot + 1];
      }
    }
  }

  /// The same for readings freed of a slip.
  ///
  /// @param radial factor that frees radial readings
  /// @param tangential factor that frees tangential ones
  Rest rest(double radial, double tangential) {
    return new Rest(radial, tangential);
  }

  /// What single faults leave of the readings.
  final class Rest {
    private final double radial;
    private final double tangential;
    private final double rest;

    private Rest(double radial, double tangential) {
      this.radial = radial;
      this.tangential = tangential;
      rest =
          radial * radial * radialSquare
              + tangential * tangential * tangentialSquare
              - 2 * (radial * meanByRadial + tangential * meanByTangential)
              + meanSquare;
    }

    private double byRest(int column) {
      return radial * byRadial[column] + tangential * byTangential[column] - byMean[column];
    }

    /// Share of the expected energy that stays unexplained with one magnet changed.
    ///
    /// @param slot slot index from 0
    /// @param change change of its polarisation, outwards and towards next, tesla
    double leftOver(int slot, double[] change) {
      int a = 2 * slot;
      int b = a + 1;
      double square =
          change[0] * change[0] * squares[a]
              + 2 * change[0] * change[1] * crossed[slot]
              + change[1] * change[1] * squares[b];
      double whole = meanSquare + 2 * (change[0] * byMean[a] + change[1] * byMean[b]) + square;
      double left = rest - 2 * (change[0] * byRest(a) + change[1] * byRest(b)) + square;
      return whole > 0 ? left / whole : Double.POSITIVE_INFINITY;
    }
  }
}
