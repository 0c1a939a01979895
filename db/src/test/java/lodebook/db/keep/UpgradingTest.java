package lodebook.db.keep;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.List;
import lodebook.db.TestBook;
import lodebook.db.TestShop;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.BookAddress;
import lodebook.db.history.Histories;
import lodebook.db.refusal.Refusal;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class UpgradingTest {
  @TempDir Path folder;

  @ParameterizedTest
  @EnumSource
  void anOlderBookIsUpgradedByALeadAfterABackup(TestBook database) throws SQLException {
    BookAddress place = database.newShop();
    Path backup = folder.resolve("before.zip");
    assertRefused(
        "the book is of generation 5, which this program uses: there is nothing to upgrade",
        place,
        TestShop.LEAD,
        backup);
    makeOlder(database, place);
    assertRefused(
        "BE is bench and may not do \"book upgrade\"; it needs lead",
        place,
        TestShop.BENCH,
        backup);

    Upgrading.upgrade(place, TestBook.visit(), TestShop.LEAD, backup);

    assertTrue(Files.exists(backup));
    try (Book book = Book.open(place, TestBook.visit())) {
      assertEquals(List.of(), Verification.of(book, null).faults());
      assertEquals(
          "[Field[name=from, content=4], Field[name=to, content=5]]",
          new Histories(book).list(null).getLast().fields().toString());
    }
  }

  /// Takes away what the fifth generation added.
  private static void makeOlder(TestBook database, BookAddress place) throws SQLException {
    try (Connection connection = database.raw(place);
        Statement statement = connection.createStatement()) {
      for (String table :
          List.of(
              "survey_change",
              "live_rotor",
              "membership_end",
              "membership",
              "unit_state",
              "unit",
              "finding",
              "survey_check",
              "reading",
              "survey")) {
        statement.execute("drop table " + table);
      }
      String quoted = database == TestBook.EMBEDDED ? "\"" : "";
      statement.execute(
          "delete from %1$sflyway_schema_history%1$s where %1$sversion%1$s = '5'"
              .formatted(quoted));
      statement.execute("update chain_head set generation = 4");
    }
  }

  private static void assertRefused(String sentence, BookAddress place, Act act, Path backup) {
    Refusal refusal =
        assertThrows(Refusal.class, () -> Upgrading.upgrade(place, TestBook.visit(), act, backup));
    assertEquals(sentence, refusal.getMessage());
  }
}
