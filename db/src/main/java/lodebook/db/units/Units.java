package lodebook.db.units;

import static lodebook.db.tables.Tables.LIVE_ROTOR;
import static lodebook.db.tables.Tables.MEMBERSHIP;
import static lodebook.db.tables.Tables.UNIT;
import static lodebook.db.tables.Tables.UNIT_STATE;
import static org.jooq.impl.DSL.noCondition;

import java.util.Comparator;
import java.util.List;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.Writing;
import lodebook.db.builds.Rotor;
import lodebook.db.builds.Rotors;
import lodebook.db.code.CodeKind;
import lodebook.db.code.CodeText;
import lodebook.db.code.Codes;
import lodebook.db.layouts.GearRevision;
import lodebook.db.layouts.Gears;
import lodebook.db.layouts.Layouts;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import lodebook.db.surveys.RotorStanding;
import lodebook.db.tables.tables.records.RotorRecord;
import lodebook.db.tables.tables.records.UnitRecord;
import org.jooq.DSLContext;
import org.jspecify.annotations.Nullable;

/// Assembling gears from rotors, and taking them back.
public final class Units {
  private final Book book;

  /// Units of an open book.
  public Units(Book book) {
    this.book = book;
  }

  /// Assembles a unit.
  ///
  /// @param unit its number
  /// @param gear a released gear model: `CODE` or `CODE@REVISION`
  /// @param inner the inner rotor
  /// @param outer the outer rotor
  /// @param override the reason for which a lead lets in a rotor that no passing survey speaks for,
  ///   or null
  public GearUnit assemble(
      Act act, String unit, String gear, String inner, String outer, @Nullable String override) {
    if (CodeText.fold(inner).equals(CodeText.fold(outer))) {
      throw Refusal.wrongInput("unit.same-rotor", unit, inner).remedy("lodebook rotor list");
    }
    return book.write(
        act,
        Permission.DESIGN,
        "unit assemble",
        writing -> assembleIn(writing, unit, gear, inner, outer, override));
  }

  private static GearUnit assembleIn(
      Writing writing,
      String unit,
      String gear,
      String inner,
      String outer,
      @Nullable String override) {
    DSLContext sql = writing.sql();
    if (override != null) {
      writing.require(Permission.LEAD, "unit assemble --override");
    }
    GearRevision model = Gears.requireReleased(sql, gear);
    RotorRecord innerRow = Rotors.require(sql, inner);
    RotorRecord outerRow = Rotors.require(sql, outer);
    check(sql, model, innerRow, "inner", model.innerLayoutId(), override);
    check(sql, model, outerRow, "outer", model.outerLayoutId(), override);
    long id = writing.register(unit, CodeKind.UNIT);
    UnitRecord row = sql.newRecord(UNIT);
    row.setId(id);
    row.setGearRevisionId(model.id());
    Long batch = innerRow.getBatchId();
    if (batch != null && batch.equals(outerRow.getBatchId())) {
      row.setBatchId(batch);
    }
    row.setState("assembled");
    row.setRecordedAt(writing.recordedAt());
    row.setHistorySequence(writing.sequence());
    row.insert();
    writing
        .line()
        .field("unit", unit)
        .field("gear", model.name())
        .field("override", override)
        .now("unit", unit, "assembled");
    state(writing, id, "assembled", "");
    join(writing, id, unit, innerRow.getId(), "inner", override);
    join(writing, id, unit, outerRow.getId(), "outer", override);
    return UnitRows.fetch(sql, UNIT.ID.eq(id)).getFirst();
  }

  private static void check(
      DSLContext sql,
      GearRevision model,
      RotorRecord row,
      String position,
      long layoutId,
      @Nullable String override) {
    Rotor rotor = Rotors.byId(sql, row.getId());
    if (row.getLayoutRevisionId() != layoutId) {
      throw Refusal.refused(
              "unit.wrong-layout",
              rotor.code(),
              rotor.layout(),
              position,
              model.name(),
              Layouts.byId(sql, layoutId).layout().name())
          .remedy("lodebook rotor list");
    }
    Rotors.requireOpen(rotor);
    if (override == null) {
      RotorStanding.requirePassing(sql, row.getId(), rotor);
    }
  }

