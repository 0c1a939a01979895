package lodebook.db.surveys;

import static lodebook.db.tables.Tables.CHAIN_HEAD;
import static lodebook.db.tables.Tables.LIVE_ROTOR;
import static lodebook.db.tables.Tables.PERSON;
import static lodebook.db.tables.Tables.PLACEMENT;
import static lodebook.db.tables.Tables.READING;
import static lodebook.db.tables.Tables.ROTOR;
import static lodebook.db.tables.Tables.SURVEY;
import static lodebook.db.tables.Tables.SURVEY_CHANGE;
import static org.jooq.impl.DSL.noCondition;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.survey.Reading;
import lodebook.assembly.survey.SurveyedRing;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.Writing;
import lodebook.db.builds.PlacementRows;
import lodebook.db.builds.RecordedPlacement;
import lodebook.db.builds.Rotors;
import lodebook.db.code.Code;
import lodebook.db.code.CodeKind;
import lodebook.db.code.Codes;
import lodebook.db.keep.Settings;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import lodebook.db.rights.Role;
import lodebook.db.tables.tables.records.RotorRecord;
import lodebook.db.tables.tables.records.SurveyRecord;
import org.jooq.DSLContext;
import org.jspecify.annotations.Nullable;

/// Taking readings in, declaring surveys void, moving them, and reading them with the ring as it
/// stood.
public final class Surveys {
  private final Book book;

  /// Surveys of an open book.
  public Surveys(Book book) {
    this.book = book;
  }

  /// Takes the readings of a survey in, all of them or none ([lodebook.db.refusal.RowsRefused]).
  ///
  /// @param rotor the rotor
  /// @param rows the readings; may be of another person or meter each
  /// @param meter the meter of rows that name none, or null where every row names one
  /// @param continued the unfinished survey to which they belong, or null for a new one. A survey
  ///   is finished when a later one of its rotor was begun, or when its rotor went into a unit
  /// @return the survey, with all its readings
  public Survey importReadings(
      Act act,
      String rotor,
      List<SurveyRow> rows,
      @Nullable String meter,
      @Nullable String continued) {
    if (rows.isEmpty()) {
      throw Refusal.wrongInput("survey.empty");
    }
    return book.write(
        act,
        Permission.ANYTHING_ELSE,
        "survey import",
        writing -> importInto(writing, rotor, rows, meter, continued));
  }

  private static Survey importInto(
      Writing writing,
      String code,
      List<SurveyRow> rows,
      @Nullable String meter,
      @Nullable String continued) {
    DSLContext sql = writing.sql();
    RotorRecord rotor = Rotors.require(sql, code);
    String shown = Rotors.byId(sql, rotor.getId()).code();
    int slots = Rotors.design(sql, rotor).slots();
    ReadingImport readings = new ReadingImport(writing, shown, slots, meter, rows);
    writing.line().subject(shown).field("rotor", shown).field("meter", meter);
    long id;
    int before = 0;
    if (continued == null) {
      id = begin(writing, rotor.getId());
    } else {
      Code survey = Codes.require(sql, continued, CodeKind.SURVEY);
      requireUnfinished(sql, survey, rotor, shown);
      id = survey.id();
      before = sql.fetchCount(READING, READING.SURVEY_ID.eq(id));
      writing.line().subject(survey.shown()).field("continue", survey.shown());
    }
    readings.write(id, before, rows);
    return SurveyRows.fetch(sql, SURVEY.ID.eq(id)).getFirst();
  }

