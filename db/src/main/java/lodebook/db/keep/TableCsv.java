package lodebook.db.keep;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import de.siegmar.fastcsv.writer.CsvWriter;
import java.io.IOException;
import java.io.Reader;
import java.io.Writer;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.Instant;
import java.time.OffsetDateTime;
import java.time.ZoneOffset;
import java.util.Iterator;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import lodebook.db.keep.TableShape.Column;
import org.jspecify.annotations.Nullable;

/// A table as CSV (RFC 4180): a header, rows by their primary key, times in UTC, numbers as Java
/// prints them so that they come back the same. An empty field is null where the column may be,
/// else an empty text.
final class TableCsv {
  private static final int AT_ONCE = 1000;

  private TableCsv() {}

  /// Writes all rows and returns how many.
  static long write(Connection connection, TableShape table, Writer out)
      throws SQLException, IOException {
    String columns = table.columns().stream().map(Column::name).collect(Collectors.joining(", "));
    CsvWriter csv = CsvWriter.builder().build(out);
    csv.writeRecord(table.columns().stream().map(Column::name).toList());
    long rows = 0;
    try (Statement statement = connection.createStatement()) {
      statement.setFetchSize(AT_ONCE);
      try (ResultSet result =
          statement.executeQuery(
              "select %s from %s order by %s"
                  .formatted(columns, table.name(), String.join(", ", table.key())))) {
        while (result.next()) {
          csv.writeRecord(row(table, result));
          rows++;
        }
      }
    }
    csv.flush();
    return rows;
  }

  private static List<String> row(TableShape table, ResultSet result) throws SQLException {
    Stream.Builder<String> row = Stream.builder();
    for (int i = 0; i < table.columns().size(); i++) {
      row.add(text(table.columns().get(i), result, i + 1));
    }
    return row.build().toList();
  }

  private static String text(Column column, ResultSet result, int i) throws SQLException {
    Object cell =
        switch (column.kind()) {
          case TEXT -> result.getString(i);
          case WHOLE -> result.getLong(i);
          case REAL -> result.getDouble(i);
          case TRUTH -> result.getBoolean(i);
          case TIME -> result.getObject(i, OffsetDateTime.class);
        };
    if (result.wasNull() || cell == null) {
      return "";
    }
    return cell instanceof OffsetDateTime time ? time.toInstant().toString() : cell.toString();
  }

  /// Inserts all rows and returns how many; reads to the end and leaves the reader open.
  static long read(Connection connection, TableShape table, Reader in) throws SQLException {
    Iterator<CsvRecord> records = CsvReader.builder().ofCsvRecord(in).iterator();
    List<String> header = records.next().getFields();
    List<Column> columns = header.stream().map(name -> column(table, name)).toList();
    String places = columns.stream().map(c -> "?").collect(Collectors.joining(", "));
    long rows = 0;
    try (PreparedStatement insert =
        connection.prepareStatement(
            "insert into %s (%s) values (%s)"
                .formatted(table.name(), String.join(", ", header), places))) {
      while (records.hasNext()) {
        bind(insert, columns, records.next().getFields());
        insert.addBatch();
        if (++rows % AT_ONCE == 0) {
          insert.executeBatch();
        }
      }
      insert.executeBatch();
    }
    return rows;
  }

  private static Column column(TableShape table, String name) {
    return table.columns().stream()
        .filter(c -> c.name().equals(name))
        .findFirst()
        .orElseThrow(
            () -> new IllegalArgumentException("no column " + name + " in " + table.name()));
  }

  private static void bind(PreparedStatement insert, List<Column> columns, List<String> fields)
      throws SQLException {
    for (int i = 0; i < columns.size(); i++) {
      insert.setObject(i + 1, cell(columns.get(i), fields.get(i)));
    }
  }

  private static @Nullable Object cell(Column column, String text) {
    if (text.isEmpty() && column.nullable()) {
      return null;
    }
    return switch (column.kind()) {
      case TEXT -> text;
      case WHOLE -> Long.valueOf(text);
      case REAL -> Double.valueOf(text);
      case TRUTH -> Boolean.valueOf(text);
      case TIME -> Instant.parse(text).atOffset(ZoneOffset.UTC);
    };
  }
}
