package lodebook.ui.files;

import java.util.Arrays;
import java.util.List;
import java.util.Set;

/// All rows of a file that is right in itself.
///
/// @param <T> what a row is
public final class Rows<T> {
  private final Source source;
  private final CsvHeader header;
  private final List<T> all;
  private final int[] lines;

  Rows(Source source, CsvHeader header, List<T> all, int[] lines) {
    this.source = source;
    this.header = header;
    this.all = all;
    this.lines = Arrays.copyOf(lines, all.size());
  }

  /// The rows in the file's order.
  public List<T> all() {
    return all;
  }

  /// How many there are.
  public int count() {
    return all.size();
  }

  /// A problem that only the book knew of, at its place in the file.
  ///
  /// @param row index of the row, from 0
  /// @param column name of the column at fault
  /// @param sentence what is wrong
  public Problem problem(int row, String column, String sentence) {
    int line = lines[row];
    Place place =
        FieldPlaces.scan(source, header.separator(), Set.of(line)).of(line, header.indexOf(column));
    return new Problem(source.path().toString(), place.line(), place.column(), sentence);
  }
}
