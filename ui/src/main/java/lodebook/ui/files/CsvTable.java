package lodebook.ui.files;

import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import de.siegmar.fastcsv.reader.FieldMismatchStrategy;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.CharacterCodingException;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.HashMap;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import lodebook.ui.words.Nearest;
import org.jspecify.annotations.Nullable;

/// Reads a CSV file as the contract has it: RFC 4180 in UTF-8, a header row, columns in any order,
/// `,` or `;` between fields; a decimal comma only with `;`.
///
/// Rows are read one by one. Every problem is noted; their places are looked up at the end.
///
/// @param <T> what a row is
final class CsvTable<T> {
  private static final int LONGEST_HEADER = 1 << 15;
  private static final int SHARED = 10_000;

  private final Source source;
  private final List<Column> columns;
  private final List<Noted> noted = new ArrayList<>();
  private final Map<String, String> shared = new HashMap<>();
  private int count;
  private CsvHeader header = new CsvHeader(',', 1, 0, Map.of());

  private CsvTable(Source source, List<Column> columns) {
    this.source = source;
    this.columns = columns;
  }

  /// Reads all rows.
  ///
  /// @param columns the columns that the file must or may have
  /// @param maker makes a value of a row's fields
  /// @throws BadFile where anything is wrong
  static <T> Rows<T> read(Source source, List<Column> columns, RowMaker<T> maker) {
    return new CsvTable<T>(source, columns).read(maker);
  }

  char separator() {
    return header.separator();
  }

  ZoneId zone() {
    return source.zone();
  }

  int indexOf(String column) {
    return header.indexOf(column);
  }

  /// One object for equal short texts, so that a long file of few words stays small.
  String shared(String text) {
    if (shared.size() >= SHARED || text.length() > 40) {
      return shared.getOrDefault(text, text);
    }
    String before = shared.putIfAbsent(text, text);
    return before == null ? text : before;
  }

  void problem(int line, int field, String key, Object... arguments) {
    count++;
    if (noted.size() < BadFile.SHOWN) {
      noted.add(new Noted(line, field, source.words().say(key, arguments)));
    }
  }

  private Rows<T> read(RowMaker<T> maker) {
    try (BufferedReader reader = TextFile.open(source)) {
      reader.mark(LONGEST_HEADER);
      String first = firstLine(reader);
      if (first.isBlank()) {
        throw source.bad(Place.START, "file.no-header", Column.names(columns));
      }
      header = new CsvHeader(CsvHeader.separatorOf(first), 1, 0, Map.of());
      if (header.separator() == '\t') {
        throw source.bad(Place.START, "file.tabs");
      }
      reader.reset();
      CsvReader<CsvRecord> csv =
          CsvReader.builder()
              .fieldSeparator(header.separator())
              .extraFieldStrategy(FieldMismatchStrategy.IGNORE)
              .missingFieldStrategy(FieldMismatchStrategy.IGNORE)
              .allowUnclosedQuote(false)
              .ofCsvRecord(reader);
      return rows(csv.iterator(), maker);
    } catch (UncheckedIOException failed) {
      throw failed.getCause() instanceof CharacterCodingException
          ? TextFile.notUtf8(source)
          : failed;
    } catch (CharacterCodingException wrong) {
      throw TextFile.notUtf8(source);
    } catch (IOException unreadable) {
      throw source.bad(Place.START, "file.unreadable", unreadable);
    } catch (CsvParseException broken) {
      throw brokenQuotes(broken);
    }
  }

  private static String firstLine(BufferedReader reader) throws IOException {
    StringBuilder line = new StringBuilder();
    for (int c = reader.read(); c >= 0 && line.length() < LONGEST_HEADER - 1; c = reader.read()) {
      boolean end = c == '\n' || c == '\r';
      if (end && !line.toString().isBlank()) {
        break;
      }
      line.append((char) c);
    }
    return line.toString();
  }

