package lodebook.db.book;

import static lodebook.db.tables.Tables.CHAIN_HEAD;
import static lodebook.db.tables.Tables.HISTORY;
import static lodebook.db.tables.Tables.SETTING;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import lodebook.db.TestBook;
import lodebook.db.chain.LineText;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class BookTest {
  @ParameterizedTest
  @EnumSource
  void anOperationIsOneLineOfHistoryWhoseHashFollowsFromTheLineBefore(TestBook database) {
    BookAddress place = database.newPlace();
    Book.create(place, TestBook.visit(), writing -> writing.line().field("first", "line"));

    try (Book book = Book.open(place, TestBook.visit())) {
      String text =
          book.read(
              sql ->
                  sql.select(HISTORY.CONTENT)
                      .from(HISTORY)
                      .where(HISTORY.SEQUENCE.eq(1L))
                      .fetchSingle()
                      .value1());
      assertEquals(
          """
          1
          2 4:line1:1
          2 6:stated20:2026-05-04T08:00:01Z
          2 8:recorded20:2026-05-04T08:00:01Z
          2 3:who0:
          2 7:station7:BENCH-1
          2 9:operation11:book create
          3 5:field5:first4:line
          """,
          text);
      assertEquals(
          LineText.hash(LineText.START, text),
          book.read(sql -> sql.select(CHAIN_HEAD.HASH).from(CHAIN_HEAD).fetchSingle().value1()));
    }
  }

  @ParameterizedTest
  @EnumSource
  void aFailedOperationLeavesNothing(TestBook database) {
    BookAddress place = database.newPlace();
    Book.create(place, TestBook.visit(), writing -> {});
    try (Book book = Book.open(place, TestBook.visit())) {
      assertThrows(
          IllegalStateException.class,
          () ->
              book.run(
                  Act.by(null),
                  Permission.ADD_PERSON,
                  "test",
                  writing -> {
                    writing
                        .sql()
                        .insertInto(SETTING, SETTING.NAME, SETTING.CONTENT)
                        .values("a", "b")
                        .execute();
                    throw new IllegalStateException("stop");
                  }));
      assertEquals(0, book.<Integer>read(sql -> sql.fetchCount(SETTING)));
      assertEquals(1, book.<Integer>read(sql -> sql.fetchCount(HISTORY)));
    }
  }

  @ParameterizedTest
  @EnumSource
  void nobodySignsIsRefused(TestBook database) {
    BookAddress place = database.newPlace();
    Book.create(place, TestBook.visit(), writing -> {});
    try (Book book = Book.open(place, TestBook.visit())) {
      Refusal refusal =
          assertThrows(
              Refusal.class, () -> book.run(Act.by("ab"), Permission.LEAD, "test", writing -> {}));
      assertEquals("nobody here signs as ab", refusal.getMessage());
      assertEquals("lodebook person list", refusal.remedy());
    }
  }
}
