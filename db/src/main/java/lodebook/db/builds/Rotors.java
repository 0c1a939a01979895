package lodebook.db.builds;

import static lodebook.db.tables.Tables.PLACEMENT;
import static lodebook.db.tables.Tables.ROTOR;
import static lodebook.db.tables.Tables.ROTOR_STATE;
import static org.jooq.impl.DSL.noCondition;

import java.util.List;
import lodebook.assembly.layout.RingDesign;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.Writing;
import lodebook.db.code.CodeKind;
import lodebook.db.code.Codes;
import lodebook.db.layouts.LayoutRevision;
import lodebook.db.layouts.Layouts;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import lodebook.db.tables.tables.records.RotorRecord;
import org.jooq.DSLContext;
import org.jspecify.annotations.Nullable;

/// Opening, listing and scrapping rotors.
public final class Rotors {
  private final Book book;

  /// Rotors of an open book.
  public Rotors(Book book) {
    this.book = book;
  }

  /// Opens a rotor alone, with no batch.
  ///
  /// @param layout a released layout: `CODE` or `CODE@REVISION`
  /// @param serial the rotor's number
  public Rotor open(Act act, String layout, String serial) {
    return open(act, layout, serial, null);
  }

  /// Opens a rotor alone or as one more of a batch, for no gear in particular.
  ///
  /// @param layout a released layout: `CODE` or `CODE@REVISION`
  /// @param serial the rotor's number
  /// @param batch a batch whose gear model has a ring of this layout, or null
  public Rotor open(Act act, String layout, String serial, @Nullable String batch) {
    return book.write(
        act,
        Permission.ANYTHING_ELSE,
        "rotor open",
        writing -> {
          LayoutRevision revision = Layouts.requireReleased(writing.sql(), layout);
          InBatch place =
              batch == null ? null : Batches.placeFor(writing.sql(), batch, serial, revision);
          long id = insert(writing, revision, serial, place);
          writing.line().field("rotor", serial);
          Rotor opened = byId(writing.sql(), id);
          if (opened.batch() != null) {
            writing.line().subject(opened.batch()).field("batch", opened.batch());
          }
          return opened;
        });
  }

  /// A rotor's place in its batch.
  ///
  /// @param batchId the batch
  /// @param gearNumber for which gear, from 1; null for none in particular
  /// @param ring `inner` or `outer`
  record InBatch(long batchId, @Nullable Integer gearNumber, String ring) {}

  static long insert(
      Writing writing, LayoutRevision revision, String serial, @Nullable InBatch place) {
    long id = writing.register(serial, CodeKind.ROTOR);
    RotorRecord row = writing.sql().newRecord(ROTOR);
    row.setId(id);
    row.setLayoutRevisionId(revision.id());
    if (place != null) {
      row.setBatchId(place.batchId());
      Integer gear = place.gearNumber();
      row.setGearNumber(gear == null ? null : gear.longValue());
      row.setRing(place.ring());
    }
    row.setState("open");
    row.setRecordedAt(writing.recordedAt());
    row.setHistorySequence(writing.sequence());
    row.insert();
    writing.line().field("layout", revision.layout().name());
    writing.line().now("rotor", serial, "open");
    return id;
  }

  /// All rotors by their numbers.
  public List<Rotor> list() {
    return book.read(
        sql -> RotorRows.fetch(sql, noCondition()).stream().sorted(RotorRows.byCode()).toList());
  }

  /// A rotor with everything that was ever put into it.
  public RotorShown show(String code) {
    return book.read(
        sql -> {
          RotorRecord row = require(sql, code);
          return new RotorShown(
              byId(sql, row.getId()),
              design(sql, row),
              PlacementRows.fetch(sql, PLACEMENT.ROTOR_ID.eq(row.getId())));
        });
  }

  /// Scraps a rotor, a lead's business: its magnets are scrapped with it, and what its plan keeps
  /// is free again.
  public Rotor scrap(Act act, String code, String why) {
    if (why.isBlank()) {
      throw Refusal.wrongInput("rotor.scrap-why", code)
          .remedy("lodebook rotor scrap " + code + " --why TEXT");
    }
    return book.write(act, Permission.LEAD, "rotor scrap", writing -> scrapIn(writing, code, why));
  }

  private static Rotor scrapIn(Writing writing, String code, String why) {
    DSLContext sql = writing.sql();
    RotorRecord row = require(sql, code);
    Rotor rotor = byId(sql, row.getId());
    if (row.getState().equals("scrapped")) {
      throw Refusal.refused("rotor.scrapped-already", rotor.code())
          .remedy("lodebook rotor show " + rotor.code());
    }
    refuseInUnit(rotor);
    writing.line().subject(rotor.code()).field("rotor", rotor.code()).field("why", why);
    LivePlans.drop(writing, row.getId(), rotor.code());
    SlotWriter.scrapAll(writing, row.getId(), why);
    row.setState("scrapped");
    row.store();
    sql.insertInto(ROTOR_STATE)
        .set(ROTOR_STATE.ID, writing.newId())
        .set(ROTOR_STATE.ROTOR_ID, row.getId())
        .set(ROTOR_STATE.STATE, "scrapped")
        .set(ROTOR_STATE.WHY, why)
        .set(ROTOR_STATE.PERSON_ID, writing.person().id())
        .set(ROTOR_STATE.STATED_AT, writing.statedAt())
        .set(ROTOR_STATE.RECORDED_AT, writing.recordedAt())
        .set(ROTOR_STATE.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    writing.line().now("rotor", rotor.code(), "scrapped");
    return byId(sql, row.getId());
  }

  /// The row of a rotor inside a transaction; unknown numbers refuse.
  public static RotorRecord require(DSLContext sql, String code) {
    long id = Codes.require(sql, code, CodeKind.ROTOR).id();
    return sql.fetchSingle(ROTOR, ROTOR.ID.eq(id));
  }

  /// A rotor inside a transaction.
  public static Rotor byId(DSLContext sql, long id) {
    return RotorRows.fetch(sql, ROTOR.ID.eq(id)).getFirst();
  }

  /// The design a rotor is built to, inside a transaction.
  public static RingDesign design(DSLContext sql, RotorRecord rotor) {
    return Layouts.design(sql, Layouts.byId(sql, rotor.getLayoutRevisionId()));
  }

  /// Refuses a rotor at which nobody can build: scrapped, held, or in a unit.
  public static void requireOpen(Rotor rotor) {
    if (!rotor.state().equals("open")) {
      throw Refusal.refused("rotor." + rotor.state(), rotor.code())
          .remedy("lodebook rotor show " + rotor.code());
    }
    refuseInUnit(rotor);
  }

  private static void refuseInUnit(Rotor rotor) {
    if (rotor.unit() != null) {
      throw Refusal.refused("rotor.in-unit", rotor.code(), rotor.unit())
          .remedy("lodebook unit show " + rotor.unit());
    }
  }
}
