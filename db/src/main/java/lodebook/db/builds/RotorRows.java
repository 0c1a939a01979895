package lodebook.db.builds;

import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.LAYOUT_REVISION;
import static lodebook.db.tables.Tables.LIVE_PLAN;
import static lodebook.db.tables.Tables.LIVE_ROTOR;
import static lodebook.db.tables.Tables.LIVE_SLOT;
import static lodebook.db.tables.Tables.ROTOR;
import static lodebook.db.tables.Tables.SURVEY;
import static org.jooq.impl.DSL.count;
import static org.jooq.impl.DSL.max;

import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import lodebook.db.code.CodeText;
import lodebook.db.tables.tables.Code;
import org.jooq.Condition;
import org.jooq.DSLContext;
import org.jooq.Record;
import org.jspecify.annotations.Nullable;

/// Rotors as rows.
final class RotorRows {
  private static final Code LAYOUT_CODE = CODE.as("layout_code");
  private static final Code BATCH_CODE = CODE.as("batch_code");

  private RotorRows() {}

  /// Rotors that meet a condition on ROTOR, in the order in which they were opened.
  static List<Rotor> fetch(DSLContext sql, Condition condition) {
    Map<Long, Integer> filled = filled(sql);
    Map<Long, String> surveys = latestSurveys(sql);
    Map<Long, String> units = units(sql);
    Set<Long> planned = sql.select(LIVE_PLAN.ROTOR_ID).from(LIVE_PLAN).fetchSet(LIVE_PLAN.ROTOR_ID);
    return sql.select()
        .from(ROTOR)
        .join(CODE)
        .on(CODE.ID.eq(ROTOR.ID))
        .join(LAYOUT_REVISION)
        .on(LAYOUT_REVISION.ID.eq(ROTOR.LAYOUT_REVISION_ID))
        .join(LAYOUT_CODE)
        .on(LAYOUT_CODE.ID.eq(LAYOUT_REVISION.LAYOUT_ID))
        .leftJoin(BATCH_CODE)
        .on(BATCH_CODE.ID.eq(ROTOR.BATCH_ID))
        .where(condition)
        .orderBy(ROTOR.ID)
        .fetch(
            found -> {
              long id = found.get(ROTOR.ID);
              return rotor(
                  found,
                  filled.getOrDefault(id, 0),
                  planned.contains(id),
                  surveys.get(id),
                  units.get(id));
            });
  }

  private static Rotor rotor(
      Record found, int filled, boolean planned, @Nullable String survey, @Nullable String unit) {
    Long gearNumber = found.get(ROTOR.GEAR_NUMBER);
    return new Rotor(
        found.get(CODE.SHOWN),
        found.get(LAYOUT_CODE.SHOWN) + "@" + found.get(LAYOUT_REVISION.REVISION),
        found.get(BATCH_CODE.SHOWN),
        gearNumber == null ? null : Math.toIntExact(gearNumber),
        found.get(ROTOR.RING),
        found.get(ROTOR.STATE),
        Math.toIntExact(
            found.get(LAYOUT_REVISION.POLE_PAIRS)
                * found.get(LAYOUT_REVISION.SEGMENTS_PER_POLE_PAIR)),
        filled,
        planned,
        survey,
        unit,
        found.get(ROTOR.RECORDED_AT));
  }

  private static Map<Long, Integer> filled(DSLContext sql) {
    return sql.select(LIVE_SLOT.ROTOR_ID, count())
        .from(LIVE_SLOT)
        .groupBy(LIVE_SLOT.ROTOR_ID)
        .fetchMap(row -> row.value1(), row -> row.value2());
  }

  private static Map<Long, String> units(DSLContext sql) {
    return sql.select(LIVE_ROTOR.ROTOR_ID, CODE.SHOWN)
        .from(LIVE_ROTOR)
        .join(CODE)
        .on(CODE.ID.eq(LIVE_ROTOR.UNIT_ID))
        .fetchMap(row -> row.value1(), row -> row.value2());
  }

  private static Map<Long, String> latestSurveys(DSLContext sql) {
    Map<Long, String> latest = new HashMap<>();
    sql.select(SURVEY.ROTOR_ID, CODE.SHOWN)
        .from(SURVEY)
        .join(CODE)
        .on(CODE.ID.eq(SURVEY.ID))
        .where(
            SURVEY.ID.in(
                sql.select(max(SURVEY.ID))
                    .from(SURVEY)
                    .where(SURVEY.VOIDED.isFalse())
                    .groupBy(SURVEY.ROTOR_ID)))
        .forEach(row -> latest.put(row.value1(), row.value2()));
    return latest;
  }

  /// Rotors by their numbers, as people read them.
  static Comparator<Rotor> byCode() {
    return Comparator.comparing(rotor -> CodeText.fold(rotor.code()));
  }
}
