package lodebook.db.surveys;

import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.METER;
import static lodebook.db.tables.Tables.PERSON;
import static lodebook.db.tables.Tables.PLACEMENT;
import static lodebook.db.tables.Tables.PLACEMENT_END;
import static lodebook.db.tables.Tables.READING;
import static lodebook.db.tables.Tables.SURVEY;
import static lodebook.db.tables.Tables.SURVEY_CHANGE;
import static lodebook.db.tables.Tables.SURVEY_CHECK;
import static org.jooq.impl.DSL.count;
import static org.jooq.impl.DSL.max;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.stream.Stream;
import lodebook.assembly.survey.Meter;
import lodebook.assembly.survey.Reading;
import lodebook.assembly.survey.Verdict;
import lodebook.db.layouts.LayoutWords;
import lodebook.db.tables.tables.Code;
import lodebook.db.tables.tables.records.SurveyCheckRecord;
import org.jooq.Condition;
import org.jooq.DSLContext;
import org.jooq.Record;
import org.jspecify.annotations.Nullable;

/// Surveys and readings as rows.
final class SurveyRows {
  private static final Code ROTOR_CODE = CODE.as("rotor_code");

  private SurveyRows() {}

  /// Surveys that meet a condition on SURVEY, in the order in which they were begun.
  static List<Survey> fetch(DSLContext sql, Condition condition) {
    Map<Long, Integer> readings = new HashMap<>();
    sql.select(READING.SURVEY_ID, count())
        .from(READING)
        .groupBy(READING.SURVEY_ID)
        .forEach(row -> readings.put(row.value1(), row.value2()));
    return sql.select()
        .from(SURVEY)
        .join(CODE)
        .on(CODE.ID.eq(SURVEY.ID))
        .join(ROTOR_CODE)
        .on(ROTOR_CODE.ID.eq(SURVEY.ROTOR_ID))
        .join(PERSON)
        .on(PERSON.ID.eq(SURVEY.PERSON_ID))
        .where(condition)
        .orderBy(SURVEY.ID)
        .fetch(
            row ->
                new Survey(
                    row.get(CODE.SHOWN),
                    row.get(ROTOR_CODE.SHOWN),
                    readings.getOrDefault(row.get(SURVEY.ID), 0),
                    row.get(SURVEY.VOIDED),
                    row.get(PERSON.INITIALS),
                    row.get(SURVEY.STATED_AT),
                    verdict(sql, row.get(SURVEY.ID), row.get(SURVEY.ROTOR_ID))));
  }

  /// What the latest check of a survey said, or null where none was made after the last change of
  /// its readings or of the rotor's record.
  static @Nullable Verdict verdict(DSLContext sql, long surveyId, long rotorId) {
    SurveyCheckRecord check =
        sql.selectFrom(SURVEY_CHECK)
            .where(SURVEY_CHECK.SURVEY_ID.eq(surveyId))
            .orderBy(SURVEY_CHECK.ID.desc())
            .limit(1)
            .fetchOne();
    if (check == null || lastChange(sql, surveyId, rotorId) > check.getHistorySequence()) {
      return null;
    }
    return Arrays.stream(Verdict.values())
        .filter(verdict -> verdict.word().equals(check.getVerdict()))
        .findFirst()
        .orElseThrow();
  }

  /// The last line of history that changed what a check of a survey sees.
  static long lastChange(DSLContext sql, long surveyId, long rotorId) {
    Long reading =
        sql.select(max(READING.HISTORY_SEQUENCE))
            .from(READING)
            .where(READING.SURVEY_ID.eq(surveyId))
            .fetchSingle()
            .value1();
    Long move =
        sql.select(max(SURVEY_CHANGE.HISTORY_SEQUENCE))
            .from(SURVEY_CHANGE)
            .where(SURVEY_CHANGE.SURVEY_ID.eq(surveyId))
            .fetchSingle()
            .value1();
    return Stream.of(reading, move, lastBuilt(sql, rotorId))
        .filter(Objects::nonNull)
        .mapToLong(Long::longValue)
        .max()
        .orElse(0);
  }

  /// The last line of history that put a magnet into a rotor or took one out, 0 for none.
  static long lastBuilt(DSLContext sql, long rotorId) {
    Long put =
        sql.select(max(PLACEMENT.HISTORY_SEQUENCE))
            .from(PLACEMENT)
            .where(PLACEMENT.ROTOR_ID.eq(rotorId))
            .fetchSingle()
            .value1();
    Long ended =
        sql.select(max(PLACEMENT_END.HISTORY_SEQUENCE))
            .from(PLACEMENT_END)
            .join(PLACEMENT)
            .on(PLACEMENT.ID.eq(PLACEMENT_END.PLACEMENT_ID))
            .where(PLACEMENT.ROTOR_ID.eq(rotorId))
            .fetchSingle()
            .value1();
    return Math.max(put == null ? 0 : put, ended == null ? 0 : ended);
  }

  /// The readings of surveys in the order in which they were recorded. Where there are several
  /// surveys, each has its own gain error of the same meter, so its meters carry its number.
  static List<RecordedReading> readings(DSLContext sql, List<Long> surveys) {
    Code survey = CODE.as("survey_code");
    return sql.select()
        .from(READING)
        .join(survey)
        .on(survey.ID.eq(READING.SURVEY_ID))
        .join(METER)
        .on(METER.ID.eq(READING.METER_ID))
        .join(CODE)
        .on(CODE.ID.eq(METER.ID))
        .join(PERSON)
        .on(PERSON.ID.eq(READING.PERSON_ID))
        .where(READING.SURVEY_ID.in(surveys))
        .orderBy(READING.ID)
        .fetch(row -> reading(row, row.get(survey.SHOWN), surveys.size() > 1));
  }

  private static RecordedReading reading(Record row, String survey, boolean several) {
    FluxUnit unit = Objects.requireNonNull(FluxUnit.of(row.get(READING.UNIT)));
    String meter = row.get(CODE.SHOWN);
    return new RecordedReading(
        survey,
        Math.toIntExact(row.get(READING.NUMBER)),
        new Reading(
            Math.toIntExact(row.get(READING.SLOT)),
            LayoutWords.spot(row.get(READING.SPOT)),
            LayoutWords.component(row.get(READING.COMPONENT)),
            row.get(READING.FLUX_TESLA),
            unit.family(),
            row.get(READING.TEMPERATURE_CELSIUS),
            row.get(READING.RADIUS_METRES),
            row.get(READING.HEIGHT_METRES),
            new Meter(
                several ? meter + " in " + survey : meter,
                row.get(METER.ACCURACY_RELATIVE),
                row.get(METER.FLOOR_TESLA))),
        unit,
        row.get(PERSON.INITIALS),
        row.get(READING.STATED_AT),
        row.get(READING.HISTORY_SEQUENCE));
  }
}
