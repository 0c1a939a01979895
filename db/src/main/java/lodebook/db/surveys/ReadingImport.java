package lodebook.db.surveys;

import static lodebook.db.tables.Tables.METER;
import static lodebook.db.tables.Tables.PERSON;
import static lodebook.db.tables.Tables.READING;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import lodebook.db.book.Writing;
import lodebook.db.code.Code;
import lodebook.db.code.CodeKind;
import lodebook.db.code.CodeText;
import lodebook.db.code.Codes;
import lodebook.db.layouts.LayoutWords;
import lodebook.db.refusal.Refusal;
import lodebook.db.refusal.RowProblem;
import lodebook.db.refusal.RowsRefused;
import lodebook.db.tables.tables.records.MeterRecord;
import lodebook.db.tables.tables.records.ReadingRecord;
import org.jspecify.annotations.Nullable;

/// Checks the rows of a survey and writes them as readings.
final class ReadingImport {
  private final Writing writing;
  private final String rotor;
  private final int slots;
  private final @Nullable String meter;
  private final Map<String, Long> people = new HashMap<>();
  private final Map<String, Code> meters;
  private final Map<Long, MeterRecord> meterRows = new HashMap<>();
  private final List<RowProblem> problems = new ArrayList<>();

  ReadingImport(
      Writing writing, String rotor, int slots, @Nullable String meter, List<SurveyRow> rows) {
    this.writing = writing;
    this.rotor = rotor;
    this.slots = slots;
    this.meter = meter;
    writing
        .sql()
        .selectFrom(PERSON)
        .forEach(row -> people.put(CodeText.fold(row.getInitials()), row.getId()));
    List<String> named = new ArrayList<>();
    if (meter != null) {
      named.add(meter);
    }
    rows.stream().map(SurveyRow::meter).filter(Objects::nonNull).distinct().forEach(named::add);
    meters = Codes.findAll(writing.sql(), named);
    writing.sql().selectFrom(METER).forEach(row -> meterRows.put(row.getId(), row));
  }

  /// Writes all rows behind the readings that the survey has; refuses all of them if one is wrong.
  void write(long surveyId, int readingsBefore, List<SurveyRow> rows) {
    refuseCommonMeter(rows);
    List<ReadingRecord> records = new ArrayList<>();
    for (int i = 0; i < rows.size(); i++) {
      ReadingRecord record = check(i, rows.get(i));
      if (record != null) {
        record.setSurveyId(surveyId);
        record.setNumber((long) readingsBefore + i + 1);
        records.add(record);
      }
    }
    RowsRefused.throwIfAny(problems);
    writing.sql().batchInsert(records).execute();
    rows.forEach(this::tell);
  }

  /// The meter of rows that name none is refused once and not row by row.
  private void refuseCommonMeter(List<SurveyRow> rows) {
    if (meter != null && rows.stream().anyMatch(row -> row.meter() == null)) {
      Refusal refusal = unusable(meter);
      if (refusal != null) {
        throw refusal;
      }
    }
  }

  private @Nullable ReadingRecord check(int index, SurveyRow row) {
    int before = problems.size();
    if (row.slot() < 1 || row.slot() > slots) {
      problem(
          index,
          "slot",
          Refusal.refused("survey.no-slot", rotor, row.slot(), slots)
              .remedy("lodebook rotor show " + rotor));
    }
    if (!Double.isFinite(row.amount())) {
      problem(index, "value", Refusal.wrongInput("survey.no-number", row.amount()));
    }
    MeterRecord gauge = meter(index, row);
    String by = row.by() == null ? writing.person().initials() : row.by();
    Long person = people.get(CodeText.fold(by));
    if (person == null) {
      problem(index, "by", Refusal.refused("person.unknown", by).remedy("lodebook person list"));
    }
    if (problems.size() > before || gauge == null || person == null) {
      return null;
    }
    ReadingRecord record = writing.sql().newRecord(READING);
    record.setId(writing.newId());
    record.setSlot((long) row.slot());
    record.setSpot(LayoutWords.word(row.spot()));
    record.setComponent(LayoutWords.word(row.component()));
    record.setFluxTesla(row.unit().tesla(row.amount()));
    record.setUnit(row.unit().word());
    record.setTemperatureCelsius(row.temperatureCelsius());
    record.setRadiusMetres(row.radiusMetres());
    record.setHeightMetres(row.heightMetres());
    record.setMeterId(gauge.getId());
    record.setPersonId(person);
    record.setStatedAt(row.at() == null ? writing.statedAt() : row.at());
    record.setRecordedAt(writing.recordedAt());
    record.setHistorySequence(writing.sequence());
    return record;
  }

  private @Nullable MeterRecord meter(int index, SurveyRow row) {
    String named = row.meter() == null ? meter : row.meter();
    if (named == null) {
      problem(index, "meter", Refusal.wrongInput("survey.no-meter"));
      return null;
    }
    Refusal refusal = unusable(named);
    if (refusal != null) {
      problem(index, "meter", refusal);
      return null;
    }
    return gauge(named);
  }

  /// Why a meter cannot have read a survey, or null where it can.
  private @Nullable Refusal unusable(String named) {
    Code code = meters.get(CodeText.fold(named));
    if (code == null) {
      return Codes.unknown(named, CodeKind.METER);
    }
    if (code.kind() != CodeKind.METER) {
      return Codes.wrongKind(code, CodeKind.METER);
    }
    MeterRecord gauge = gauge(named);
    if (!gauge.getKind().equals("field")) {
      return Refusal.refused("survey.meter-kind", code.shown(), gauge.getKind())
          .remedy("lodebook meter list");
    }
    return gauge.getRetired()
        ? Refusal.refused("survey.meter-retired", code.shown()).remedy("lodebook meter list")
        : null;
  }

  private MeterRecord gauge(String named) {
    Code code = Objects.requireNonNull(meters.get(CodeText.fold(named)));
    return Objects.requireNonNull(meterRows.get(code.id()));
  }

  private void tell(SurveyRow row) {
    writing
        .line()
        .row(
            List.of(
                Integer.toString(row.slot()),
                LayoutWords.word(row.spot()),
                LayoutWords.word(row.component()),
                Double.toString(row.amount()),
                row.unit().word(),
                orNothing(row.temperatureCelsius()),
                orNothing(row.radiusMetres()),
                orNothing(row.heightMetres()),
                orNothing(row.at()),
                orNothing(row.by()),
                orNothing(row.meter())));
  }

  private static String orNothing(@Nullable Object content) {
    return content == null ? "" : content.toString();
  }

  private void problem(int index, String column, Refusal refusal) {
    problems.add(new RowProblem(index, column, refusal));
  }
}
