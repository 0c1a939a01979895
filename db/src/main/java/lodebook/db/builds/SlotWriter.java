package lodebook.db.builds;

import static lodebook.db.tables.Tables.CELL_CONTENT;
import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.LIVE_PLACEMENT;
import static lodebook.db.tables.Tables.LIVE_SLOT;
import static lodebook.db.tables.Tables.LOT;
import static lodebook.db.tables.Tables.PERSON;
import static lodebook.db.tables.Tables.PIECE;
import static lodebook.db.tables.Tables.PIECE_STATE;
import static lodebook.db.tables.Tables.PLACEMENT;
import static lodebook.db.tables.Tables.PLACEMENT_END;
import static lodebook.db.tables.Tables.RESERVED_PIECE;

import java.util.LinkedHashMap;
import java.util.Map;
import lodebook.db.book.Writing;
import lodebook.db.builds.Putting.Standing;
import org.jooq.DSLContext;
import org.jspecify.annotations.Nullable;

/// Writes what changes in a rotor's slots, with everything that follows from it.
final class SlotWriter {
  private SlotWriter() {}

  /// What stands in a rotor's slots now, by slot.
  static Map<Integer, Standing> standing(DSLContext sql, long rotorId) {
    Map<Integer, Standing> standing = new LinkedHashMap<>();
    sql.select()
        .from(LIVE_SLOT)
        .join(PLACEMENT)
        .on(PLACEMENT.ID.eq(LIVE_SLOT.PLACEMENT_ID))
        .join(CODE)
        .on(CODE.ID.eq(PLACEMENT.LOT_ID))
        .join(PERSON)
        .on(PERSON.ID.eq(PLACEMENT.PERSON_ID))
        .leftJoin(PIECE)
        .on(PIECE.ID.eq(PLACEMENT.PIECE_ID))
        .where(LIVE_SLOT.ROTOR_ID.eq(rotorId))
        .orderBy(LIVE_SLOT.SLOT)
        .forEach(
            row ->
                standing.put(
                    Math.toIntExact(row.get(LIVE_SLOT.SLOT)),
                    new Standing(
                        row.get(PLACEMENT.ID),
                        row.get(PLACEMENT.LOT_ID),
                        row.get(PLACEMENT.PIECE_ID),
                        MagnetName.shown(row.get(CODE.SHOWN), row.get(PIECE.NUMBER)),
                        row.get(PERSON.ID),
                        row.get(PERSON.INITIALS))));
    return standing;
  }

  /// Takes what stands in a slot out of the tables of what stands now; the placement itself stays.
  static void clear(Writing writing, Standing standing) {
    DSLContext sql = writing.sql();
    sql.deleteFrom(LIVE_PLACEMENT)
        .where(LIVE_PLACEMENT.PLACEMENT_ID.eq(standing.placementId()))
        .execute();
    sql.deleteFrom(LIVE_SLOT).where(LIVE_SLOT.PLACEMENT_ID.eq(standing.placementId())).execute();
    sql.update(LOT)
        .set(LOT.PLACED_COUNT, LOT.PLACED_COUNT.minus(1))
        .where(LOT.ID.eq(standing.lotId()))
        .execute();
  }

  /// Records how a placement ended.
  static void end(Writing writing, Standing standing, String kind, @Nullable Long by, String why) {
    writing
        .sql()
        .insertInto(PLACEMENT_END)
        .set(PLACEMENT_END.PLACEMENT_ID, standing.placementId())
        .set(PLACEMENT_END.KIND, kind)
        .set(PLACEMENT_END.SUPERSEDED_BY, by)
        .set(PLACEMENT_END.WHY, why)
        .set(PLACEMENT_END.PERSON_ID, writing.person().id())
        .set(PLACEMENT_END.STATED_AT, writing.statedAt())
        .set(PLACEMENT_END.RECORDED_AT, writing.recordedAt())
        .set(PLACEMENT_END.HISTORY_SEQUENCE, writing.sequence())
        .execute();
  }