  private Rows<T> rows(Iterator<CsvRecord> records, RowMaker<T> maker) {
    header = header(records.next());
    throwIfAny();
    List<T> rows = new ArrayList<>();
    int[] lines = new int[16];
    Cells cells = new Cells(this);
    while (records.hasNext()) {
      CsvRecord csv = records.next();
      String[] fields = csv.getFields().toArray(String[]::new);
      int line = Math.toIntExact(csv.getStartingLineNumber());
      if (Arrays.stream(fields).allMatch(String::isBlank)) {
        continue;
      }
      T row = row(cells, line, fields, maker);
      if (row != null && count == 0) {
        if (rows.size() == lines.length) {
          lines = Arrays.copyOf(lines, 2 * lines.length);
        }
        lines[rows.size()] = line;
        rows.add(row);
      }
    }
    throwIfAny();
    if (rows.isEmpty()) {
      throw source.bad(new Place(header.line(), 1), "file.no-rows");
    }
    return new Rows<>(source, header, rows, lines);
  }

  private @Nullable T row(Cells cells, int line, String[] fields, RowMaker<T> maker) {
    if (fields.length == header.fields()) {
      cells.show(line, fields);
      return maker.make(cells);
    }
    boolean tooMany = fields.length > header.fields();
    problem(
        line,
        tooMany ? header.fields() : fields.length,
        !tooMany ? "row.short" : separator() == ',' ? "row.long-comma" : "row.long",
        fields.length,
        header.fields());
    return null;
  }

  private CsvHeader header(CsvRecord csv) {
    int line = Math.toIntExact(csv.getStartingLineNumber());
    List<String> names = csv.getFields().stream().map(String::strip).toList();
    List<String> known = columns.stream().map(Column::name).toList();
    List<String> missing =
        columns.stream()
            .filter(Column::required)
            .map(Column::name)
            .filter(c -> !names.contains(c))
            .toList();
    for (int i = 0; i < names.size(); i++) {
      String name = names.get(i);
      if (names.indexOf(name) < i && known.contains(name)) {
        problem(line, i, "header.twice", name);
      } else if (!known.contains(name) && !name.isEmpty()) {
        String nearest = Nearest.to(name, missing);
        source.warn().accept(unknown(name, nearest));
      }
    }
    if (missing.size() == columns.stream().filter(Column::required).count()) {
      problem(line, 0, "file.no-header", Column.names(columns));
    } else {
      for (String name : missing) {
        String nearest = Nearest.to(name, names.stream().filter(n -> !known.contains(n)).toList());
        if (nearest == null) {
          problem(line, names.size(), "header.missing", name, Column.names(columns));
        } else {
          problem(line, names.indexOf(nearest), "header.missing-nearest", name, nearest);
        }
      }
    }
    return new CsvHeader(separator(), line, names.size(), CsvHeader.indexes(names));
  }

  private String unknown(String name, @Nullable String nearest) {
    return nearest == null
        ? source.words().say("header.unknown", source.path(), name)
        : source.words().say("header.unknown-nearest", source.path(), name, nearest);
  }

  private void throwIfAny() {
    if (count == 0) {
      return;
    }
    Set<Integer> lines = new TreeSet<>();
    noted.forEach(n -> lines.add(n.line()));
    FieldPlaces places = FieldPlaces.scan(source, separator(), lines);
    List<Problem> problems =
        noted.stream()
            .map(
                n -> {
                  Place place = places.of(n.line(), n.field());
                  return new Problem(
                      source.path().toString(), place.line(), place.column(), n.sentence());
                })
            .sorted(Comparator.comparingInt(Problem::line).thenComparingInt(Problem::column))
            .toList();
    throw new BadFile(problems, count);
  }

  private BadFile brokenQuotes(CsvParseException broken) {
    FieldPlaces places = FieldPlaces.scan(source, separator(), Set.of());
    if (places.afterQuote() != null) {
      return source.bad(places.afterQuote(), "file.text-after-quote");
    }
    if (places.openQuote() != null) {
      return source.bad(places.openQuote(), "file.open-quote");
    }
    return source.bad(Place.START, "file.not-csv", broken);
  }

  /// Makes a value of the fields of one row.
  @FunctionalInterface
  interface RowMaker<T> {
    /// The value; it counts only where no problem was noted.
    T make(Cells cells);
  }

  private record Noted(int line, int field, String sentence) {}
}
