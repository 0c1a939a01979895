package lodebook.db.builds;

import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.PERSON;
import static lodebook.db.tables.Tables.PIECE;
import static lodebook.db.tables.Tables.PLACEMENT;
import static lodebook.db.tables.Tables.PLACEMENT_END;

import java.util.List;
import lodebook.assembly.layout.Facing;
import lodebook.db.builds.RecordedPlacement.Ended;
import lodebook.db.tables.tables.Code;
import org.jooq.Condition;
import org.jooq.DSLContext;
import org.jooq.Record;

/// Placements as rows, those that ended too.
public final class PlacementRows {
  private static final Code LOT_CODE = CODE.as("lot_code");
  private static final Code ROTOR_CODE = CODE.as("rotor_code");

  private PlacementRows() {}

  /// Placements that meet a condition on PLACEMENT, by slot and in the order of recording.
  public static List<RecordedPlacement> fetch(DSLContext sql, Condition condition) {
    return sql.select()
        .from(PLACEMENT)
        .join(LOT_CODE)
        .on(LOT_CODE.ID.eq(PLACEMENT.LOT_ID))
        .join(ROTOR_CODE)
        .on(ROTOR_CODE.ID.eq(PLACEMENT.ROTOR_ID))
        .join(PERSON)
        .on(PERSON.ID.eq(PLACEMENT.PERSON_ID))
        .leftJoin(PIECE)
        .on(PIECE.ID.eq(PLACEMENT.PIECE_ID))
        .leftJoin(PLACEMENT_END)
        .on(PLACEMENT_END.PLACEMENT_ID.eq(PLACEMENT.ID))
        .where(condition)
        .orderBy(PLACEMENT.SLOT, PLACEMENT.ID)
        .fetch(PlacementRows::placement);
  }

  private static RecordedPlacement placement(Record found) {
    Ended ended =
        found.get(PLACEMENT_END.PLACEMENT_ID) == null
            ? null
            : new Ended(
                found.get(PLACEMENT_END.KIND),
                found.get(PLACEMENT_END.SUPERSEDED_BY),
                found.get(PLACEMENT_END.WHY),
                found.get(PLACEMENT_END.STATED_AT),
                found.get(PLACEMENT_END.HISTORY_SEQUENCE));
    return new RecordedPlacement(
        found.get(PLACEMENT.ID),
        found.get(ROTOR_CODE.SHOWN),
        Math.toIntExact(found.get(PLACEMENT.SLOT)),
        MagnetName.shown(found.get(LOT_CODE.SHOWN), found.get(PIECE.NUMBER)),
        found.get(LOT_CODE.SHOWN),
        new Facing(found.get(PLACEMENT.FACING_DEGREES)),
        found.get(PLACEMENT.DEVIATION),
        found.get(PLACEMENT.WHY),
        found.get(PERSON.INITIALS),
        found.get(PLACEMENT.STATED_AT),
        found.get(PLACEMENT.HISTORY_SEQUENCE),
        ended);
  }
}