  private static void join(
      Writing writing,
      long unitId,
      String unit,
      long rotorId,
      String position,
      @Nullable String override) {
    String rotor = Rotors.byId(writing.sql(), rotorId).code();
    long membership = writing.newId();
    writing
        .sql()
        .insertInto(MEMBERSHIP)
        .set(MEMBERSHIP.ID, membership)
        .set(MEMBERSHIP.HOLDER_ID, unitId)
        .set(MEMBERSHIP.MEMBER_ID, rotorId)
        .set(MEMBERSHIP.POSITION, position)
        .set(MEMBERSHIP.WHY, override == null ? "" : override)
        .set(MEMBERSHIP.PERSON_ID, writing.person().id())
        .set(MEMBERSHIP.FROM_AT, writing.statedAt())
        .set(MEMBERSHIP.RECORDED_AT, writing.recordedAt())
        .set(MEMBERSHIP.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    writing
        .sql()
        .insertInto(
            LIVE_ROTOR,
            LIVE_ROTOR.ROTOR_ID,
            LIVE_ROTOR.UNIT_ID,
            LIVE_ROTOR.POSITION,
            LIVE_ROTOR.MEMBERSHIP_ID)
        .values(rotorId, unitId, position, membership)
        .execute();
    writing
        .line()
        .subject(rotor)
        .field(position, rotor)
        .now("member", unit + "/" + position, rotor);
  }

  private static void state(Writing writing, long unitId, String state, String why) {
    writing
        .sql()
        .insertInto(UNIT_STATE)
        .set(UNIT_STATE.ID, writing.newId())
        .set(UNIT_STATE.UNIT_ID, unitId)
        .set(UNIT_STATE.STATE, state)
        .set(UNIT_STATE.WHY, why)
        .set(UNIT_STATE.PERSON_ID, writing.person().id())
        .set(UNIT_STATE.STATED_AT, writing.statedAt())
        .set(UNIT_STATE.RECORDED_AT, writing.recordedAt())
        .set(UNIT_STATE.HISTORY_SEQUENCE, writing.sequence())
        .execute();
  }

  /// Records that a unit came back, and with which complaint.
  public GearUnit takeBack(Act act, String unit, String complaint) {
    if (complaint.isBlank()) {
      throw Refusal.wrongInput("unit.complaint", unit)
          .remedy("lodebook unit return " + unit + " --complaint TEXT");
    }
    return book.write(
        act,
        Permission.ANYTHING_ELSE,
        "unit return",
        writing -> {
          long id = Codes.require(writing.sql(), unit, CodeKind.UNIT).id();
          UnitRecord row = writing.sql().fetchSingle(UNIT, UNIT.ID.eq(id));
          GearUnit before = UnitRows.fetch(writing.sql(), UNIT.ID.eq(id)).getFirst();
          if (row.getState().equals("returned")) {
            throw Refusal.refused("unit.returned-already", before.code())
                .remedy("lodebook unit show " + before.code());
          }
          row.setState("returned");
          row.store();
          state(writing, id, "returned", complaint);
          writing
              .line()
              .subject(before.code())
              .field("unit", before.code())
              .field("complaint", complaint)
              .now("unit", before.code(), "returned");
          return UnitRows.fetch(writing.sql(), UNIT.ID.eq(id)).getFirst();
        });
  }

  /// All units by their numbers.
  public List<GearUnit> list() {
    return book.read(
        sql ->
            UnitRows.fetch(sql, noCondition()).stream()
                .sorted(Comparator.comparing(unit -> CodeText.fold(unit.code())))
                .toList());
  }

  /// One unit.
  public GearUnit show(String code) {
    return book.read(
        sql ->
            UnitRows.fetch(sql, UNIT.ID.eq(Codes.require(sql, code, CodeKind.UNIT).id()))
                .getFirst());
  }
}
