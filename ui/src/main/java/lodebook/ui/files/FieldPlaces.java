package lodebook.ui.files;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/// Finds where in a CSV file the fields of some records stand. Used only when something is wrong:
/// the file is gone through once more.
final class FieldPlaces {
  private final Map<Integer, List<Place>> places = new HashMap<>();
  private final Set<Integer> wanted;
  private final char separator;
  private int line = 1;
  private int column = 1;
  private boolean afterReturn;
  private boolean unclosed;
  private @Nullable Place openQuote;
  private @Nullable Place afterQuote;

  private FieldPlaces(Set<Integer> wanted, char separator) {
    this.wanted = wanted;
    this.separator = separator;
  }

  /// Goes through a file.
  ///
  /// @param recordLines lines on which the records of interest begin
  static FieldPlaces scan(Source source, char separator, Set<Integer> recordLines) {
    FieldPlaces places = new FieldPlaces(recordLines, separator);
    try (BufferedReader reader = TextFile.open(source)) {
      places.scan(reader);
      return places;
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }

  /// Where a field begins; behind the record's last field where it has fewer.
  ///
  /// @param recordLine line on which the record begins
  /// @param field index of the field, from 0
  Place of(int recordLine, int field) {
    List<Place> fields = places.getOrDefault(recordLine, List.of());
    if (fields.isEmpty()) {
      return new Place(recordLine, 1);
    }
    return fields.get(Math.min(Math.max(field, 0), fields.size() - 1));
  }

  /// Where a quote begins that is never closed, or null.
  @Nullable Place openQuote() {
    return openQuote;
  }

  /// The first place where text follows a closing quote, or null.
  @Nullable Place afterQuote() {
    return afterQuote;
  }

  private void scan(BufferedReader reader) throws IOException {
    int c = reader.read();
    while (c >= 0) {
      int recordLine = line;
      List<Place> fields = new ArrayList<>();
      boolean inRecord = true;
      while (inRecord) {
        fields.add(new Place(line, column));
        c = field(reader, c);
        inRecord = c == separator;
        if (inRecord) {
          step(c);
          c = reader.read();
        }
      }
      if (wanted.contains(recordLine)) {
        fields.add(new Place(line, column));
        places.put(recordLine, fields);
      }
      if (c >= 0) {
        step(c);
        c = reader.read();
      }
    }
  }

  private int field(BufferedReader reader, int first) throws IOException {
    int c = first;
    if (c == '"') {
      Place quote = new Place(line, column);
      c = quoted(reader);
      if (c < 0 && openQuote == null && unclosed) {
        openQuote = quote;
      }
      if (c >= 0 && !ends(c) && afterQuote == null) {
        afterQuote = new Place(line, column);
      }
    }
    while (c >= 0 && !ends(c)) {
      step(c);
      c = reader.read();
    }
    return c;
  }

  private int quoted(BufferedReader reader) throws IOException {
    step('"');
    unclosed = true;
    int c = reader.read();
    while (c >= 0) {
      step(c);
      boolean quote = c == '"';
      c = reader.read();
      if (quote && c == '"') {
        step(c);
        c = reader.read();
      } else if (quote) {
        unclosed = false;
        return c;
      }
    }
    return c;
  }

  private boolean ends(int c) {
    return c == separator || c == '\n' || c == '\r';
  }

  private void step(int c) {
    if (c == '\n' && afterReturn) {
      afterReturn = false;
      return;
    }
    afterReturn = c == '\r';
    if (c == '\n' || c == '\r') {
      line++;
      column = 1;
    } else {
      column++;
    }
  }
}