  /// Puts a magnet into an empty slot: its cell is empty then, and no plan keeps it any more.
  ///
  /// @return the placement
  static long put(Writing writing, long rotorId, String rotor, Putting putting, String why) {
    DSLContext sql = writing.sql();
    long id = writing.newId();
    sql.insertInto(PLACEMENT)
        .set(PLACEMENT.ID, id)
        .set(PLACEMENT.ROTOR_ID, rotorId)
        .set(PLACEMENT.SLOT, (long) putting.slot())
        .set(PLACEMENT.LOT_ID, putting.lotId())
        .set(PLACEMENT.PIECE_ID, putting.pieceId())
        .set(PLACEMENT.FACING_DEGREES, putting.facing().degrees())
        .set(PLACEMENT.DEVIATION, putting.deviation())
        .set(PLACEMENT.WHY, why)
        .set(PLACEMENT.PERSON_ID, putting.personId())
        .set(PLACEMENT.STATED_AT, putting.at())
        .set(PLACEMENT.RECORDED_AT, writing.recordedAt())
        .set(PLACEMENT.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    boolean lotClear =
        sql.select(LOT.CLEAR).from(LOT).where(LOT.ID.eq(putting.lotId())).fetchSingle().value1();
    sql.insertInto(LIVE_SLOT)
        .set(LIVE_SLOT.ROTOR_ID, rotorId)
        .set(LIVE_SLOT.SLOT, (long) putting.slot())
        .set(LIVE_SLOT.PLACEMENT_ID, id)
        .set(LIVE_SLOT.LOT_ID, putting.lotId())
        .set(LIVE_SLOT.LOT_CLEAR, lotClear)
        .set(LIVE_SLOT.STOOD_BEFORE_HOLD, !lotClear)
        .execute();
    sql.update(LOT)
        .set(LOT.PLACED_COUNT, LOT.PLACED_COUNT.plus(1))
        .where(LOT.ID.eq(putting.lotId()))
        .execute();
    if (putting.pieceId() != null) {
      putPiece(sql, putting.pieceId(), id);
    }
    writing
        .line()
        .subject(putting.magnet())
        .now(
            "slot",
            rotor + "/" + putting.slot(),
            putting.magnet() + " " + putting.facing().degrees());
    return id;
  }

  private static void putPiece(DSLContext sql, long pieceId, long placementId) {
    boolean clear =
        sql.select(PIECE.CLEAR).from(PIECE).where(PIECE.ID.eq(pieceId)).fetchSingle().value1();
    sql.insertInto(LIVE_PLACEMENT)
        .set(LIVE_PLACEMENT.PIECE_ID, pieceId)
        .set(LIVE_PLACEMENT.PLACEMENT_ID, placementId)
        .set(LIVE_PLACEMENT.PIECE_CLEAR, clear)
        .set(LIVE_PLACEMENT.STOOD_BEFORE_HOLD, !clear)
        .execute();
    sql.deleteFrom(CELL_CONTENT).where(CELL_CONTENT.PIECE_ID.eq(pieceId)).execute();
    sql.deleteFrom(RESERVED_PIECE).where(RESERVED_PIECE.PIECE_ID.eq(pieceId)).execute();
  }

  /// Scraps everything that stands in a rotor.
  static void scrapAll(Writing writing, long rotorId, String why) {
    DSLContext sql = writing.sql();
    String rotor =
        sql.select(CODE.SHOWN).from(CODE).where(CODE.ID.eq(rotorId)).fetchSingle().value1();
    standing(sql, rotorId)
        .forEach(
            (slot, standing) -> {
              clear(writing, standing);
              end(writing, standing, "scrapped", null, why);
              sql.update(LOT)
                  .set(LOT.SCRAPPED_COUNT, LOT.SCRAPPED_COUNT.plus(1))
                  .where(LOT.ID.eq(standing.lotId()))
                  .execute();
              if (standing.pieceId() != null) {
                scrapPiece(writing, standing.pieceId(), standing.magnet(), why);
              }
              writing.line().subject(standing.magnet()).now("slot", rotor + "/" + slot, "");
            });
  }

  private static void scrapPiece(Writing writing, long pieceId, String piece, String why) {
    writing
        .sql()
        .update(PIECE)
        .set(PIECE.STATE, "scrapped")
        .set(PIECE.CLEAR, false)
        .where(PIECE.ID.eq(pieceId))
        .execute();
    writing
        .sql()
        .insertInto(PIECE_STATE)
        .set(PIECE_STATE.ID, writing.newId())
        .set(PIECE_STATE.PIECE_ID, pieceId)
        .set(PIECE_STATE.STATE, "scrapped")
        .set(PIECE_STATE.WHY, why)
        .set(PIECE_STATE.PERSON_ID, writing.person().id())
        .set(PIECE_STATE.STATED_AT, writing.statedAt())
        .set(PIECE_STATE.RECORDED_AT, writing.recordedAt())
        .set(PIECE_STATE.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    writing.line().now("piece", piece, "scrapped");
  }
}
