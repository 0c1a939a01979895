package lodebook.db.book;

import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.Collections;
import java.util.List;
import java.util.stream.Collectors;
import org.jooq.DSLContext;
import org.jooq.Field;
import org.jooq.Query;
import org.jooq.Record;
import org.jooq.Table;
import org.jooq.exception.DataAccessException;
import org.jspecify.annotations.Nullable;

/// Inserts many rows at once.
public final class Bulk {
  private static final int AT_ONCE = 1000;

  private Bulk() {}

  /// Inserts rows in batches.
  ///
  /// @param columns the columns that a row fills
  /// @param rows each with one entry for each column: text, number, boolean, [Instant] or null
  public static void insert(
      DSLContext sql,
      Table<? extends Record> table,
      List<? extends Field<?>> columns,
      List<@Nullable Object[]> rows) {
    if (rows.isEmpty()) {
      return;
    }
    Query query = sql.insertInto(table, columns).values(Collections.nCopies(columns.size(), null));
    execute(sql, sql.render(query), rows);
  }

  /// Changes rows in batches.
  ///
  /// @param columns the columns that change
  /// @param key the column by which a row is found
  /// @param rows each with one entry for each column that changes, then the key
  public static void update(
      DSLContext sql,
      Table<? extends Record> table,
      List<? extends Field<?>> columns,
      Field<Long> key,
      List<@Nullable Object[]> rows) {
    if (rows.isEmpty()) {
      return;
    }
    String changes =
        columns.stream()
            .map(c -> c.getUnqualifiedName().unquotedName() + " = ?")
            .collect(Collectors.joining(", "));
    execute(
        sql,
        "update %s set %s where %s = ?"
            .formatted(
                table.getUnqualifiedName().unquotedName(),
                changes,
                key.getUnqualifiedName().unquotedName()),
        rows);
  }

  private static void execute(DSLContext sql, String statement, List<@Nullable Object[]> rows) {
    sql.connection(
        connection -> {
          try (PreparedStatement prepared = connection.prepareStatement(statement)) {
            int waiting = 0;
            for (@Nullable Object[] row : rows) {
              bind(prepared, row);
              prepared.addBatch();
              if (++waiting == AT_ONCE) {
                prepared.executeBatch();
                waiting = 0;
              }
            }
            prepared.executeBatch();
          } catch (SQLException failure) {
            throw new DataAccessException(statement, failure);
          }
        });
  }

  private static void bind(PreparedStatement prepared, @Nullable Object[] row) throws SQLException {
    for (int i = 0; i < row.length; i++) {
      Object cell = row[i];
      prepared.setObject(
          i + 1, cell instanceof Instant instant ? instant.atOffset(ZoneOffset.UTC) : cell);
    }
  }
}
