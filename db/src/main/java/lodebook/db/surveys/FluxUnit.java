package lodebook.db.surveys;

import java.util.Arrays;
import lodebook.assembly.survey.StatedUnit;
import org.jspecify.annotations.Nullable;

/// The units in which people state flux densities; 1 T = 10 000 G.
public enum FluxUnit {
  /// Millitesla.
  MILLITESLA("mT", 1e3, StatedUnit.TESLA),
  /// Tesla.
  TESLA("T", 1, StatedUnit.TESLA),
  /// Gauss.
  GAUSS("G", 1e4, StatedUnit.GAUSS),
  /// Kilogauss.
  KILOGAUSS("kG", 10, StatedUnit.GAUSS);

  private final String word;
  private final double perTesla;
  private final StatedUnit family;

  FluxUnit(String word, double perTesla, StatedUnit family) {
    this.word = word;
    this.perTesla = perTesla;
    this.family = family;
  }

  /// As files have it: `mT`, `T`, `G`, `kG`.
  public String word() {
    return word;
  }

  /// Tesla or gauss.
  public StatedUnit family() {
    return family;
  }

  /// An amount of this unit in tesla.
  public double tesla(double amount) {
    return amount / perTesla;
  }

  /// A flux density in this unit.
  public double amount(double tesla) {
    return tesla * perTesla;
  }

  /// The unit of a word, or null.
  public static @Nullable FluxUnit of(String word) {
    return Arrays.stream(values()).filter(unit -> unit.word.equals(word)).findFirst().orElse(null);
  }
}
