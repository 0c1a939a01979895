package lodebook.db.layouts;

import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.GEAR_RELEASE;
import static lodebook.db.tables.Tables.GEAR_REVISION;
import static lodebook.db.tables.Tables.PERSON;

import java.util.List;
import java.util.Locale;
import lodebook.assembly.layout.GearModel;
import lodebook.assembly.layout.Member;
import lodebook.db.tables.tables.records.GearRevisionRecord;
import org.jooq.Condition;
import org.jooq.DSLContext;
import org.jooq.Record;
import org.jspecify.annotations.Nullable;

/// Revisions of gear models as rows.
final class GearRows {
  private GearRows() {}

  /// Revisions that meet a condition on GEAR_REVISION, in the order of their first import.
  static List<GearRevision> fetch(DSLContext sql, Condition condition) {
    return sql.select()
        .from(GEAR_REVISION)
        .join(CODE)
        .on(CODE.ID.eq(GEAR_REVISION.GEAR_ID))
        .leftJoin(GEAR_RELEASE)
        .on(GEAR_RELEASE.ID.eq(GEAR_REVISION.ID))
        .leftJoin(PERSON)
        .on(PERSON.ID.eq(GEAR_RELEASE.RELEASED_BY))
        .where(condition)
        .orderBy(GEAR_REVISION.ID)
        .fetch(row -> revision(sql, row));
  }

  private static GearRevision revision(DSLContext sql, Record found) {
    GearRevisionRecord row = found.into(GEAR_REVISION);
    Released released =
        found.get(GEAR_RELEASE.ID) == null
            ? null
            : new Released(found.get(PERSON.INITIALS), found.get(GEAR_RELEASE.RELEASED_AT));
    GearModel model =
        new GearModel(
            found.get(CODE.SHOWN),
            row.getRevision(),
            Layouts.design(sql, Layouts.byId(sql, row.getInnerLayoutId())),
            Layouts.design(sql, Layouts.byId(sql, row.getOuterLayoutId())),
            Math.toIntExact(row.getModulatorPieces()),
            Member.valueOf(row.getHeld().toUpperCase(Locale.ROOT)),
            stated(row.getModulatorInnerRadiusMetres()),
            stated(row.getModulatorOuterRadiusMetres()),
            row.getStackMetres(),
            stated(row.getRequiredPullOutNewtonMetres()));
    return new GearRevision(
        row.getId(),
        model,
        row.getInnerLayoutId(),
        row.getOuterLayoutId(),
        row.getRecordedAt(),
        released);
  }

  /// Fills a row with what a draft says.
  static void fill(GearRevisionRecord row, GearDraft draft, long inner, long outer) {
    row.setRevision(draft.revision());
    row.setInnerLayoutId(inner);
    row.setOuterLayoutId(outer);
    row.setModulatorPieces((long) draft.modulatorPieces());
    row.setHeld(draft.held().name().toLowerCase(Locale.ROOT));
    row.setModulatorInnerRadiusMetres(orZero(draft.modulatorInnerRadiusMetres()));
    row.setModulatorOuterRadiusMetres(orZero(draft.modulatorOuterRadiusMetres()));
    row.setStackMetres(draft.stackMetres());
    row.setRequiredPullOutNewtonMetres(orZero(draft.requiredPullOutNewtonMetres()));
  }

  private static @Nullable Double stated(double number) {
    return number == 0 ? null : number;
  }

  private static double orZero(@Nullable Double number) {
    return number == null ? 0 : number;
  }
}
