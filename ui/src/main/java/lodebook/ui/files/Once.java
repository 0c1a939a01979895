package lodebook.ui.files;

import java.util.HashMap;
import java.util.Locale;
import java.util.Map;

/// Sees to it that something stands in one row of a file only, upper and lower case being equal.
final class Once {
  private final Map<String, Integer> lines = new HashMap<>();

  /// Reads a text that must be there and that no earlier row may have.
  String check(Cells cells, String column) {
    String text = cells.text(column);
    if (!text.isEmpty()) {
      check(cells, column, text, column + " " + text);
    }
    return text;
  }

  /// Notes a problem where an earlier row has the same.
  ///
  /// @param same what is compared
  /// @param shown how it is called in the sentence
  void check(Cells cells, String column, String same, String shown) {
    Integer before = lines.putIfAbsent(same.toLowerCase(Locale.ROOT), cells.line());
    if (before != null) {
      cells.problem(column, "row.repeated", shown, before);
    }
  }
}
