package lodebook.db.stock;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import lodebook.db.TestBook;
import lodebook.db.TestShop;
import lodebook.db.book.Book;
import lodebook.db.book.BookAddress;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/// Importing 100 000 piece readings against writing the same rows by bare JDBC batches into a
/// database of the same settings with the same tables.
@Tag("slow")
class ImportSpeedTest {
  private static final int READINGS = 100_000;
  private static final List<String> TABLES =
      List.of("piece", "cell_content", "piece_reading", "piece_strength");

  @Test
  void anImportTakesAtMostThriceTheTimeOfTheBareRows() throws Exception {
    BookAddress.Folder place = (BookAddress.Folder) TestBook.EMBEDDED.newShop();
    double[] imports = new double[3];
    double[] bare = new double[3];
    for (int run = 0; run < 3; run++) {
      imports[run] = importSeconds(place, "L-" + (run + 2));
      bare[run] = bareSeconds(place);
    }
    Arrays.sort(imports);
    Arrays.sort(bare);
    double ratio = imports[1] / bare[1];
    String figures = "import %.2f s, bare %.2f s, ratio %.2f".formatted(imports[1], bare[1], ratio);
    Files.writeString(Path.of("target", "import-speed.txt"), figures + System.lineSeparator());
    assertTrue(ratio <= 3, figures);
  }

  private static double importSeconds(BookAddress.Folder place, String lot) {
    List<ReadingRow> rows = new ArrayList<>(READINGS);
    for (int i = 1; i <= READINGS; i++) {
      rows.add(
          new ReadingRow(
              i,
              lot + "-T" + i / 1000,
              "C" + i % 1000,
              0.3 + i * 1e-7,
              1e-3,
              20.0,
              "GM-1",
              null,
              null));
    }
    try (Book book = Book.open(place, TestBook.visit())) {
      new LotImport(book).importLots(TestShop.LEAD, List.of(TestShop.lot(lot, READINGS)));
      PieceImport imports = new PieceImport(book);
      long start = System.nanoTime();
      imports.importReadings(TestShop.LEAD, lot, rows, null);
      return (System.nanoTime() - start) / 1e9;
    }
  }

  /// Writes the rows that the last import wrote into a second database.
  private static double bareSeconds(BookAddress.Folder place) throws SQLException {
    Path file = place.path().resolve("book");
    Path other = place.path().resolve("bare" + System.nanoTime());
    try (Connection from =
            DriverManager.getConnection("jdbc:h2:" + file + ";MAX_COMPACT_TIME=0", "sa", "");
        Statement reading = from.createStatement();
        Connection to =
            DriverManager.getConnection(
                "jdbc:h2:" + other + ";WRITE_DELAY=0;MAX_COMPACT_TIME=0", "sa", "");
        Statement making = to.createStatement()) {
      long last = lastLine(reading);
      List<List<Object[]>> all = new ArrayList<>();
      for (String table : TABLES) {
        all.add(rows(reading, table, last));
      }
      for (String script : scripts(reading)) {
        making.execute(script);
      }
      to.setAutoCommit(false);
      long start = System.nanoTime();
      for (int i = 0; i < TABLES.size(); i++) {
        insert(to, TABLES.get(i), all.get(i));
      }
      to.commit();
      making.execute("checkpoint sync");
      return (System.nanoTime() - start) / 1e9;
    }
  }

  private static long lastLine(Statement reading) throws SQLException {
    try (var row = reading.executeQuery("select max(history_sequence) from piece")) {
      row.next();
      return row.getLong(1);
    }
  }

  /// The four tables with their keys and checks, without the rows they point to elsewhere.
  private static List<String> scripts(Statement reading) throws SQLException {
    List<String> scripts = new ArrayList<>();
    try (var rows = reading.executeQuery("script nodata")) {
      while (rows.next()) {
        String script = rows.getString(1);
        boolean ours =
            TABLES.stream()
                .anyMatch(
                    t ->
                        script.contains(
                            "\"PUBLIC\".\"" + t.toUpperCase(java.util.Locale.ROOT) + "\""));
        boolean elsewhere =
            script.contains("FOREIGN KEY") && !script.contains("REFERENCES \"PUBLIC\".\"PIECE\"");
        boolean ofOthers =
            script.contains("FOREIGN KEY")
                && TABLES.stream()
                    .noneMatch(
                        t ->
                            script.startsWith(
                                "ALTER TABLE \"PUBLIC\".\""
                                    + t.toUpperCase(java.util.Locale.ROOT)
                                    + "\""));
        if (ours && !elsewhere && !ofOthers) {
          scripts.add(script);
        }
      }
    }
    return scripts;
  }

  private static List<Object[]> rows(Statement reading, String table, long line)
      throws SQLException {
    String which =
        table.equals("cell_content")
            ? " where piece_id in (select id from piece where history_sequence = " + line + ")"
            : " where history_sequence = " + line;
    List<Object[]> rows = new ArrayList<>();
    try (var result = reading.executeQuery("select * from " + table + which)) {
      int columns = result.getMetaData().getColumnCount();
      while (result.next()) {
        Object[] row = new Object[columns];
        for (int i = 0; i < columns; i++) {
          row[i] = result.getObject(i + 1);
        }
        rows.add(row);
      }
    }
    return rows;
  }

  private static void insert(Connection to, String table, List<Object[]> rows) throws SQLException {
    String places = "?, ".repeat(rows.getFirst().length - 1) + "?";
    try (PreparedStatement insert =
        to.prepareStatement("insert into " + table + " values (" + places + ")")) {
      int waiting = 0;
      for (Object[] row : rows) {
        for (int i = 0; i < row.length; i++) {
          insert.setObject(i + 1, row[i]);
        }
        insert.addBatch();
        if (++waiting % 1000 == 0) {
          insert.executeBatch();
        }
      }
      insert.executeBatch();
    }
  }
}
