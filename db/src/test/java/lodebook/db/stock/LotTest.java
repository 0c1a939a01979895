package lodebook.db.stock;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import lodebook.db.TestBook;
import lodebook.db.TestShop;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.history.Histories;
import lodebook.db.history.HistoryEntry;
import lodebook.db.refusal.Refusal;
import lodebook.db.refusal.RefusalKind;
import lodebook.db.refusal.RowProblem;
import lodebook.db.refusal.RowsRefused;
import org.junit.jupiter.api.function.Executable;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class LotTest {
  @ParameterizedTest
  @EnumSource
  void aLotIsHeldAndFreedToWhatItWas(TestBook database) {
    try (Book book = Book.open(database.newShop(), TestBook.visit())) {
      Lots lots = new Lots(book);
      LotDecisions decide = new LotDecisions(book);
      new LotImport(book).importLots(TestShop.BENCH, List.of(TestShop.lot("L-2", 10)));
      assertEquals(
          new Lot(TestShop.lot("L-2", 10), LotState.AWAITING, 0, 0, 0, 0), lots.show("l-2"));

      decide.hold(TestShop.BENCH, "L-2", "smells");
      assertRefused(
          "lot L-2 is on hold already",
          "lodebook lot free L-2 --why TEXT",
          () -> decide.accept(TestShop.LEAD, "L-2", "x"));
      assertRefused(
          "BE is bench and may not do \"lot free\"; it needs inspector or lead",
          "lodebook person list",
          () -> decide.free(TestShop.BENCH, "L-2", "x"));
      assertEquals(LotState.AWAITING, decide.free(Act.by("IN"), "L-2", "washed"));
      decide.accept(Act.by("IN"), "L-2", "fine");
      assertRefused(
          "lot L-2 is accepted already",
          "lodebook lot show L-2",
          () -> decide.accept(TestShop.LEAD, "L-2", "x"));
      decide.reject(Act.by("IN"), "L-2", "cracks");
      assertEquals(
          List.of(
              "held by BE: smells",
              "awaiting by IN: washed",
              "accepted by IN: fine",
              "rejected by IN: cracks"),
          lots.decisions("L-2").stream()
              .map(c -> c.state() + " by " + c.by() + ": " + c.why())
              .toList());
      assertEquals(
          List.of("lot import", "lot hold", "lot free", "lot accept", "lot reject"),
          new Histories(book).list("L-2").stream().map(HistoryEntry::operation).toList());
    }
  }

  @ParameterizedTest
  @EnumSource
  void aFileOfLotsIsRefusedWithAllItsFaults(TestBook database) {
    try (Book book = Book.open(database.newShop(), TestBook.visit())) {
      NewLot unknownType =
          new NewLot("L-3", "BLK-9", "S", "", TestShop.lot("L-3", 1).received(), 5, "", null, "");
      RowsRefused refused =
          assertThrows(
              RowsRefused.class,
              () ->
                  new LotImport(book)
                      .importLots(
                          TestShop.LEAD,
                          List.of(
                              TestShop.lot("gm-1", 5),
                              unknownType,
                              TestShop.lot("123", 0),
                              TestShop.lot("l-3", 1))));
      assertEquals(
          List.of(
              "0 lot: GM-1 is taken already: it is a meter",
              "1 type: there is no magnet type BLK-9",
              "2 lot: \"123\" cannot be a number of the shop: 1 to 40 letters, digits, \".\","
                  + " \"_\", \"-\", not digits alone",
              "2 count: a lot has 1 piece or more, not 0",
              "3 lot: the file names lot l-3 twice"),
          refused.problems().stream().map(LotTest::text).toList());
      assertEquals("5 rows are refused", refused.getMessage());
      assertEquals(RefusalKind.WRONG_INPUT, refused.kind());
      assertEquals(List.of("L-1"), new Lots(book).list().stream().map(Lot::code).toList());
    }
  }

  @ParameterizedTest
  @EnumSource
  void aLotCannotHaveFewerPiecesThanHaveANumber(TestBook database) {
    try (Book book = Book.open(database.newShop(), TestBook.visit())) {
      new PieceImport(book, PieceImportTest.HALF_A_TESLA_MORE)
          .importReadings(
              TestShop.BENCH,
              "L-1",
              List.of(PieceImportTest.row(1, "A1"), PieceImportTest.row(2, "A2")),
              null);
      LotDecisions decide = new LotDecisions(book);
      assertRefused(
          "lot L-1 cannot have 1 piece: 0 are placed or scrapped and 2 have a number",
          "lodebook piece list L-1",
          () -> decide.count(TestShop.BENCH, "L-1", 1, "recounted"));
      decide.count(TestShop.BENCH, "L-1", 2, "recounted");
      assertEquals(2, new Lots(book).show("L-1").received().count());
    }
  }

  static String text(RowProblem problem) {
    return problem.row() + " " + problem.column() + ": " + problem.refusal().getMessage();
  }

  static void assertRefused(String sentence, String remedy, Executable deed) {
    Refusal refusal = assertThrows(Refusal.class, deed);
    assertEquals(sentence, refusal.getMessage());
    assertEquals(remedy, refusal.remedy());
  }
}
