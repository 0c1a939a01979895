package lodebook.db.keep;

import java.sql.Connection;
import java.sql.DatabaseMetaData;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;

/// A table of the book as the database describes it, whatever generation it is of.
///
/// @param name in lower case
/// @param columns its columns in their order
/// @param key the columns of its primary key
/// @param needs tables that its foreign keys point to
record TableShape(String name, List<Column> columns, List<String> key, Set<String> needs) {
  /// A column.
  ///
  /// @param name in lower case
  /// @param kind what it holds
  /// @param nullable whether it may be empty
  record Column(String name, Kind kind, boolean nullable) {}

  /// What a column holds.
  enum Kind {
    TEXT,
    WHOLE,
    REAL,
    TRUTH,
    TIME
  }

  /// All tables of the book, each after those that its foreign keys need.
  static List<TableShape> all(Connection connection) throws SQLException {
    DatabaseMetaData meta = connection.getMetaData();
    Map<String, TableShape> tables = new TreeMap<>();
    for (String table : names(meta, connection)) {
      tables.put(
          table.toLowerCase(Locale.ROOT),
          new TableShape(
              table.toLowerCase(Locale.ROOT),
              columns(meta, connection, table),
              key(meta, connection, table),
              needs(meta, connection, table)));
    }
    Map<String, TableShape> ordered = new LinkedHashMap<>();
    tables.values().forEach(t -> place(t, tables, ordered));
    return List.copyOf(ordered.values());
  }

  private static void place(
      TableShape table, Map<String, TableShape> tables, Map<String, TableShape> ordered) {
    if (ordered.containsKey(table.name())) {
      return;
    }
    for (String needed : table.needs()) {
      TableShape other = tables.get(needed);
      if (other != null && !needed.equals(table.name())) {
        place(other, tables, ordered);
      }
    }
    ordered.put(table.name(), table);
  }

  private static List<String> names(DatabaseMetaData meta, Connection connection)
      throws SQLException {
    List<String> names = new ArrayList<>();
    try (ResultSet rows =
        meta.getTables(
            connection.getCatalog(),
            connection.getSchema(),
            "%",
            new String[] {"TABLE", "BASE TABLE"})) {
      while (rows.next()) {
        String name = rows.getString("TABLE_NAME");
        if (!name.equalsIgnoreCase("flyway_schema_history")) {
          names.add(name);
        }
      }
    }
    return names;
  }

  private static List<Column> columns(DatabaseMetaData meta, Connection connection, String table)
      throws SQLException {
    List<Column> columns = new ArrayList<>();
    try (ResultSet rows =
        meta.getColumns(connection.getCatalog(), connection.getSchema(), table, "%")) {
      while (rows.next()) {
        columns.add(
            new Column(
                rows.getString("COLUMN_NAME").toLowerCase(Locale.ROOT),
                kind(rows.getString("TYPE_NAME")),
                rows.getInt("NULLABLE") == DatabaseMetaData.columnNullable));
      }
    }
    return columns;
  }

  private static Kind kind(String type) {
    return switch (type.toLowerCase(Locale.ROOT)) {
      case "varchar", "character varying" -> Kind.TEXT;
      case "int8", "bigint" -> Kind.WHOLE;
      case "float8", "double precision" -> Kind.REAL;
      case "bool", "boolean" -> Kind.TRUTH;
      case "timestamptz", "timestamp with time zone" -> Kind.TIME;
      default -> throw new IllegalStateException("a column of type " + type);
    };
  }

  private static List<String> key(DatabaseMetaData meta, Connection connection, String table)
      throws SQLException {
    Map<Integer, String> key = new TreeMap<>();
    try (ResultSet rows =
        meta.getPrimaryKeys(connection.getCatalog(), connection.getSchema(), table)) {
      while (rows.next()) {
        key.put(rows.getInt("KEY_SEQ"), rows.getString("COLUMN_NAME").toLowerCase(Locale.ROOT));
      }
    }
    return List.copyOf(key.values());
  }

  private static Set<String> needs(DatabaseMetaData meta, Connection connection, String table)
      throws SQLException {
    Set<String> needs = new LinkedHashSet<>();
    try (ResultSet rows =
        meta.getImportedKeys(connection.getCatalog(), connection.getSchema(), table)) {
      while (rows.next()) {
        needs.add(rows.getString("PKTABLE_NAME").toLowerCase(Locale.ROOT));
      }
    }
    return needs;
  }
}
