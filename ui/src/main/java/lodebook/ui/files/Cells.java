package lodebook.ui.files;

import java.time.Instant;
import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.Map;
import java.util.regex.Pattern;
import lodebook.ui.words.Nearest;
import org.jspecify.annotations.Nullable;

/// The fields of one row by the names of their columns, read as what they should be.
///
/// What is wrong is noted, with its place, in the file's problems, and a stand-in is returned: a
/// row with a problem is dropped, so that the stand-in is never used.
public final class Cells {
  private static final Pattern NUMBER =
      Pattern.compile("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eE][+-]?\\d{1,3})?");
  private static final Pattern DECIMAL_COMMA = Pattern.compile("[+-]?\\d+,\\d+");
  private static final Pattern WHOLE = Pattern.compile("[+-]?\\d{1,18}");
  private static final double COLDEST = -273.15;

  private final CsvTable<?> table;
  private String[] fields = {};
  private int line;

  Cells(CsvTable<?> table) {
    this.table = table;
  }

  void show(int atLine, String[] rowFields) {
    line = atLine;
    fields = rowFields;
  }

  /// Line on which the row begins.
  public int line() {
    return line;
  }

  /// Whether the field is there and not empty.
  public boolean has(String column) {
    return !raw(column).isEmpty();
  }

  /// The field without spaces round it; empty where the row or the file lacks it.
  public String raw(String column) {
    int index = table.indexOf(column);
    return index < 0 || index >= fields.length ? "" : table.shared(fields[index].strip());
  }

  /// Notes a problem with a field.
  public void problem(String column, String key, Object... arguments) {
    table.problem(line, table.indexOf(column), key, arguments);
  }

  /// A text that must be there.
  public String text(String column) {
    String text = raw(column);
    if (text.isEmpty()) {
      problem(column, "cell.empty", column);
    }
    return text;
  }

  /// A number that must be there.
  public double number(String column) {
    return number(column, text(column));
  }

  /// A number, or null where the field is empty.
  public @Nullable Double numberOrNull(String column) {
    return has(column) ? number(column, raw(column)) : null;
  }

  /// A number that must be there and be above zero.
  public double positive(String column) {
    double number = number(column);
    if (number <= 0) {
      problem(column, "cell.not-positive", column, raw(column));
    }
    return number;
  }

  /// A number that must be there and not be below zero.
  public double notNegative(String column) {
    double number = number(column);
    if (number < 0) {
      problem(column, "cell.negative", column, raw(column));
    }
    return number;
  }

  /// A temperature in °C, or null where the field is empty.
  public @Nullable Double celsiusOrNull(String column) {
    Double celsius = numberOrNull(column);
    if (celsius != null && celsius < COLDEST) {
      problem(column, "cell.too-cold", raw(column));
    }
    return celsius;
  }

  /// A whole number from 1 that must be there.
  public int count(String column) {
    String text = text(column);
    if (text.isEmpty()) {
      return 1;
    }
    long count = WHOLE.matcher(text).matches() ? Long.parseLong(text) : 0;
    if (count < 1 || count > Integer.MAX_VALUE) {
      problem(column, "cell.not-count", column, text);
      return 1;
    }
    return (int) count;
  }

  /// A day that must be there.
  public LocalDate day(String column) {
    String text = text(column);
    try {
      return text.isEmpty() ? LocalDate.EPOCH : LocalDate.parse(text);
    } catch (DateTimeParseException wrong) {
      problem(column, "cell.not-day", column, text);
      return LocalDate.EPOCH;
    }
  }

  /// A time, or null where the field is empty; without an offset it is the station's own.
  public @Nullable Instant timeOrNull(String column) {
    String text = raw(column);
    try {
      return text.isEmpty() ? null : Times.parse(text, table.zone());
    } catch (DateTimeParseException wrong) {
      problem(column, "cell.not-time", column, text);
      return null;
    }
  }

  /// One of some words that must be there.
  ///
  /// @param meanings what each word means
  /// @param otherwise the stand-in
  public <T> T oneOf(String column, Map<String, T> meanings, T otherwise) {
    String text = text(column);
    T meaning = meanings.get(text);
    if (meaning != null || text.isEmpty()) {
      return meaning == null ? otherwise : meaning;
    }
    String words = String.join(", ", meanings.keySet());
    String nearest = Nearest.to(text, meanings.keySet());
    if (nearest == null) {
      problem(column, "cell.not-word", column, text, words);
    } else {
      problem(column, "cell.not-word-nearest", column, text, words, nearest);
    }
    return otherwise;
  }

  private double number(String column, String text) {
    if (text.isEmpty()) {
      return Double.NaN;
    }
    String plain = text;
    if (DECIMAL_COMMA.matcher(text).matches()) {
      if (table.separator() != ';') {
        problem(column, "cell.decimal-comma", column, text, text.replace(',', '.'));
        return Double.NaN;
      }
      plain = text.replace(',', '.');
    }
    if (NUMBER.matcher(plain).matches()) {
      double number = Double.parseDouble(plain);
      if (Double.isFinite(number)) {
        return number;
      }
    }
    problem(column, "cell.not-number", column, text);
    return Double.NaN;
  }
}
