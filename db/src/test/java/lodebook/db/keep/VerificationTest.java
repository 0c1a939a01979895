package lodebook.db.keep;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.sql.Connection;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.List;
import lodebook.db.TestBook;
import lodebook.db.book.Book;
import lodebook.db.book.BookAddress;
import lodebook.db.refusal.Sentences;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class VerificationTest {
  @ParameterizedTest
  @EnumSource
  void aBookAsItWasWrittenIsWhole(TestBook database) {
    BookAddress place = BackupTest.shopWithReadings(database);
    try (Book book = Book.open(place, TestBook.visit())) {
      Verification.Outcome outcome = Verification.of(book, null);
      assertEquals(List.of(), outcome.faults());
      assertEquals(10, outcome.lines());
      assertEquals(List.of(), Verification.of(book, outcome.head()).faults());
      assertEquals(BookInfo.of(book).head(), outcome.head());
    }
  }

  @ParameterizedTest
  @EnumSource
  void theFirstLineThatWasTamperedWithIsNamed(TestBook database) throws SQLException {
    String four = "line 4 of the history does not fit: it was changed, taken out, put in or moved";
    assertFault(
        database,
        four,
        "update history set content = replace(content, 'Pia', 'Pit') where sequence = 4");
    assertFault(database, four, "update history set initials = 'BE' where sequence = 4");
    assertFault(
        database, four, "update history set operation = 'person retire' where sequence = 4");
    assertFault(
        database,
        "line 6 of the history does not fit: it was changed, taken out, put in or moved",
        "delete from history_subject where sequence = 6");
    assertFault(database, four, "delete from history where sequence = 4");
    assertFault(
        database,
        "line 3 of the history does not fit: it was changed, taken out, put in or moved",
        "update history set sequence = 99 where sequence = 3",
        "update history set sequence = 3 where sequence = 4",
        "update history set sequence = 4 where sequence = 99");
    assertFault(
        database,
        "the history ends with line 9, but the book's head says 10",
        "delete from history_subject where sequence = 10",
        "delete from history where sequence = 10");
  }

  @ParameterizedTest
  @EnumSource
  void whatStandsOtherwiseThanTheHistorySaysIsNamed(TestBook database) throws SQLException {
    assertFault(
        database,
        "lot L-1: the tables say rejected, the history says accepted",
        "update lot set state = 'rejected', clear = false");
    assertFault(
        database,
        "person BE: the tables say lead, the history says bench",
        "update person set role = 'lead' where initials = 'BE'");
    assertFault(
        database,
        "piece L-1/0002: the tables say scrapped, the history says usable",
        "update piece set state = 'scrapped', clear = false where number = 2");
  }

  @ParameterizedTest
  @EnumSource
  void aCutTailShowsAgainstAPrintedHead(TestBook database) throws SQLException {
    BookAddress place = BackupTest.shopWithReadings(database);
    Head printed;
    try (Book book = Book.open(place, TestBook.visit())) {
      printed = BookInfo.of(book).head();
    }
    run(
        database,
        place,
        "delete from history_subject where sequence = 10",
        "delete from history where sequence = 10",
        "update chain_head set sequence = 9, hash = (select hash from history where sequence = 9)");
    try (Book book = Book.open(place, TestBook.visit())) {
      assertEquals(List.of(), Verification.of(book, null).faults());
      assertEquals(
          "the head %s is not in the history, which ends with %s: lines were cut off or rewritten"
              .formatted(printed, BookInfo.of(book).head()),
          Sentences.english().say(Verification.of(book, printed).faults().getFirst()));
    }
  }

  @ParameterizedTest
  @EnumSource
  void rowsThatPointToNothingAreNamed(TestBook database) throws SQLException {
    assertFault(
        database,
        "table piece_reading: 1 row points to nothing (fk_piece_reading_meter)",
        "alter table piece_reading drop constraint fk_piece_reading_meter",
        "update piece_reading set meter_id = 999999 where meter_id is not null");
  }

  private static void assertFault(TestBook database, String sentence, String... tampering)
      throws SQLException {
    BookAddress place = BackupTest.shopWithReadings(database);
    run(database, place, tampering);
    try (Book book = Book.open(place, TestBook.visit())) {
      assertEquals(
          List.of(sentence),
          Verification.of(book, null).faults().stream().map(Sentences.english()::say).toList());
    }
  }

  private static void run(TestBook database, BookAddress place, String... statements)
      throws SQLException {
    try (Connection connection = database.raw(place);
        Statement statement = connection.createStatement()) {
      for (String text : statements) {
        statement.execute(text);
      }
    }
  }
}
