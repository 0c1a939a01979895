package lodebook.ui.files;

import java.util.List;
import java.util.stream.Stream;

/// A column that a CSV file may have.
///
/// @param name its name in the header row
/// @param required whether the file must have it
public record Column(String name, boolean required) {
  /// Columns that a file must have, in the order of the contract.
  static List<Column> required(String... names) {
    return Stream.of(names).map(n -> new Column(n, true)).toList();
  }

  /// The same columns and some that a file may lack.
  static List<Column> andOptional(List<Column> columns, String... names) {
    return Stream.concat(columns.stream(), Stream.of(names).map(n -> new Column(n, false)))
        .toList();
  }

  /// The names with commas between.
  static String names(List<Column> columns) {
    return String.join(",", columns.stream().map(Column::name).toList());
  }
}
