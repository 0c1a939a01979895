package lodebook.ui.files;

import java.util.HashMap;
import java.util.List;
import java.util.Map;

/// What the header row of a CSV file says.
///
/// @param separator the sign between fields
/// @param line line of the header row
/// @param fields how many fields the header row has
/// @param indexes index of each known column, from 0
record CsvHeader(char separator, int line, int fields, Map<String, Integer> indexes) {
  CsvHeader {
    indexes = Map.copyOf(indexes);
  }

  /// Index of a column, −1 where the file has none of that name.
  int indexOf(String column) {
    return indexes.getOrDefault(column, -1);
  }

  /// The sign between the fields of a header row: the one of `,`, `;` and tab that parts it into
  /// the most fields.
  static char separatorOf(String headerRow) {
    char best = ',';
    for (char candidate : new char[] {';', '\t'}) {
      if (count(headerRow, candidate) > count(headerRow, best)) {
        best = candidate;
      }
    }
    return best;
  }

  private static long count(String text, char sign) {
    return text.chars().filter(c -> c == sign).count();
  }

  /// The columns by name; the first of equals counts.
  static Map<String, Integer> indexes(List<String> names) {
    Map<String, Integer> indexes = new HashMap<>();
    for (int i = 0; i < names.size(); i++) {
      indexes.putIfAbsent(names.get(i), i);
    }
    return indexes;
  }
}
