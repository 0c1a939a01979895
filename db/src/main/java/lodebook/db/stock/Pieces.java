package lodebook.db.stock;

import static lodebook.db.tables.Tables.CELL_CONTENT;
import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.LIVE_PLACEMENT;
import static lodebook.db.tables.Tables.PERSON;
import static lodebook.db.tables.Tables.PIECE;
import static lodebook.db.tables.Tables.PIECE_READING;
import static lodebook.db.tables.Tables.PIECE_STATE;
import static lodebook.db.tables.Tables.PLACEMENT;
import static lodebook.db.tables.Tables.PLAN;
import static lodebook.db.tables.Tables.RESERVED_PIECE;

import java.util.List;
import java.util.Map;
import lodebook.assembly.magnet.Strength;
import lodebook.db.book.Book;
import lodebook.db.code.Code;
import lodebook.db.code.CodeKind;
import lodebook.db.code.Codes;
import lodebook.db.meters.Meter;
import lodebook.db.meters.Meters;
import lodebook.db.refusal.Refusal;
import lodebook.db.tables.tables.records.PieceRecord;
import org.jooq.Condition;
import org.jooq.DSLContext;
import org.jooq.Record;
import org.jspecify.annotations.Nullable;

/// Looking at single pieces.
public final class Pieces {
  private final Book book;

  /// The pieces of a book.
  public Pieces(Book book) {
    this.book = book;
  }

  /// All numbered pieces of a lot, by number.
  public List<Piece> list(String lot) {
    return book.read(
        sql -> {
          Code code = Codes.require(sql, lot, CodeKind.LOT);
          return fetch(sql, PIECE.LOT_ID.eq(code.id()));
        });
  }

  /// One piece, as `LOT/NUMBER` names it; an unknown one is refused.
  public Piece show(PieceName name) {
    return book.read(sql -> fetch(sql, PIECE.ID.eq(require(sql, name).getId())).getFirst());
  }

  /// The readings of a piece, first taken in first.
  public List<PieceReading> readings(PieceName name) {
    return book.read(
        sql -> {
          long id = require(sql, name).getId();
          Map<Long, Meter> meters = Meters.all(sql);
          return sql.select(PIECE_READING.asterisk(), PERSON.INITIALS)
              .from(PIECE_READING)
              .join(PERSON)
              .on(PERSON.ID.eq(PIECE_READING.PERSON_ID))
              .where(PIECE_READING.PIECE_ID.eq(id))
              .orderBy(PIECE_READING.ID)
              .fetch(r -> reading(r, meters));
        });
  }

  /// What was decided about a piece, first decision first.
  public List<StateChange> decisions(PieceName name) {
    return book.read(
        sql ->
            sql.select(
                    PIECE_STATE.STATE,
                    PIECE_STATE.WHY,
                    PERSON.INITIALS,
                    PIECE_STATE.STATED_AT,
                    PIECE_STATE.RECORDED_AT)
                .from(PIECE_STATE)
                .join(PERSON)
                .on(PERSON.ID.eq(PIECE_STATE.PERSON_ID))
                .where(PIECE_STATE.PIECE_ID.eq(require(sql, name).getId()))
                .orderBy(PIECE_STATE.HISTORY_SEQUENCE)
                .fetch(
                    r ->
                        new StateChange(
                            r.value1(), r.value2(), r.value3(), r.value4(), r.value5())));
  }

  /// The row of a piece, inside a transaction; unknown lots and pieces are refused.
  public static PieceRecord require(DSLContext sql, PieceName name) {
    Code lot = Codes.require(sql, name.lot(), CodeKind.LOT);
    return sql.selectFrom(PIECE)
        .where(PIECE.LOT_ID.eq(lot.id()))
        .and(PIECE.NUMBER.eq(name.number()))
        .fetchOptional()
        .orElseThrow(
            () ->
                Refusal.refused("piece.unknown", new PieceName(lot.shown(), name.number()))
                    .remedy("lodebook piece list " + lot.shown()));
  }

  private static List<Piece> fetch(DSLContext sql, Condition which) {
    var lot = CODE.as("lot_code");
    var tray = CODE.as("tray_code");
    var rotor = CODE.as("rotor_code");
    var planned = CODE.as("planned_code");
    return sql.select(
            PIECE.asterisk(),
            lot.SHOWN.as("lot_shown"),
            tray.SHOWN.as("tray_shown"),
            CELL_CONTENT.CELL,
            rotor.SHOWN.as("rotor_shown"),
            PLACEMENT.SLOT,
            planned.SHOWN.as("planned_shown"),
            RESERVED_PIECE.SLOT.as("planned_slot"))
        .from(PIECE)
        .join(lot)
        .on(lot.ID.eq(PIECE.LOT_ID))
        .leftJoin(CELL_CONTENT)
        .on(CELL_CONTENT.PIECE_ID.eq(PIECE.ID))
        .leftJoin(tray)
        .on(tray.ID.eq(CELL_CONTENT.TRAY_ID))
        .leftJoin(LIVE_PLACEMENT)
        .on(LIVE_PLACEMENT.PIECE_ID.eq(PIECE.ID))
        .leftJoin(PLACEMENT)
        .on(PLACEMENT.ID.eq(LIVE_PLACEMENT.PLACEMENT_ID))
        .leftJoin(rotor)
        .on(rotor.ID.eq(PLACEMENT.ROTOR_ID))
        .leftJoin(RESERVED_PIECE)
        .on(RESERVED_PIECE.PIECE_ID.eq(PIECE.ID))
        .leftJoin(PLAN)
        .on(PLAN.ID.eq(RESERVED_PIECE.PLAN_ID))
        .leftJoin(planned)
        .on(planned.ID.eq(PLAN.ROTOR_ID))
        .where(which)
        .orderBy(PIECE.LOT_ID, PIECE.NUMBER)
        .fetch(Pieces::piece);
  }

  private static Piece piece(Record r) {
    Double remanence = r.get(PIECE.REMANENCE_TESLA);
    Double uncertainty = r.get(PIECE.REMANENCE_UNCERTAINTY_TESLA);
    return new Piece(
        new PieceName(r.get("lot_shown", String.class), r.get(PIECE.NUMBER)),
        PieceState.of(r.get(PIECE.STATE)),
        remanence == null || uncertainty == null ? null : new Strength(remanence, uncertainty),
        cell(r.get("tray_shown", String.class), r.get(CELL_CONTENT.CELL)),
        slot(r.get("rotor_shown", String.class), r.get(PLACEMENT.SLOT)),
        slot(r.get("planned_shown", String.class), r.get("planned_slot", Long.class)));
  }

  private static Piece.@Nullable Cell cell(@Nullable String tray, @Nullable String cell) {
    return tray == null || cell == null ? null : new Piece.Cell(tray, cell);
  }

  private static Piece.@Nullable Slot slot(@Nullable String rotor, @Nullable Long slot) {
    return rotor == null || slot == null ? null : new Piece.Slot(rotor, Math.toIntExact(slot));
  }

  private static PieceReading reading(Record r, Map<Long, Meter> meters) {
    Meter meter = meters.get(r.get(PIECE_READING.METER_ID));
    return new PieceReading(
        r.get(PIECE_READING.FLUX_TESLA),
        r.get(PIECE_READING.STANDOFF_METRES),
        r.get(PIECE_READING.TEMPERATURE_CELSIUS),
        meter == null ? null : meter.code(),
        r.get(PERSON.INITIALS),
        r.get(PIECE_READING.DOUBTED),
        r.get(PIECE_READING.STATED_AT),
        r.get(PIECE_READING.RECORDED_AT));
  }
}
