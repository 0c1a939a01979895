package lodebook.assembly.magnet;

import java.util.List;
import org.jspecify.annotations.Nullable;

/// What is believed of a magnet of a lot that nobody has measured.
///
/// @param meanTesla the lot's mean remanence at 20 °C, tesla
/// @param spreadTesla standard deviation of single magnets about that mean, tesla
/// @param doubtTesla standard uncertainty of the mean itself, which all magnets of the lot share,
///   tesla
public record LotStrength(double meanTesla, double spreadTesla, double doubtTesla) {
  /// So many measured pieces of the lot are needed before they are believed more than its paper.
  public static final int FEWEST = 3;

  /// Spread of single magnets, and doubt of a certificate, relative, where nothing was measured
  /// (this project's choice: sintered magnets of one lot mostly lie within 2 % of its mean).
  private static final double UNMEASURED = 0.01;

  /// By the lot's measured pieces if there are three, else by its certificate, else by its grade.
  ///
  /// @param measured strengths of measured pieces of the lot
  /// @param certificateTesla remanence by the lot's certificate, or null
  /// @param grade the lot's grade
  public static LotStrength of(
      List<Strength> measured, @Nullable Double certificateTesla, Grade grade) {
    if (measured.size() >= FEWEST) {
      return ofMeasured(measured);
    }
    if (certificateTesla != null) {
      return new LotStrength(
          certificateTesla, UNMEASURED * certificateTesla, UNMEASURED * certificateTesla);
    }
    double mean = (grade.remanenceLowTesla() + grade.remanenceHighTesla()) / 2;
    double width = grade.remanenceHighTesla() - grade.remanenceLowTesla();
    return new LotStrength(mean, UNMEASURED * mean, width / Math.sqrt(12));
  }

  private static LotStrength ofMeasured(List<Strength> measured) {
    int count = measured.size();
    double mean = measured.stream().mapToDouble(Strength::remanenceTesla).average().orElseThrow();
    double squares =
        measured.stream().mapToDouble(each -> Math.pow(each.remanenceTesla() - mean, 2)).sum();
    double variance = squares / (count - 1);
    double gauge =
        measured.stream().mapToDouble(Strength::standardUncertaintyTesla).average().orElseThrow();
    return new LotStrength(mean, Math.sqrt(variance), Math.sqrt(variance / count + gauge * gauge));
  }

  /// The strength of one unmeasured magnet: the mean, with the spread as its uncertainty.
  public Strength ofOne() {
    return new Strength(meanTesla, spreadTesla);
  }
}
