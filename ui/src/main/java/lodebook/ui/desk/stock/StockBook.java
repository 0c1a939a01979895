package lodebook.ui.desk.stock;

import java.nio.file.Path;
import java.util.Locale;
import lodebook.assembly.magnet.Grade;
import lodebook.assembly.magnet.MagnetType;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.stock.CellMove;
import lodebook.db.stock.Grades;
import lodebook.db.stock.ImportedReadings;
import lodebook.db.stock.Lot;
import lodebook.db.stock.LotDecisions;
import lodebook.db.stock.LotImport;
import lodebook.db.stock.Lots;
import lodebook.db.stock.MagnetTypes;
import lodebook.db.stock.NewLot;
import lodebook.db.stock.PieceDecisions;
import lodebook.db.stock.PieceImport;
import lodebook.db.stock.PieceName;
import lodebook.db.stock.Pieces;
import lodebook.db.stock.ReadingRow;
import lodebook.db.stock.TrayMoves;
import lodebook.db.stock.Trays;
import lodebook.ui.desk.station.Intake;
import lodebook.ui.desk.station.Station;
import lodebook.ui.files.LotFile;
import lodebook.ui.files.MoveFile;
import lodebook.ui.files.PieceReadingFile;
import lodebook.ui.files.Rows;

/// What the stockroom does to the book; slow enough to be done away from the screen's thread.
final class StockBook {
  private final Station station;

  StockBook(Station station) {
    this.station = station;
  }

  StockPage everything() {
    return station.with(book -> new StockPage.Everything(new Lots(book).list()));
  }

  /// A lot, a piece or a tray by its number.
  StockPage open(String code) {
    return station.with(book -> read(book, code));
  }

  private static StockPage read(Book book, String code) {
    if (code.contains("/")) {
      PieceName name = PieceName.of(code);
      Pieces pieces = new Pieces(book);
      return new StockPage.OnePiece(
          pieces.show(name), pieces.readings(name), pieces.decisions(name));
    }
    boolean lot =
        new Lots(book)
            .list().stream()
                .anyMatch(
                    l -> l.code().toLowerCase(Locale.ROOT).equals(code.toLowerCase(Locale.ROOT)));
    return lot ? lot(book, code) : new StockPage.OneTray(code, new Trays(book).show(code));
  }

  private static StockPage lot(Book book, String code) {
    Lots lots = new Lots(book);
    Lot lot = lots.show(code);
    MagnetType type =
        new MagnetTypes(book)
            .list().stream()
                .filter(t -> t.code().equals(lot.received().type()))
                .findFirst()
                .orElseThrow();
    Grade grade =
        new Grades(book)
            .list().stream().filter(g -> g.name().equals(type.grade())).findFirst().orElse(null);
    return new StockPage.OneLot(
        lot, type, grade, new Pieces(book).list(code), lots.decisions(code));
  }

  /// What may be decided about a lot or a piece.
  enum Decision {
    ACCEPT,
    HOLD,
    FREE,
    REJECT,
    SCRAP
  }

  StockPage decide(String code, Decision decision, String why) {
    Act act = station.act();
    return station.with(
        book -> {
          if (code.contains("/")) {
            PieceDecisions pieces = new PieceDecisions(book);
            PieceName name = PieceName.of(code);
            switch (decision) {
              case HOLD -> pieces.hold(act, name, why);
              case SCRAP -> pieces.scrap(act, name, why);
              case FREE, ACCEPT, REJECT -> pieces.free(act, name, why);
            }
          } else {
            LotDecisions lots = new LotDecisions(book);
            switch (decision) {
              case ACCEPT -> lots.accept(act, code, why);
              case HOLD -> lots.hold(act, code, why);
              case REJECT, SCRAP -> lots.reject(act, code, why);
              case FREE -> free(lots, act, code, why);
            }
          }
          return read(book, code);
        });
  }

  private static void free(LotDecisions lots, Act act, String code, String why) {
    if (lots.free(act, code, why) == lodebook.db.stock.LotState.REJECTED) {
      throw new IllegalStateException("a freed lot is rejected: " + code);
    }
  }

  StockPage counted(String lot, int count, String why) {
    return station.with(
        book -> {
          new LotDecisions(book).count(station.act(), lot, count, why);
          return read(book, lot);
        });
  }

  StockPage unsure(String tray, String why) {
    return station.with(
        book -> {
          int pieces = new Trays(book).unsure(station.act(), tray, why);
          return pieces < 0 ? everything() : read(book, tray);
        });
  }

  /// What a file brought, with the page to show then.
  ///
  /// @param rows how many rows
  /// @param page where they are seen
  record Taken(int rows, StockPage page) {}

  Taken lots(Path file) {
    Intake intake = new Intake(station);
    Rows<NewLot> rows = LotFile.read(intake.source(file, _ -> {}));
    intake.take(
        rows,
        () -> station.change(book -> new LotImport(book).importLots(station.act(), rows.all())));
    return new Taken(rows.count(), everything());
  }

  Taken readings(String lot, Path file) {
    Intake intake = new Intake(station);
    Rows<ReadingRow> rows = PieceReadingFile.read(intake.source(file, _ -> {}), lot, false);
    intake.take(rows, () -> station.with(book -> importReadings(book, lot, rows)));
    return new Taken(rows.count(), open(lot));
  }

  private ImportedReadings importReadings(Book book, String lot, Rows<ReadingRow> rows) {
    return new PieceImport(book).importReadings(station.act(), lot, rows.all(), null);
  }

  Taken moves(String tray, Path file) {
    Intake intake = new Intake(station);
    Rows<CellMove> rows = MoveFile.read(intake.source(file, _ -> {}));
    intake.take(
        rows, () -> station.change(book -> new TrayMoves(book).move(station.act(), rows.all())));
    return new Taken(rows.count(), open(tray));
  }
}
