package lodebook.db.stock;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Objects;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Strength;
import lodebook.db.TestBook;
import lodebook.db.TestShop;
import lodebook.db.book.Book;
import lodebook.db.history.Histories;
import lodebook.db.refusal.RowsRefused;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class PieceImportTest {
  /// Mean of the readings and half a tesla, the uncertainty a tenth of a tesla over their number.
  static final StrengthEstimator HALF_A_TESLA_MORE =
      (type, grade, readings) ->
          new Strength(
              0.5 + readings.stream().mapToDouble(TakenReading::fluxTesla).average().orElseThrow(),
              0.1 / readings.size());

  static ReadingRow row(long number, String cell) {
    return new ReadingRow(number, "T-1", cell, 0.75, 1e-3, 21.0, "GM-1", null, null);
  }

  private static ReadingRow reading(long number, double flux) {
    return new ReadingRow(number, null, null, flux, 1e-3, null, null, null, null);
  }

  @ParameterizedTest
  @EnumSource
  void piecesGetACellAReadingAndAStrength(TestBook database) {
    try (Book book = Book.open(database.newShop(), TestBook.visit())) {
      PieceImport imports = new PieceImport(book, HALF_A_TESLA_MORE);
      assertEquals(
          new ImportedReadings(3, 2, 2, 1, 1),
          imports.importReadings(
              TestShop.BENCH,
              "l-1",
              List.of(row(17, "A10"), row(2, "A2"), reading(17, 0.85)),
              null));
      Pieces pieces = new Pieces(book);
      assertEquals(
          List.of(
              new Piece(
                  new PieceName("L-1", 2),
                  PieceState.USABLE,
                  new Strength(1.25, 0.1),
                  new Piece.Cell("T-1", "A2"),
                  null,
                  null),
              new Piece(
                  new PieceName("L-1", 17),
                  PieceState.USABLE,
                  new Strength(1.3, 0.05),
                  new Piece.Cell("T-1", "A10"),
                  null,
                  null)),
          pieces.list("L-1"));
      assertEquals(
          List.of("A2 L-1/0002", "A10 L-1/0017"),
          new Trays(book).show("t-1").stream().map(c -> c.cell() + " " + c.piece()).toList());

      imports.importReadings(TestShop.BENCH, "L-1", List.of(reading(2, 0.65)), null);
      assertEquals(new Strength(1.2, 0.05), pieces.show(PieceName.of("L-1/2")).strength());
      assertEquals(2, pieces.readings(PieceName.of("L-1/0002")).size());
      assertEquals(2, new Lots(book).show("L-1").measured());
    }
  }

  @ParameterizedTest
  @EnumSource
  void theSameFileOrRowAgainIsRefusedWithoutAReason(TestBook database) {
    try (Book book = Book.open(database.newShop(), TestBook.visit())) {
      PieceImport imports = new PieceImport(book, HALF_A_TESLA_MORE);
      List<ReadingRow> rows = List.of(row(1, "A1"), row(2, "A2"));
      imports.importReadings(TestShop.BENCH, "L-1", rows, null);
      LotTest.assertRefused(
          "all readings of the file (2) are in the book already for lot L-1",
          "lodebook piece import L-1 FILE --again --why TEXT",
          () -> imports.importReadings(TestShop.BENCH, "L-1", rows, null));
      assertProblems(
          imports,
          List.of(row(3, "A3"), row(2, "A2"), row(3, "A3")),
          "1 piece: piece L-1/0002: this reading is in the book already",
          "2 piece: piece L-1/0003: the same reading stands in row 1 of the file");
      imports.importReadings(TestShop.BENCH, "L-1", rows, "read twice to be sure");
      imports.importReadings(TestShop.BENCH, "L-1", rows, "and again");
      assertEquals(3, new Pieces(book).readings(PieceName.of("L-1/1")).size());
      assertEquals(
          "again: read twice to be sure",
          new Histories(book)
              .list("L-1").stream()
                  .flatMap(e -> e.fields().stream())
                  .filter(f -> f.name().equals("again"))
                  .map(f -> f.name() + ": " + f.content())
                  .findFirst()
                  .orElseThrow());
    }
  }

  @ParameterizedTest
  @EnumSource
  void everyFaultOfAFileIsListedAndNothingIsTakenIn(TestBook database) {
    try (Book book = Book.open(database.newShop(), TestBook.visit())) {
      PieceImport imports = new PieceImport(book, HALF_A_TESLA_MORE);
      imports.importReadings(TestShop.BENCH, "L-1", List.of(row(1, "A1"), row(2, "A2")), null);
      new PieceDecisions(book).scrap(TestShop.BENCH, PieceName.of("L-1/2"), "chipped");
      int lines = new Histories(book).list(null).size();
      assertProblems(
          imports,
          List.of(
              reading(2, 0.7),
              row(3, "A1"),
              new ReadingRow(1, "T-1", "B1", 0.7, 1e-3, null, "GM-9", "ZZ", null),
              new ReadingRow(4, "GM-1", "B2", -0.7, 1e-3, null, null, null, null),
              new ReadingRow(5, "T-1", null, 0.7, -1e-3, null, null, null, null),
              new ReadingRow(6, "T-2", "C1", 0.7, 1e-3, null, null, null, null),
              new ReadingRow(7, "T-2", "C1", 0.7, 1e-3, null, null, null, null),
              new ReadingRow(0, "T 2", "C1", 0.7, 1e-3, null, null, null, null)),
          "0 piece: piece L-1/0002 is scrapped",
          "1 cell: cell T-1 A1 holds piece L-1/0001",
          "2 cell: piece L-1/0001 lies in T-1 A1, not in T-1 B1",
          "2 meter: there is no meter GM-9",
          "2 by: nobody here signs as ZZ",
          "3 value: piece L-1/0004: a reading over the north face is above 0: south face, or"
              + " the sign inverted?",
          "3 tray: GM-1 is taken already: it is a meter",
          "4 standoff_mm: piece L-1/0005: the standoff is not negative",
          "4 cell: piece L-1/0005: a tray needs a cell and a cell a tray",
          "6 cell: cell T-2 C1 would hold L-1/0006 and L-1/0007",
          "7 piece: pieces are numbered from 1, not 0",
          "7 tray: \"T 2\" cannot be a number of the shop: 1 to 40 letters, digits, \".\", \"_\","
              + " \"-\", not digits alone");
      assertEquals(lines, new Histories(book).list(null).size());
      assertEquals(2, new Pieces(book).list("L-1").size());
    }
  }

  @ParameterizedTest
  @EnumSource
  void aLotHasNoMorePiecesThanItCounts(TestBook database) {
    try (Book book = Book.open(database.newShop(), TestBook.visit())) {
      new LotImport(book).importLots(TestShop.BENCH, List.of(TestShop.lot("L-2", 1)));
      PieceImport imports = new PieceImport(book, HALF_A_TESLA_MORE);
      RowsRefused refused =
          assertThrows(
              RowsRefused.class,
              () ->
                  imports.importReadings(
                      TestShop.BENCH, "L-2", List.of(reading(8, 0.7), reading(9, 0.7)), null));
      assertEquals(
          "1 piece: L-2/0009 would be one more piece than lot L-2 has: it counts 1",
          LotTest.text(refused.problems().getFirst()));
      assertEquals(
          "lodebook lot count L-2 2 --why TEXT", refused.problems().getFirst().refusal().remedy());
    }
  }

  @ParameterizedTest
  @EnumSource
  void anUnsureTrayIsUnmeasuredUntilItIsReadAgain(TestBook database) {
    try (Book book = Book.open(database.newShop(), TestBook.visit())) {
      PieceImport imports = new PieceImport(book, HALF_A_TESLA_MORE);
      imports.importReadings(TestShop.BENCH, "L-1", List.of(row(1, "A1"), row(2, "A2")), null);
      assertEquals(2, new Trays(book).unsure(TestShop.BENCH, "T-1", "dropped"));
      assertEquals(0, new Lots(book).show("L-1").measured());
      imports.importReadings(TestShop.BENCH, "L-1", List.of(reading(1, 0.8)), null);
      assertEquals(new Strength(1.3, 0.1), new Pieces(book).show(PieceName.of("L-1/1")).strength());
      assertEquals(
          List.of(true, false),
          new Pieces(book)
              .readings(PieceName.of("L-1/1")).stream().map(PieceReading::doubted).toList());
    }
  }

  @ParameterizedTest
  @EnumSource
  void twoPiecesChangePlacesAtOnce(TestBook database) {
    try (Book book = Book.open(database.newShop(), TestBook.visit())) {
      PieceName one = PieceName.of("L-1/1");
      PieceName two = PieceName.of("L-1/2");
      new PieceImport(book, HALF_A_TESLA_MORE)
          .importReadings(
              TestShop.BENCH, "L-1", List.of(row(1, "A1"), row(2, "A2"), row(3, "A3")), null);
      TrayMoves moves = new TrayMoves(book);
      moves.move(
          TestShop.BENCH, List.of(new CellMove(one, "T-1", "A2"), new CellMove(two, "T-9", "A1")));
      assertEquals(
          List.of("A2 L-1/0001", "A3 L-1/0003"),
          new Trays(book).show("T-1").stream().map(c -> c.cell() + " " + c.piece()).toList());
      RowsRefused refused =
          assertThrows(
              RowsRefused.class,
              () ->
                  moves.move(
                      TestShop.BENCH,
                      List.of(
                          new CellMove(one, "T-1", "A3"),
                          new CellMove(PieceName.of("L-1/9"), "T-1", "A4"))));
      assertEquals(
          List.of(
              "0 cell: cell T-1 A3 holds piece L-1/0003", "1 piece: there is no piece L-1/0009"),
          refused.problems().stream().map(LotTest::text).toList());
    }
  }

  /// The block's field on its axis: checked against the closed form, B/Br at 1 mm.
  @ParameterizedTest
  @EnumSource
  void aStrengthIsTheReadingOverTheFieldOfAMagnetOfOneTesla(TestBook database) {
    try (Book book = Book.open(database.newShop(), TestBook.visit())) {
      double perRemanence = onAxis(1e-3, 4e-3, 10e-3, 4e-3);
      MagnetType block = TestShop.BLOCK;
      new MagnetTypes(book)
          .importTypes(
              TestShop.LEAD,
              List.of(
                  new MagnetType(
                      "HARD",
                      block.shape(),
                      block.thicknessMetres(),
                      block.widthMetres(),
                      block.lengthMetres(),
                      0,
                      0,
                      0,
                      "N42",
                      0.05e-3,
                      "",
                      1,
                      0)));
      NewLot lot = TestShop.lot("L-2", 5);
      new LotImport(book)
          .importLots(
              TestShop.LEAD,
              List.of(new NewLot("L-2", "HARD", "S", "", lot.received(), 5, "", null, "")));
      new PieceImport(book)
          .importReadings(
              TestShop.BENCH,
              "L-2",
              List.of(
                  new ReadingRow(
                      1, null, null, 1.3 * perRemanence, 1e-3, 20.0, "GM-1", null, null)),
              null);
      Strength strength = new Pieces(book).show(PieceName.of("L-2/1")).strength();
      assertEquals(1.3, Objects.requireNonNull(strength).remanenceTesla(), 1e-9);
      assertTrue(strength.standardUncertaintyTesla() > 0.013);
    }
  }

  private static double onAxis(double z, double width, double length, double thickness) {
    return (pole(z, width, length) - pole(z + thickness, width, length)) / Math.PI;
  }

  private static double pole(double z, double width, double length) {
    return Math.atan(
        width * length / (2 * z * Math.sqrt(4 * z * z + width * width + length * length)));
  }

  private static void assertProblems(
      PieceImport imports, List<ReadingRow> rows, String... expected) {
    RowsRefused refused =
        assertThrows(
            RowsRefused.class, () -> imports.importReadings(TestShop.BENCH, "L-1", rows, null));
    assertEquals(List.of(expected), refused.problems().stream().map(LotTest::text).toList());
  }
}