  private static long begin(Writing writing, long rotorId) {
    Writing.Numbered numbered = writing.give("S", CodeKind.SURVEY);
    writing
        .sql()
        .insertInto(SURVEY)
        .set(SURVEY.ID, numbered.id())
        .set(SURVEY.ROTOR_ID, rotorId)
        .set(SURVEY.VOIDED, false)
        .set(SURVEY.PERSON_ID, writing.person().id())
        .set(SURVEY.STATED_AT, writing.statedAt())
        .set(SURVEY.RECORDED_AT, writing.recordedAt())
        .set(SURVEY.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    writing.line().field("survey", numbered.code());
    return numbered.id();
  }

  private static void requireUnfinished(
      DSLContext sql, Code survey, RotorRecord rotor, String shown) {
    Survey found = SurveyRows.fetch(sql, SURVEY.ID.eq(survey.id())).getFirst();
    SurveyRecord row = sql.fetchSingle(SURVEY, SURVEY.ID.eq(survey.id()));
    if (!row.getRotorId().equals(rotor.getId())) {
      throw Refusal.refused("survey.other-rotor", found.code(), found.rotor(), shown)
          .remedy("lodebook rotor show " + shown);
    }
    if (found.voided()) {
      throw Refusal.refused("survey.void", found.code())
          .remedy("lodebook survey import " + shown + " survey.csv --meter METER");
    }
    Survey latest = latest(sql, rotor.getId());
    if (latest != null && !latest.code().equals(found.code())) {
      throw Refusal.refused("survey.finished", found.code(), shown, latest.code())
          .remedy(
              "lodebook survey import "
                  + shown
                  + " survey.csv --meter METER --continue "
                  + latest.code());
    }
    if (sql.fetchExists(LIVE_ROTOR, LIVE_ROTOR.ROTOR_ID.eq(rotor.getId()))) {
      throw Refusal.refused("survey.rotor-in-unit", found.code(), shown)
          .remedy("lodebook survey import " + shown + " survey.csv --meter METER");
    }
  }

  /// Declares a survey void; what another person recorded only by a lead.
  public Survey declareVoid(Act act, String code, String why) {
    if (why.isBlank()) {
      throw Refusal.wrongInput("survey.why", code)
          .remedy("lodebook survey void " + code + " --why TEXT");
    }
    return book.write(
        act,
        Permission.ANYTHING_ELSE,
        "survey void",
        writing -> {
          Code survey = Codes.require(writing.sql(), code, CodeKind.SURVEY);
          SurveyRecord row = own(writing, survey);
          change(writing, survey, "void", row.getRotorId(), row.getRotorId(), why);
          row.setVoided(true);
          row.store();
          return SurveyRows.fetch(writing.sql(), SURVEY.ID.eq(survey.id())).getFirst();
        });
  }

  /// Moves a survey to the rotor of which it really is; what another person recorded only by a
  /// lead. Its readings must fit that rotor's slots.
  public Survey move(Act act, String code, String rotor, String why) {
    if (why.isBlank()) {
      throw Refusal.wrongInput("survey.why", code);
    }
    return book.write(
        act,
        Permission.ANYTHING_ELSE,
        "survey move",
        writing -> {
          DSLContext sql = writing.sql();
          Code survey = Codes.require(sql, code, CodeKind.SURVEY);
          RotorRecord to = Rotors.require(sql, rotor);
          String shown = Rotors.byId(sql, to.getId()).code();
          SurveyRecord row = own(writing, survey);
          if (row.getRotorId().equals(to.getId())) {
            throw Refusal.refused("survey.moved-nowhere", survey.shown(), shown)
                .remedy("lodebook rotor show " + shown);
          }
          int slots = Rotors.design(sql, to).slots();
          long beyond =
              sql.fetchCount(
                  READING, READING.SURVEY_ID.eq(survey.id()).and(READING.SLOT.gt((long) slots)));
          if (beyond > 0) {
            throw Refusal.refused("survey.moved-beyond", survey.shown(), beyond, shown, slots)
                .remedy("lodebook rotor show " + shown);
          }
          change(writing, survey, "move", row.getRotorId(), to.getId(), why);
          writing.line().subject(shown).field("to", shown);
          row.setRotorId(to.getId());
          row.store();
          return SurveyRows.fetch(sql, SURVEY.ID.eq(survey.id())).getFirst();
        });
  }

  private static SurveyRecord own(Writing writing, Code survey) {
    SurveyRecord row = writing.sql().fetchSingle(SURVEY, SURVEY.ID.eq(survey.id()));
    if (row.getVoided()) {
      throw Refusal.refused("survey.void", survey.shown()).remedy("lodebook rotor list");
    }
    if (row.getPersonId() != writing.person().id() && writing.person().role() != Role.LEAD) {
      String by =
          writing
              .sql()
              .select(PERSON.INITIALS)
              .from(PERSON)
              .where(PERSON.ID.eq(row.getPersonId()))
              .fetchSingle()
              .value1();
      throw Refusal.refused("survey.others-record", survey.shown(), by)
          .remedy("lodebook person list");
    }
    return row;
  }

  private static void change(
      Writing writing, Code survey, String kind, long from, long to, String why) {
    String rotor = Rotors.byId(writing.sql(), from).code();
    writing
        .line()
        .subject(survey.shown())
        .subject(rotor)
        .field("survey", survey.shown())
        .field("rotor", rotor)
        .field("why", why);
    writing
        .sql()
        .insertInto(SURVEY_CHANGE)
        .set(SURVEY_CHANGE.ID, writing.newId())
        .set(SURVEY_CHANGE.SURVEY_ID, survey.id())
        .set(SURVEY_CHANGE.KIND, kind)
        .set(SURVEY_CHANGE.FROM_ROTOR_ID, from)
        .set(SURVEY_CHANGE.TO_ROTOR_ID, to)
        .set(SURVEY_CHANGE.WHY, why)
        .set(SURVEY_CHANGE.PERSON_ID, writing.person().id())
        .set(SURVEY_CHANGE.STATED_AT, writing.statedAt())
        .set(SURVEY_CHANGE.RECORDED_AT, writing.recordedAt())
        .set(SURVEY_CHANGE.HISTORY_SEQUENCE, writing.sequence())
        .execute();
  }

  /// Surveys in the order in which they were begun, of one rotor or of all.
  public List<Survey> list(@Nullable String rotor) {
    return book.read(
        sql ->
            SurveyRows.fetch(
                sql,
                rotor == null
                    ? noCondition()
                    : SURVEY.ROTOR_ID.eq(Rotors.require(sql, rotor).getId())));
  }

  /// One survey.
  public Survey show(String code) {
    return book.read(
        sql ->
            SurveyRows.fetch(sql, SURVEY.ID.eq(Codes.require(sql, code, CodeKind.SURVEY).id()))
                .getFirst());
  }

  /// The latest survey of a rotor inside a transaction that is not void, or null.
  static @Nullable Survey latest(DSLContext sql, long rotorId) {
    List<Survey> all =
        SurveyRows.fetch(sql, SURVEY.ROTOR_ID.eq(rotorId).and(SURVEY.VOIDED.isFalse()));
    return all.isEmpty() ? null : all.getLast();
  }

  /// What explaining needs.
  ///
  /// @param codes surveys of one rotor, or one rotor for its latest survey
  public RecordedSurvey asRecorded(List<String> codes) {
    return book.read(sql -> asRecorded(sql, codes));
  }

  private static RecordedSurvey asRecorded(DSLContext sql, List<String> codes) {
    List<Code> surveys = new ArrayList<>();
    for (String code : codes) {
      surveys.add(survey(sql, code, codes.size() == 1));
    }
    List<Long> ids = surveys.stream().map(Code::id).distinct().toList();
    List<SurveyRecord> rows = sql.fetch(SURVEY, SURVEY.ID.in(ids));
    Set<Long> rotors = new HashSet<>();
    for (SurveyRecord row : rows) {
      rotors.add(row.getRotorId());
    }
    if (rotors.size() > 1) {
      throw Refusal.refused(
              "survey.several-rotors",
              String.join(", ", surveys.stream().map(Code::shown).toList()))
          .remedy("lodebook survey check " + surveys.getFirst().shown());
    }
    for (Code survey : surveys) {
      if (rows.stream().anyMatch(row -> row.getId() == survey.id() && row.getVoided())) {
        throw Refusal.refused("survey.void", survey.shown()).remedy("lodebook rotor list");
      }
    }
    RotorRecord rotor = sql.fetchSingle(ROTOR, ROTOR.ID.in(rotors));
    RingDesign design = Rotors.design(sql, rotor);
    List<RecordedReading> readings = SurveyRows.readings(sql, ids);
    return new RecordedSurvey(
        surveys.stream().map(Code::shown).distinct().toList(),
        Rotors.byId(sql, rotor.getId()).code(),
        design,
        readings,
        sql.select(CHAIN_HEAD.SEQUENCE).from(CHAIN_HEAD).fetchSingle().value1(),
        Settings.priors(sql),
        stages(sql, rotor.getId(), design, readings));
  }

  private static Code survey(DSLContext sql, String text, boolean alone) {
    Code found = Codes.find(sql, text);
    if (found == null || found.kind() != CodeKind.ROTOR || !alone) {
      return Codes.require(sql, text, CodeKind.SURVEY);
    }
    Survey latest = latest(sql, found.id());
    if (latest == null) {
      throw Refusal.refused("survey.none", found.shown())
          .remedy("lodebook survey import " + found.shown() + " survey.csv --meter METER");
    }
    return Codes.require(sql, latest.code(), CodeKind.SURVEY);
  }

  private static List<RecordedSurvey.Stage> stages(
      DSLContext sql, long rotorId, RingDesign design, List<RecordedReading> readings) {
    BuiltRings rings = new BuiltRings(PlacementRows.fetch(sql, PLACEMENT.ROTOR_ID.eq(rotorId)));
    Strengths strengths = new Strengths(sql, rotorId);
    List<Map<Integer, RecordedPlacement>> states = new ArrayList<>();
    List<List<Reading>> read = new ArrayList<>();
    List<List<String>> from = new ArrayList<>();
    for (RecordedReading reading : readings) {
      Map<Integer, RecordedPlacement> state = rings.before(reading.sequence());
      if (states.isEmpty() || !states.getLast().equals(state)) {
        states.add(state);
        read.add(new ArrayList<>());
        from.add(new ArrayList<>());
      }
      read.getLast().add(reading.reading());
      from.getLast().add(reading.survey());
    }
    List<RecordedSurvey.Stage> stages = new ArrayList<>();
    for (int i = 0; i < states.size(); i++) {
      stages.add(
          new RecordedSurvey.Stage(
              new SurveyedRing(design, strengths.of(states.get(i))),
              read.get(i),
              from.get(i),
              changed(states.get(i), states.getLast())));
    }
    return stages;
  }

  private static Set<Integer> changed(
      Map<Integer, RecordedPlacement> then, Map<Integer, RecordedPlacement> now) {
    Set<Integer> changed = new HashSet<>();
    then.forEach(
        (slot, placement) -> {
          if (!placement.equals(now.get(slot))) {
            changed.add(slot);
          }
        });
    return changed;
  }
}
