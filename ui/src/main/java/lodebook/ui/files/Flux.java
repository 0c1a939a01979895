package lodebook.ui.files;

import java.util.LinkedHashMap;
import java.util.Map;

/// A unit of flux density as files write it.
public enum Flux {
  /// Millitesla.
  MILLITESLA("mT", 1000),
  /// Tesla.
  TESLA("T", 1),
  /// Gauss: 10 000 to the tesla.
  GAUSS("G", 10_000),
  /// Kilogauss: 10 to the tesla.
  KILOGAUSS("kG", 10);

  private static final Map<String, Flux> WORDS = words();

  private final String word;
  private final double perTesla;

  Flux(String word, double perTesla) {
    this.word = word;
    this.perTesla = perTesla;
  }

  private static Map<String, Flux> words() {
    Map<String, Flux> words = new LinkedHashMap<>();
    for (Flux unit : values()) {
      words.put(unit.word, unit);
    }
    return words;
  }

  /// Reads the unit of a row.
  static Flux of(Cells cells) {
    return cells.oneOf("unit", WORDS, MILLITESLA);
  }

  /// The unit as it is written.
  public String word() {
    return word;
  }

  /// A value in this unit as tesla.
  public double tesla(double amount) {
    return amount / perTesla;
  }

  /// Whether the unit belongs to the gauss family.
  public boolean gauss() {
    return this == GAUSS || this == KILOGAUSS;
  }
}
