package lodebook.db.book;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.Duration;
import java.util.List;
import lodebook.db.TestBook;
import lodebook.db.refusal.Notice;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class OpeningTest {
  @TempDir Path folder;

  @Test
  void aBusyBookSaysWhoHasIt() {
    BookAddress place = TestBook.EMBEDDED.newShop();
    Visit visit = TestBook.visit();
    Visit hasty = new Visit("BENCH-2", "lot list", visit.clock(), Duration.ofMillis(20));
    try (Book book = Book.open(place, visit)) {
      assertEquals(place, book.address());
      assertRefused(
          "the book at %s is busy with a test (station BENCH-1, process %d); try again in a moment"
              .formatted(place.shown(), ProcessHandle.current().pid()),
          null,
          () -> Book.open(place, hasty));
    }
    Book.open(place, hasty).close();
  }

  @Test
  void whatIsNoBookIsRefused() throws IOException {
    BookAddress none = new BookAddress.Folder(folder.resolve("none"));
    assertRefused(
        "there is no book at " + none.shown(),
        "lodebook book create --book " + none.shown(),
        () -> Book.open(none, TestBook.visit()));
    assertFalse(Files.exists(folder.resolve("none")));

    Path broken = Files.createDirectory(folder.resolve("broken"));
    Files.writeString(broken.resolve("book.mv.db"), "no database".repeat(1000));
    Refusal refusal =
        assertThrows(
            Refusal.class, () -> Book.open(new BookAddress.Folder(broken), TestBook.visit()));
    assertEquals(5, refusal.kind().exitCode());
    assertEquals(
        "the book at " + broken + " cannot be read: ",
        refusal.getMessage().substring(0, ("the book at " + broken).length() + 17));
  }

  @Test
  void anUnreachableServerIsRefused() {
    BookAddress server = BookAddress.of("jdbc:postgresql://localhost:1/book");
    Refusal refusal = assertThrows(Refusal.class, () -> Book.open(server, TestBook.visit()));
    assertEquals(5, refusal.kind().exitCode());
    assertEquals(
        "the book at jdbc:postgresql://localhost:1/book cannot be reached: Connection to"
            + " localhost:1 refused. Check that the hostname and port are correct and that the"
            + " postmaster is accepting TCP/IP connections.",
        refusal.getMessage());
  }

  @Test
  void anEmptySchemaIsNoBook() {
    BookAddress place = TestBook.SERVER.newPlace();
    assertRefused(
        "there is no book at " + place.shown(),
        "lodebook book create --book " + place.shown(),
        () -> Book.open(place, TestBook.visit()));
  }

  @Test
  void anAddressHoldsNoPassword() {
    assertRefused(
        "the address of a book holds no password; put it into the environment variable PGPASSWORD"
            + " or into a pgpass file",
        "lodebook help book create",
        () -> BookAddress.of("jdbc:postgresql://host/book?user=a&password=b"));
    assertRefused(
        "a book is a folder or a jdbc:postgresql: address, not jdbc:h2:",
        "lodebook help book create",
        () -> BookAddress.of("jdbc:h2:mem:x"));
  }

  @Test
  void aNetworkFileSystemIsRefused() {
    BookAddress.Folder place = new BookAddress.Folder(folder);
    assertRefused(
        "the book at "
            + folder
            + " stands on a network file system (NFS4), where locks do not hold; keep it on a"
            + " local disk, or on a PostgreSQL server if several computers use it",
        "lodebook book create --book FOLDER-ON-A-LOCAL-DISK",
        () -> FileSystems.refuseType(place, "NFS4"));
    FileSystems.refuseType(place, "ext4");
  }

  @ParameterizedTest
  @EnumSource
  void aNewerOrOlderBookIsRefused(TestBook database) throws SQLException {
    BookAddress place = database.newShop();
    run(database, place, "update chain_head set generation = 99");
    assertRefused(
        "the book was made by a newer Lodebook (its tables are of generation 99, this program"
            + " knows "
            + Generation.CURRENT
            + "); use that one",
        null,
        () -> Book.open(place, TestBook.visit()));
    run(database, place, "update chain_head set generation = 1");
    assertRefused(
        "the book's tables are of generation 1, this program needs "
            + Generation.CURRENT
            + "; upgrade the book",
        "lodebook book upgrade",
        () -> Book.open(place, TestBook.visit()));
  }

  @ParameterizedTest
  @EnumSource
  void aClockThatIsBehindTheLastLineIsSaid(TestBook database) {
    BookAddress place = database.newShop();
    try (Book book = Book.open(place, TestBook.visit())) {
      book.run(Act.by("LE"), Permission.LEAD, "test", writing -> {});
      assertEquals(
          List.of(
              Notice.of(
                  "clock.behind", "BENCH-1", "2026-05-04T08:00:00Z", "9", "2026-05-04T08:01:07Z")),
          book.takeNotices());
      assertEquals(List.of(), book.takeNotices());
    }
  }

  private static void run(TestBook database, BookAddress place, String text) throws SQLException {
    try (Connection connection = database.raw(place);
        Statement statement = connection.createStatement()) {
      statement.execute(text);
    }
  }

  private static void assertRefused(
      String sentence, @org.jspecify.annotations.Nullable String remedy, Executable deed) {
    Refusal refusal = assertThrows(Refusal.class, deed);
    assertEquals(sentence, refusal.getMessage());
    assertEquals(remedy, refusal.remedy());
  }
}
