package lodebook.db.units;

import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.MEMBERSHIP;
import static lodebook.db.tables.Tables.MEMBERSHIP_END;
import static lodebook.db.tables.Tables.PERSON;
import static lodebook.db.tables.Tables.UNIT;
import static lodebook.db.tables.Tables.UNIT_STATE;

import java.util.List;
import lodebook.db.layouts.Gears;
import lodebook.db.tables.tables.Code;
import org.jooq.Condition;
import org.jooq.DSLContext;

/// Units as rows.
final class UnitRows {
  private static final Code BATCH_CODE = CODE.as("batch_code");

  private UnitRows() {}

  /// Units that meet a condition on UNIT, in the order of assembly.
  static List<GearUnit> fetch(DSLContext sql, Condition condition) {
    return sql.select()
        .from(UNIT)
        .join(CODE)
        .on(CODE.ID.eq(UNIT.ID))
        .leftJoin(BATCH_CODE)
        .on(BATCH_CODE.ID.eq(UNIT.BATCH_ID))
        .where(condition)
        .orderBy(UNIT.ID)
        .fetch(
            row ->
                new GearUnit(
                    row.get(CODE.SHOWN),
                    Gears.byId(sql, row.get(UNIT.GEAR_REVISION_ID)).name(),
                    row.get(BATCH_CODE.SHOWN),
                    row.get(UNIT.STATE),
                    members(sql, row.get(UNIT.ID)),
                    events(sql, row.get(UNIT.ID)),
                    row.get(UNIT.RECORDED_AT)));
  }

  private static List<GearUnit.Member> members(DSLContext sql, long unitId) {
    return sql.select()
        .from(MEMBERSHIP)
        .join(CODE)
        .on(CODE.ID.eq(MEMBERSHIP.MEMBER_ID))
        .leftJoin(MEMBERSHIP_END)
        .on(MEMBERSHIP_END.MEMBERSHIP_ID.eq(MEMBERSHIP.ID))
        .where(MEMBERSHIP.HOLDER_ID.eq(unitId))
        .orderBy(MEMBERSHIP.ID)
        .fetch(
            row ->
                new GearUnit.Member(
                    row.get(CODE.SHOWN),
                    row.get(MEMBERSHIP.POSITION),
                    row.get(MEMBERSHIP.FROM_AT),
                    row.get(MEMBERSHIP_END.TO_AT),
                    row.get(MEMBERSHIP.WHY)));
  }

  private static List<GearUnit.Event> events(DSLContext sql, long unitId) {
    return sql.select()
        .from(UNIT_STATE)
        .join(PERSON)
        .on(PERSON.ID.eq(UNIT_STATE.PERSON_ID))
        .where(UNIT_STATE.UNIT_ID.eq(unitId))
        .orderBy(UNIT_STATE.ID)
        .fetch(
            row ->
                new GearUnit.Event(
                    row.get(UNIT_STATE.STATE),
                    row.get(UNIT_STATE.WHY),
                    row.get(PERSON.INITIALS),
                    row.get(UNIT_STATE.STATED_AT)));
  }
}
