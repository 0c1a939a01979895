package lodebook.ui.files;

import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/// All rows of a file that is right in itself.
///
/// @param <T> what a row is
public final class Rows<T> implements Placed {
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

  @Override
  public List<Problem> problems(List<Fault> faults) {
    Set<Integer> wanted = new HashSet<>();
    faults.forEach(f -> wanted.add(lines[f.row()]));
    FieldPlaces places = FieldPlaces.scan(source, header.separator(), wanted);
    return faults.stream().map(f -> problem(f, places)).toList();
  }

  private Problem problem(Fault fault, FieldPlaces places) {
    Place place = places.of(lines[fault.row()], header.indexOf(fault.column()));
    return new Problem(source.path().toString(), place, fault.sentence());
  }
}
