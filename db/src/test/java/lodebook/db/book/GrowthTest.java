package lodebook.db.book;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.sql.Statement;
import lodebook.db.TestBook;
import lodebook.db.TestShop;
import lodebook.db.rights.Permission;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/// How the embedded file grows when it is opened for each operation and closed again.
class GrowthTest {
  @Test
  void afterAThousandOperationsTheFileIsAtMostThreeTimesItsCompactedSize() throws Exception {
    assertGrowth(1_000);
  }

  @Test
  @Tag("slow")
  void afterTenThousandOperationsTheFileIsAtMostThreeTimesItsCompactedSize() throws Exception {
    assertGrowth(10_000);
  }

  /// 26 to 41 MB were measured for 1000 operations where nobody compacts.
  private static void assertGrowth(int operations) throws SQLException, IOException {
    BookAddress.Folder place = (BookAddress.Folder) TestBook.EMBEDDED.newShop();
    Visit visit = TestBook.visit();
    for (int i = 0; i < operations; i++) {
      String number = String.valueOf(i);
      try (Book book = Book.open(place, visit)) {
        book.run(
            TestShop.LEAD,
            Permission.LEAD,
            "test",
            writing -> writing.line().field("number", number));
      }
    }
    long grown = Files.size(place.file());
    long compacted = compacted(place);
    Files.writeString(
        Path.of("target", "growth-" + operations + ".txt"),
        "%d operations: %d bytes, compacted %d%n".formatted(operations, grown, compacted));
    assertTrue(
        grown <= 3 * compacted,
        () -> "%d operations: %d bytes, %d compacted".formatted(operations, grown, compacted));
  }

  private static long compacted(BookAddress.Folder place) throws SQLException, IOException {
    Path file = place.path().resolve("book");
    try (Connection connection = DriverManager.getConnection("jdbc:h2:" + file, "sa", "");
        Statement statement = connection.createStatement()) {
      statement.execute("shutdown compact");
    }
    return Files.size(place.file());
  }
}
