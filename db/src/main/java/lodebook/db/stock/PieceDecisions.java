package lodebook.db.stock;

import static lodebook.db.tables.Tables.CELL_CONTENT;
import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.LIVE_PLACEMENT;
import static lodebook.db.tables.Tables.LIVE_SLOT;
import static lodebook.db.tables.Tables.LOT;
import static lodebook.db.tables.Tables.PIECE_STATE;
import static lodebook.db.tables.Tables.PLACEMENT;
import static lodebook.db.tables.Tables.PLACEMENT_END;
import static lodebook.db.tables.Tables.RESERVED_PIECE;

import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.Writing;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import lodebook.db.tables.tables.records.PieceRecord;
import lodebook.db.tables.tables.records.PlacementRecord;
import org.jooq.DSLContext;

/// Deciding about single pieces: holding, freeing, scrapping.
public final class PieceDecisions {
  private final Book book;

  /// Deciding about the pieces of a book.
  public PieceDecisions(Book book) {
    this.book = book;
  }

  /// Puts a piece aside: it is neither planned nor placed until it is freed.
  public void hold(Act act, PieceName piece, String why) {
    book.run(
        act,
        Permission.ANYTHING_ELSE,
        "piece hold",
        writing -> {
          PieceRecord row = find(writing, piece);
          refuseIf(row, piece, PieceState.HELD, "free " + piece + " --why TEXT");
          standsBeforeHold(writing.sql(), row.getId(), true);
          change(writing, row, piece, PieceState.HELD, why);
        });
  }

  /// Ends a hold.
  public void free(Act act, PieceName piece, String why) {
    book.run(
        act,
        Permission.INSPECT,
        "piece free",
        writing -> {
          PieceRecord row = find(writing, piece);
          if (!row.getState().equals(PieceState.HELD.word())) {
            throw Refusal.refused("piece.not-held", piece).remedy("lodebook piece show " + piece);
          }
          change(writing, row, piece, PieceState.USABLE, why);
          standsBeforeHold(writing.sql(), row.getId(), false);
        });
  }

  /// Says that a piece is gone: out of its cell, its plan and its slot.
  public void scrap(Act act, PieceName piece, String why) {
    book.run(
        act,
        Permission.ANYTHING_ELSE,
        "piece scrap",
        writing -> {
          PieceRecord row = find(writing, piece);
          DSLContext sql = writing.sql();
          sql.deleteFrom(CELL_CONTENT).where(CELL_CONTENT.PIECE_ID.eq(row.getId())).execute();
          sql.deleteFrom(RESERVED_PIECE).where(RESERVED_PIECE.PIECE_ID.eq(row.getId())).execute();
          takeOut(writing, row, why);
          sql.update(LOT)
              .set(LOT.SCRAPPED_COUNT, LOT.SCRAPPED_COUNT.plus(1))
              .where(LOT.ID.eq(row.getLotId()))
              .execute();
          change(writing, row, piece, PieceState.SCRAPPED, why);
        });
  }

  private static void takeOut(Writing writing, PieceRecord piece, String why) {
    DSLContext sql = writing.sql();
    PlacementRecord placement =
        sql.select(PLACEMENT.fields())
            .from(PLACEMENT)
            .join(LIVE_PLACEMENT)
            .on(LIVE_PLACEMENT.PLACEMENT_ID.eq(PLACEMENT.ID))
            .where(LIVE_PLACEMENT.PIECE_ID.eq(piece.getId()))
            .fetchOneInto(PLACEMENT);
    if (placement == null) {
      return;
    }
    sql.deleteFrom(LIVE_PLACEMENT).where(LIVE_PLACEMENT.PIECE_ID.eq(piece.getId())).execute();
    sql.deleteFrom(LIVE_SLOT).where(LIVE_SLOT.PLACEMENT_ID.eq(placement.getId())).execute();
    sql.insertInto(PLACEMENT_END)
        .set(PLACEMENT_END.PLACEMENT_ID, placement.getId())
        .set(PLACEMENT_END.KIND, "scrapped")
        .set(PLACEMENT_END.WHY, why)
        .set(PLACEMENT_END.PERSON_ID, writing.person().id())
        .set(PLACEMENT_END.STATED_AT, writing.statedAt())
        .set(PLACEMENT_END.RECORDED_AT, writing.recordedAt())
        .set(PLACEMENT_END.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    sql.update(LOT)
        .set(LOT.PLACED_COUNT, LOT.PLACED_COUNT.minus(1))
        .where(LOT.ID.eq(piece.getLotId()))
        .execute();
    String rotor =
        sql.select(CODE.SHOWN)
            .from(CODE)
            .where(CODE.ID.eq(placement.getRotorId()))
            .fetchSingle()
            .value1();
    writing.line().subject(rotor).now("slot", rotor + "/" + placement.getSlot(), "");
  }

  private static PieceRecord find(Writing writing, PieceName piece) {
    PieceRecord row = Pieces.require(writing.sql(), piece);
    refuseIf(row, piece, PieceState.SCRAPPED, "show " + piece);
    return row;
  }

  private static void refuseIf(PieceRecord row, PieceName piece, PieceState state, String command) {
    if (row.getState().equals(state.word())) {
      throw Refusal.refused("piece." + state.word(), piece).remedy("lodebook piece " + command);
    }
  }

  private static void change(
      Writing writing, PieceRecord row, PieceName piece, PieceState to, String why) {
    row.setState(to.word());
    row.setClear(to == PieceState.USABLE);
    row.store();
    writing
        .sql()
        .insertInto(PIECE_STATE)
        .set(PIECE_STATE.ID, writing.newId())
        .set(PIECE_STATE.PIECE_ID, row.getId())
        .set(PIECE_STATE.STATE, to.word())
        .set(PIECE_STATE.WHY, why)
        .set(PIECE_STATE.PERSON_ID, writing.person().id())
        .set(PIECE_STATE.STATED_AT, writing.statedAt())
        .set(PIECE_STATE.RECORDED_AT, writing.recordedAt())
        .set(PIECE_STATE.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    String lot =
        writing
            .sql()
            .select(CODE.SHOWN)
            .from(CODE)
            .where(CODE.ID.eq(row.getLotId()))
            .fetchSingle()
            .value1();
    PieceName shown = new PieceName(lot, piece.number());
    writing
        .line()
        .subject(lot)
        .subject(shown.toString())
        .field("piece", shown)
        .field("why", why)
        .now("piece", shown.toString(), to.word());
  }

  private static void standsBeforeHold(DSLContext sql, long piece, boolean stands) {
    sql.update(LIVE_PLACEMENT)
        .set(LIVE_PLACEMENT.STOOD_BEFORE_HOLD, stands)
        .where(LIVE_PLACEMENT.PIECE_ID.eq(piece))
        .execute();
  }
}
