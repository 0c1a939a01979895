package lodebook.db.trace;

import static lodebook.db.tables.Tables.BATCH;
import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.LOT;
import static lodebook.db.tables.Tables.METER;
import static lodebook.db.tables.Tables.PIECE;
import static lodebook.db.tables.Tables.ROTOR;
import static lodebook.db.tables.Tables.SURVEY;
import static lodebook.db.tables.Tables.TRAY;
import static lodebook.db.tables.Tables.UNIT;

import java.time.Instant;
import java.util.List;
import java.util.Optional;
import lodebook.db.builds.MagnetName;
import lodebook.db.code.Code;
import lodebook.db.code.CodeKind;
import lodebook.db.code.CodeText;
import lodebook.db.code.Codes;
import lodebook.db.refusal.Refusal;
import org.jooq.DSLContext;
import org.jooq.Record2;
import org.jspecify.annotations.Nullable;

/// Finds things by number or id, with their state.
final class Things {
  private final DSLContext sql;

  Things(DSLContext sql) {
    this.sql = sql;
  }

  /// The thing that a person names: a number of the shop, a piece, or a supplier's lot.
  Thing named(String text) {
    if (text.indexOf('/') > 0) {
      MagnetName name = MagnetName.of(text);
      Code lot = Codes.require(sql, name.lot(), CodeKind.LOT);
      Long id =
          sql.select(PIECE.ID)
              .from(PIECE)
              .where(PIECE.LOT_ID.eq(lot.id()).and(PIECE.NUMBER.eq(name.number())))
              .fetchOne(PIECE.ID);
      if (id == null) {
        throw Refusal.refused("trace.no-piece", MagnetName.shown(lot.shown(), name.number()))
            .remedy("lodebook piece list " + lot.shown());
      }
      return piece(id);
    }
    Code code = Codes.find(sql, text);
    if (code != null) {
      return of(code.id());
    }
    if (supplied(text).isEmpty()) {
      throw Refusal.refused("trace.unknown", text).remedy("lodebook history");
    }
    String shown =
        sql.select(LOT.SUPPLIER_LOT)
            .from(LOT)
            .where(LOT.SUPPLIER_LOT_FOLDED.eq(CodeText.fold(text)))
            .limit(1)
            .fetchSingle()
            .value1();
    return new Thing(0, shown, "supplier lot", null, "");
  }

  /// The shop's lots of a supplier's lot.
  List<Thing> supplied(String supplierLot) {
    return sql
        .select(LOT.ID)
        .from(LOT)
        .where(LOT.SUPPLIER_LOT_FOLDED.eq(CodeText.fold(supplierLot)))
        .orderBy(LOT.ID)
        .fetch(LOT.ID)
        .stream()
        .map(this::of)
        .toList();
  }

  /// The supplier's lot of a lot, where one was named.
  Optional<Thing> supplierOf(Thing lot) {
    String supplied =
        sql.select(LOT.SUPPLIER_LOT).from(LOT).where(LOT.ID.eq(lot.id())).fetchSingle().value1();
    return supplied.isEmpty()
        ? Optional.empty()
        : Optional.of(new Thing(0, supplied, "supplier lot", null, ""));
  }

  /// A piece by its id.
  Thing piece(long id) {
    return sql.select(CODE.SHOWN, PIECE.NUMBER, PIECE.RECORDED_AT, PIECE.STATE)
        .from(PIECE)
        .join(CODE)
        .on(CODE.ID.eq(PIECE.LOT_ID))
        .where(PIECE.ID.eq(id))
        .fetchSingle(
            row ->
                new Thing(
                    id,
                    MagnetName.shown(row.value1(), row.value2()),
                    "piece",
                    row.value3(),
                    row.value4()));
  }

  /// A thing with a number of the shop by its id.
  Thing of(long id) {
    Record2<String, String> code =
        sql.select(CODE.SHOWN, CODE.KIND).from(CODE).where(CODE.ID.eq(id)).fetchSingle();
    Record2<Instant, String> state = state(id, CodeKind.of(code.value2()));
    return new Thing(
        id,
        code.value1(),
        code.value2(),
        state == null ? null : state.value1(),
        state == null ? "" : state.value2());
  }

  private @Nullable Record2<Instant, String> state(long id, CodeKind kind) {
    var nothing = org.jooq.impl.DSL.inline("");
    return switch (kind) {
      case LOT -> sql.select(LOT.RECORDED_AT, LOT.STATE).from(LOT).where(LOT.ID.eq(id)).fetchOne();
      case ROTOR ->
          sql.select(ROTOR.RECORDED_AT, ROTOR.STATE).from(ROTOR).where(ROTOR.ID.eq(id)).fetchOne();
      case UNIT ->
          sql.select(UNIT.RECORDED_AT, UNIT.STATE).from(UNIT).where(UNIT.ID.eq(id)).fetchOne();
      case BATCH ->
          sql.select(BATCH.RECORDED_AT, nothing).from(BATCH).where(BATCH.ID.eq(id)).fetchOne();
      case TRAY ->
          sql.select(TRAY.RECORDED_AT, nothing).from(TRAY).where(TRAY.ID.eq(id)).fetchOne();
      case METER ->
          sql.select(
                  METER.RECORDED_AT,
                  org.jooq.impl.DSL.when(METER.RETIRED.isTrue(), "retired").otherwise("in use"))
              .from(METER)
              .where(METER.ID.eq(id))
              .fetchOne();
      case SURVEY ->
          sql.select(
                  SURVEY.RECORDED_AT,
                  org.jooq.impl.DSL.when(SURVEY.VOIDED.isTrue(), "void").otherwise(""))
              .from(SURVEY)
              .where(SURVEY.ID.eq(id))
              .fetchOne();
      case LAYOUT, GEAR, PART, SHIPMENT, NONCONFORMANCE -> null;
    };
  }
}
