package lodebook.db.stock;

import static lodebook.db.tables.Tables.CELL_CONTENT;
import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.LIVE_PLACEMENT;
import static lodebook.db.tables.Tables.LOT;
import static lodebook.db.tables.Tables.PERSON;
import static lodebook.db.tables.Tables.PIECE;
import static lodebook.db.tables.Tables.PIECE_READING;
import static lodebook.db.tables.Tables.PLACEMENT;

import java.util.Collection;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import lodebook.db.code.Code;
import lodebook.db.code.CodeKind;
import lodebook.db.code.CodeText;
import lodebook.db.code.Codes;
import lodebook.db.meters.Meter;
import lodebook.db.meters.Meters;
import lodebook.db.tables.tables.records.LotRecord;
import org.jooq.DSLContext;

/// What the book knows about a lot, looked up once before many rows are checked against it.
///
/// @param code the lot's number
/// @param lot the lot's row
/// @param pieces its pieces by number
/// @param trays what the rows' trays are, by folded number; missing ones are new
/// @param inCells which piece lies in which cell of these trays
/// @param meters instruments by folded number
/// @param meterIds their ids
/// @param people ids of those who sign, by folded initials
/// @param repeats how often each reading is in the book, by piece id and fingerprint
record LotStock(
    Code code,
    LotRecord lot,
    Map<Long, KnownPiece> pieces,
    Map<String, Code> trays,
    Map<Cell, PieceName> inCells,
    Map<String, Meter> meters,
    Map<String, Long> meterIds,
    Map<String, Long> people,
    Map<String, Long> repeats) {

  /// A cell of a tray.
  record Cell(String foldedTray, String cell) {
    static Cell of(String tray, String cell) {
      return new Cell(CodeText.fold(tray), cell.strip());
    }
  }

  /// A piece of the lot: `lies` is `TRAY CELL` or empty, `stands` is `ROTOR slot N` or empty.
  record KnownPiece(long id, PieceState state, String lies, String stands) {}

  static String repeatOf(long piece, String fingerprint) {
    return piece + ":" + fingerprint;
  }

  static LotStock of(DSLContext sql, String lotCode, List<ReadingRow> rows) {
    Code code = Codes.require(sql, lotCode, CodeKind.LOT);
    LotRecord lot = sql.selectFrom(LOT).where(LOT.ID.eq(code.id())).fetchSingle();
    List<String> named =
        rows.stream().map(ReadingRow::tray).filter(Objects::nonNull).distinct().toList();
    Map<String, Code> trays = Codes.findAll(sql, named);
    Map<Long, Meter> byId = Meters.all(sql);
    Map<String, Meter> meters = new HashMap<>();
    Map<String, Long> meterIds = new HashMap<>();
    byId.forEach(
        (id, meter) -> {
          meters.put(CodeText.fold(meter.code()), meter);
          meterIds.put(CodeText.fold(meter.code()), id);
        });
    Map<String, Long> people = new HashMap<>();
    sql.select(PERSON.FOLDED, PERSON.ID)
        .from(PERSON)
        .forEach(r -> people.put(r.value1(), r.value2()));
    return new LotStock(
        code,
        lot,
        pieces(sql, code),
        trays,
        contents(sql, trays.values()),
        meters,
        meterIds,
        people,
        repeats(sql, code));
  }

  private static Map<Long, KnownPiece> pieces(DSLContext sql, Code lot) {
    Map<Long, String> stands = new HashMap<>();
    sql.select(PLACEMENT.PIECE_ID, CODE.SHOWN, PLACEMENT.SLOT)
        .from(LIVE_PLACEMENT)
        .join(PLACEMENT)
        .on(PLACEMENT.ID.eq(LIVE_PLACEMENT.PLACEMENT_ID))
        .join(CODE)
        .on(CODE.ID.eq(PLACEMENT.ROTOR_ID))
        .where(PLACEMENT.LOT_ID.eq(lot.id()))
        .forEach(r -> stands.put(r.value1(), r.value2() + " slot " + r.value3()));
    Map<Long, KnownPiece> pieces = new HashMap<>();
    sql.select(PIECE.NUMBER, PIECE.ID, PIECE.STATE, CODE.SHOWN, CELL_CONTENT.CELL)
        .from(PIECE)
        .leftJoin(CELL_CONTENT)
        .on(CELL_CONTENT.PIECE_ID.eq(PIECE.ID))
        .leftJoin(CODE)
        .on(CODE.ID.eq(CELL_CONTENT.TRAY_ID))
        .where(PIECE.LOT_ID.eq(lot.id()))
        .forEach(
            r ->
                pieces.put(
                    r.value1(),
                    new KnownPiece(
                        r.value2(),
                        PieceState.of(r.value3()),
                        r.value4() == null ? "" : r.value4() + " " + r.value5(),
                        stands.getOrDefault(r.value2(), ""))));
    return pieces;
  }

  private static Map<Cell, PieceName> contents(DSLContext sql, Collection<Code> trays) {
    Map<Long, String> folded = new HashMap<>();
    trays.forEach(t -> folded.put(t.id(), CodeText.fold(t.shown())));
    Map<Cell, PieceName> contents = new HashMap<>();
    sql.select(CELL_CONTENT.TRAY_ID, CELL_CONTENT.CELL, CODE.SHOWN, PIECE.NUMBER)
        .from(CELL_CONTENT)
        .join(PIECE)
        .on(PIECE.ID.eq(CELL_CONTENT.PIECE_ID))
        .join(CODE)
        .on(CODE.ID.eq(PIECE.LOT_ID))
        .where(CELL_CONTENT.TRAY_ID.in(folded.keySet()))
        .forEach(
            r ->
                contents.put(
                    new Cell(folded.getOrDefault(r.value1(), ""), r.value2()),
                    new PieceName(r.value3(), r.value4())));
    return contents;
  }

  private static Map<String, Long> repeats(DSLContext sql, Code lot) {
    Map<String, Long> repeats = new HashMap<>();
    sql.select(PIECE_READING.PIECE_ID, PIECE_READING.FINGERPRINT, PIECE_READING.REPEAT_NUMBER)
        .from(PIECE_READING)
        .join(PIECE)
        .on(PIECE.ID.eq(PIECE_READING.PIECE_ID))
        .where(PIECE.LOT_ID.eq(lot.id()))
        .forEach(r -> repeats.merge(repeatOf(r.value1(), r.value2()), r.value3() + 1, Math::max));
    return repeats;
  }
}
