package lodebook.db.stock;

import static lodebook.db.tables.Tables.CELL_CONTENT;
import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.PIECE;
import static lodebook.db.tables.Tables.PIECE_READING;

import java.util.Comparator;
import java.util.List;
import lodebook.assembly.magnet.Strength;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.code.Code;
import lodebook.db.code.CodeKind;
import lodebook.db.code.Codes;
import lodebook.db.rights.Permission;
import org.jooq.DSLContext;
import org.jooq.Record;
import org.jspecify.annotations.Nullable;

/// Looking at trays, and declaring one unsure.
public final class Trays {
  private final Book book;

  /// The trays of a book.
  public Trays(Book book) {
    this.book = book;
  }

  /// What lies in a cell.
  ///
  /// @param cell the cell's name
  /// @param piece the piece in it
  /// @param state the piece's state
  /// @param strength its estimate, or null while it counts as unmeasured
  public record Content(
      String cell, PieceName piece, PieceState state, @Nullable Strength strength) {}

  /// What lies in a tray, by cell: A2 before A10.
  public List<Content> show(String tray) {
    return book.read(
        sql -> {
          Code code = Codes.require(sql, tray, CodeKind.TRAY);
          return sql
              .select(CELL_CONTENT.CELL, CODE.SHOWN, PIECE.asterisk())
              .from(CELL_CONTENT)
              .join(PIECE)
              .on(PIECE.ID.eq(CELL_CONTENT.PIECE_ID))
              .join(CODE)
              .on(CODE.ID.eq(PIECE.LOT_ID))
              .where(CELL_CONTENT.TRAY_ID.eq(code.id()))
              .fetch(Trays::content)
              .stream()
              .sorted(Comparator.comparing(Content::cell, CellOrder::compare))
              .toList();
        });
  }

  /// Declares that nobody knows any more which piece lies in which cell of a tray: until they are
  /// read again, its pieces count as unmeasured.
  ///
  /// @return how many pieces that concerns
  public int unsure(Act act, String tray, String why) {
    return book.write(
        act,
        Permission.ANYTHING_ELSE,
        "tray unsure",
        writing -> {
          DSLContext sql = writing.sql();
          Code code = Codes.require(sql, tray, CodeKind.TRAY);
          var inTray =
              sql.select(CELL_CONTENT.PIECE_ID)
                  .from(CELL_CONTENT)
                  .where(CELL_CONTENT.TRAY_ID.eq(code.id()));
          sql.update(PIECE_READING)
              .set(PIECE_READING.DOUBTED, true)
              .where(PIECE_READING.PIECE_ID.in(inTray))
              .execute();
          int pieces =
              sql.update(PIECE)
                  .set(PIECE.REMANENCE_TESLA, (Double) null)
                  .set(PIECE.REMANENCE_UNCERTAINTY_TESLA, (Double) null)
                  .where(PIECE.ID.in(inTray))
                  .execute();
          writing
              .line()
              .subject(code.shown())
              .field("tray", code.shown())
              .field("pieces", pieces)
              .field("why", why);
          return pieces;
        });
  }

  private static Content content(Record r) {
    Double remanence = r.get(PIECE.REMANENCE_TESLA);
    Double uncertainty = r.get(PIECE.REMANENCE_UNCERTAINTY_TESLA);
    return new Content(
        r.get(CELL_CONTENT.CELL),
        new PieceName(r.get(CODE.SHOWN), r.get(PIECE.NUMBER)),
        PieceState.of(r.get(PIECE.STATE)),
        remanence == null || uncertainty == null ? null : new Strength(remanence, uncertainty));
  }
}
