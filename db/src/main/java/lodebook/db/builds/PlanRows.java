package lodebook.db.builds;

import static lodebook.db.tables.Tables.CELL_CONTENT;
import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.LIVE_PLACEMENT;
import static lodebook.db.tables.Tables.LIVE_PLAN;
import static lodebook.db.tables.Tables.LIVE_SLOT;
import static lodebook.db.tables.Tables.LOT;
import static lodebook.db.tables.Tables.PERSON;
import static lodebook.db.tables.Tables.PIECE;
import static lodebook.db.tables.Tables.PLAN;
import static lodebook.db.tables.Tables.PLANNED_PLACEMENT;

import java.util.List;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.magnet.Strength;
import lodebook.db.tables.tables.Code;
import org.jooq.DSLContext;
import org.jooq.Record;
import org.jspecify.annotations.Nullable;

/// The plan that counts for a rotor, as rows.
final class PlanRows {
  private static final Code TRAY_CODE = CODE.as("tray_code");

  private PlanRows() {}

  /// The plan of a rotor, or null.
  static @Nullable Plan fetch(DSLContext sql, long rotorId, String rotor) {
    return sql.select()
        .from(LIVE_PLAN)
        .join(PLAN)
        .on(PLAN.ID.eq(LIVE_PLAN.PLAN_ID))
        .join(PERSON)
        .on(PERSON.ID.eq(PLAN.PERSON_ID))
        .where(LIVE_PLAN.ROTOR_ID.eq(rotorId))
        .fetchOne(
            row ->
                new Plan(
                    rotor,
                    row.get(PLAN.SEED),
                    row.get(PLAN.SETTINGS),
                    row.get(PLAN.STOCK_SEQUENCE),
                    row.get(PLAN.PROGRAM_VERSION),
                    row.get(PLAN.UNWANTED_HARMONICS),
                    row.get(PLAN.LOWER_BOUND),
                    row.get(PLAN.AS_THEY_COME),
                    row.get(PLAN.WORKING_AMPLITUDE_TESLA),
                    row.get(PERSON.INITIALS),
                    row.get(PLAN.STATED_AT),
                    slots(sql, row.get(PLAN.ID), rotorId)));
  }

  private static List<PlannedSlot> slots(DSLContext sql, long planId, long rotorId) {
    LotStrengths lots = new LotStrengths(sql);
    return sql.select()
        .from(PLANNED_PLACEMENT)
        .join(LOT)
        .on(LOT.ID.eq(PLANNED_PLACEMENT.LOT_ID))
        .join(CODE)
        .on(CODE.ID.eq(LOT.ID))
        .leftJoin(PIECE)
        .on(PIECE.ID.eq(PLANNED_PLACEMENT.PIECE_ID))
        .leftJoin(CELL_CONTENT)
        .on(CELL_CONTENT.PIECE_ID.eq(PIECE.ID))
        .leftJoin(TRAY_CODE)
        .on(TRAY_CODE.ID.eq(CELL_CONTENT.TRAY_ID))
        .leftJoin(LIVE_SLOT)
        .on(LIVE_SLOT.ROTOR_ID.eq(rotorId).and(LIVE_SLOT.SLOT.eq(PLANNED_PLACEMENT.SLOT)))
        .leftJoin(LIVE_PLACEMENT)
        .on(LIVE_PLACEMENT.PIECE_ID.eq(PIECE.ID))
        .where(PLANNED_PLACEMENT.PLAN_ID.eq(planId))
        .orderBy(PLANNED_PLACEMENT.SLOT)
        .fetch(row -> slot(row, lots));
  }

  private static PlannedSlot slot(Record row, LotStrengths lots) {
    Double remanence = row.get(PIECE.REMANENCE_TESLA);
    return new PlannedSlot(
        Math.toIntExact(row.get(PLANNED_PLACEMENT.SLOT)),
        MagnetName.shown(row.get(CODE.SHOWN), row.get(PIECE.NUMBER)),
        row.get(CODE.SHOWN),
        new Facing(row.get(PLANNED_PLACEMENT.FACING_DEGREES)),
        Math.toIntExact(row.get(PLANNED_PLACEMENT.FILL_STEP)),
        row.get(PLANNED_PLACEMENT.REMARK),
        remanence == null
            ? lots.of(row.get(LOT.ID)).strength().ofOne()
            : new Strength(remanence, row.get(PIECE.REMANENCE_UNCERTAINTY_TESLA)),
        row.get(TRAY_CODE.SHOWN),
        row.get(CELL_CONTENT.CELL),
        state(row));
  }

  private static String state(Record row) {
    if (row.get(LIVE_SLOT.SLOT) != null) {
      return "placed";
    }
    if ("scrapped".equals(row.get(PIECE.STATE)) || row.get(LIVE_PLACEMENT.PIECE_ID) != null) {
      return "gone";
    }
    boolean usable = row.get(LOT.CLEAR) && !"held".equals(row.get(PIECE.STATE));
    return usable ? "planned" : "on hold";
  }
}
