package lodebook.ui.files;

import java.util.LinkedHashMap;
import java.util.Map;
import lodebook.db.surveys.FluxUnit;

/// Units of flux density as files write them.
final class Units {
  private static final Map<String, FluxUnit> WORDS = words();

  private Units() {}

  private static Map<String, FluxUnit> words() {
    Map<String, FluxUnit> words = new LinkedHashMap<>();
    for (FluxUnit unit : FluxUnit.values()) {
      words.put(unit.word(), unit);
    }
    return words;
  }

  /// Reads the unit of a row.
  static FluxUnit of(Cells cells) {
    return cells.oneOf("unit", WORDS, FluxUnit.MILLITESLA);
  }
}
