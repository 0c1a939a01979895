package lodebook.db.book;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.SQLException;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class EmbeddedEngineTest {
  @TempDir Path folder;

  @Test
  void theEngineNeverMovesPartsOfAFileAboutAndNeverPutsOffAWrite() throws SQLException {
    EmbeddedEngine engine = EmbeddedEngine.named(new BookAddress.Folder(folder), "new");
    try (Connection connection = engine.connect()) {
      assertEquals(
          Map.of("AUTO_COMPACT_FILL_RATE", "0", "MAX_COMPACT_TIME", "0", "WRITE_DELAY", "0"),
          settings(connection));
    }
  }

  private static Map<String, String> settings(Connection connection) throws SQLException {
    Map<String, String> settings = new TreeMap<>();
    try (var statement = connection.createStatement();
        var rows =
            statement.executeQuery(
                "select setting_name, setting_value from information_schema.settings where"
                    + " setting_name in"
                    + " ('AUTO_COMPACT_FILL_RATE', 'MAX_COMPACT_TIME', 'WRITE_DELAY')")) {
      while (rows.next()) {
        settings.put(rows.getString(1), rows.getString(2));
      }
    }
    return settings;
  }
}
