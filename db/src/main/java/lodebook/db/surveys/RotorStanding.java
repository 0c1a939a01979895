package lodebook.db.surveys;

import static lodebook.db.tables.Tables.MEMBERSHIP;
import static lodebook.db.tables.Tables.MEMBERSHIP_END;
import static lodebook.db.tables.Tables.READING;
import static lodebook.db.tables.Tables.SURVEY;
import static org.jooq.impl.DSL.max;
import static org.jooq.impl.DSL.min;

import lodebook.assembly.survey.Verdict;
import lodebook.db.builds.Rotor;
import lodebook.db.code.CodeKind;
import lodebook.db.code.Codes;
import lodebook.db.refusal.Refusal;
import org.jooq.DSLContext;

/// Whether a rotor may go into a unit by what its latest survey says.
public final class RotorStanding {
  private RotorStanding() {}

  /// Refuses a rotor that is not full, or whose latest survey doesn't pass, was never checked, is
  /// older than the last change of a magnet, or older than the rotor's last time in a unit.
  public static void requirePassing(DSLContext sql, long rotorId, Rotor rotor) {
    if (rotor.filled() < rotor.slots()) {
      throw Refusal.refused("unit.rotor-not-full", rotor.code(), rotor.filled(), rotor.slots())
          .remedy("lodebook rotor show " + rotor.code());
    }
    Survey latest = Surveys.latest(sql, rotorId);
    String again = "lodebook survey import " + rotor.code() + " survey.csv --meter METER";
    if (latest == null) {
      throw Refusal.refused("unit.rotor-unsurveyed", rotor.code()).remedy(again);
    }
    if (lastRead(sql, latest) < SurveyRows.lastBuilt(sql, rotorId)) {
      throw Refusal.refused("unit.rotor-changed", rotor.code(), latest.code()).remedy(again);
    }
    if (begun(sql, latest) < lastLeft(sql, rotorId)) {
      throw Refusal.refused("unit.rotor-was-in-unit", rotor.code(), latest.code()).remedy(again);
    }
    Verdict verdict = latest.verdict();
    if (verdict == null) {
      throw Refusal.refused("unit.rotor-unchecked", rotor.code(), latest.code())
          .remedy("lodebook survey check " + latest.code());
    }
    if (verdict != Verdict.PASS) {
      throw Refusal.refused("unit.rotor-fails", rotor.code(), latest.code(), verdict.word())
          .remedy("lodebook survey check " + latest.code());
    }
  }

  private static long lastRead(DSLContext sql, Survey survey) {
    Long last =
        sql.select(max(READING.HISTORY_SEQUENCE))
            .from(READING)
            .where(READING.SURVEY_ID.eq(Codes.require(sql, survey.code(), CodeKind.SURVEY).id()))
            .fetchSingle()
            .value1();
    return last == null ? 0 : last;
  }

  private static long begun(DSLContext sql, Survey survey) {
    Long first =
        sql.select(min(SURVEY.HISTORY_SEQUENCE))
            .from(SURVEY)
            .where(SURVEY.ID.eq(Codes.require(sql, survey.code(), CodeKind.SURVEY).id()))
            .fetchSingle()
            .value1();
    return first == null ? 0 : first;
  }

  private static long lastLeft(DSLContext sql, long rotorId) {
    Long left =
        sql.select(max(MEMBERSHIP_END.HISTORY_SEQUENCE))
            .from(MEMBERSHIP_END)
            .join(MEMBERSHIP)
            .on(MEMBERSHIP.ID.eq(MEMBERSHIP_END.MEMBERSHIP_ID))
            .where(MEMBERSHIP.MEMBER_ID.eq(rotorId))
            .fetchSingle()
            .value1();
    return left == null ? 0 : left;
  }
}
