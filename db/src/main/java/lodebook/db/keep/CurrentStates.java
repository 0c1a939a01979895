package lodebook.db.keep;

import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.GEAR_RELEASE;
import static lodebook.db.tables.Tables.LAYOUT_RELEASE;
import static lodebook.db.tables.Tables.LIVE_PLACEMENT;
import static lodebook.db.tables.Tables.LIVE_ROTOR;
import static lodebook.db.tables.Tables.LIVE_SLOT;
import static lodebook.db.tables.Tables.LOT;
import static lodebook.db.tables.Tables.PERSON;
import static lodebook.db.tables.Tables.PIECE;
import static lodebook.db.tables.Tables.PLACEMENT;
import static lodebook.db.tables.Tables.ROTOR;
import static lodebook.db.tables.Tables.UNIT;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;
import lodebook.db.refusal.Notice;
import lodebook.db.stock.PieceName;
import lodebook.db.tables.tables.Code;
import org.jooq.DSLContext;

/// How everything stands in the tables, in the words in which the history says it.
final class CurrentStates {
  private final DSLContext sql;
  private final Map<String, String> states = new TreeMap<>();

  private CurrentStates(DSLContext sql) {
    this.sql = sql;
  }

  /// One notice for each thing that stands otherwise than the history says.
  ///
  /// @param said the last statement of the history on each thing: `KIND WHAT` and how
  static List<Notice> differences(DSLContext sql, Map<String, String> said) {
    Map<String, String> is = new CurrentStates(sql).collect();
    TreeSet<String> things = new TreeSet<>(said.keySet());
    things.addAll(is.keySet());
    List<Notice> differences = new ArrayList<>();
    for (String thing : things) {
      String should = said.getOrDefault(thing, silence(thing));
      String does = is.getOrDefault(thing, silence(thing));
      if (!should.equals(does)) {
        differences.add(Notice.of("verify.state", thing, words(does), words(should)));
      }
    }
    return differences;
  }

  /// What holds where nothing is said: a piece is usable, anything else is not there.
  private static String silence(String thing) {
    return thing.startsWith("piece ") ? "usable" : "";
  }

  private static String words(String how) {
    return how.isEmpty() ? "nothing" : how;
  }

  private Map<String, String> collect() {
    people();
    lots();
    pieces();
    slots();
    releases();
    rotorsAndUnits();
    return states;
  }

  private void people() {
    sql.selectFrom(PERSON)
        .forEach(
            p ->
                states.put(
                    "person " + p.getInitials(), p.getRole() + (p.getRetired() ? " retired" : "")));
  }

  private void lots() {
    sql.select(CODE.SHOWN, LOT.STATE)
        .from(LOT)
        .join(CODE)
        .on(CODE.ID.eq(LOT.ID))
        .forEach(r -> states.put("lot " + r.value1(), r.value2()));
  }

  private void pieces() {
    sql.select(CODE.SHOWN, PIECE.NUMBER, PIECE.STATE)
        .from(PIECE)
        .join(CODE)
        .on(CODE.ID.eq(PIECE.LOT_ID))
        .where(PIECE.STATE.ne("usable"))
        .forEach(r -> states.put("piece " + new PieceName(r.value1(), r.value2()), r.value3()));
  }

  private void slots() {
    Code rotor = CODE.as("rotor_code");
    Code lot = CODE.as("lot_code");
    sql.select(rotor.SHOWN, LIVE_SLOT.SLOT, lot.SHOWN, PIECE.NUMBER, PLACEMENT.FACING_DEGREES)
        .from(LIVE_SLOT)
        .join(PLACEMENT)
        .on(PLACEMENT.ID.eq(LIVE_SLOT.PLACEMENT_ID))
        .join(rotor)
        .on(rotor.ID.eq(LIVE_SLOT.ROTOR_ID))
        .join(lot)
        .on(lot.ID.eq(LIVE_SLOT.LOT_ID))
        .leftJoin(LIVE_PLACEMENT)
        .on(LIVE_PLACEMENT.PLACEMENT_ID.eq(LIVE_SLOT.PLACEMENT_ID))
        .leftJoin(PIECE)
        .on(PIECE.ID.eq(LIVE_PLACEMENT.PIECE_ID))
        .forEach(
            r -> {
              Long number = r.value4();
              String what =
                  number == null ? r.value3() : new PieceName(r.value3(), number).toString();
              states.put("slot " + r.value1() + "/" + r.value2(), what + " " + r.value5());
            });
  }

  private void releases() {
    sql.select(CODE.SHOWN, LAYOUT_RELEASE.REVISION)
        .from(LAYOUT_RELEASE)
        .join(CODE)
        .on(CODE.ID.eq(LAYOUT_RELEASE.LAYOUT_ID))
        .forEach(r -> states.put("layout " + r.value1() + "@" + r.value2(), "released"));
    sql.select(CODE.SHOWN, GEAR_RELEASE.REVISION)
        .from(GEAR_RELEASE)
        .join(CODE)
        .on(CODE.ID.eq(GEAR_RELEASE.GEAR_ID))
        .forEach(r -> states.put("gear " + r.value1() + "@" + r.value2(), "released"));
  }

  private void rotorsAndUnits() {
    sql.select(CODE.SHOWN, ROTOR.STATE)
        .from(ROTOR)
        .join(CODE)
        .on(CODE.ID.eq(ROTOR.ID))
        .forEach(r -> states.put("rotor " + r.value1(), r.value2()));
    sql.select(CODE.SHOWN, UNIT.STATE)
        .from(UNIT)
        .join(CODE)
        .on(CODE.ID.eq(UNIT.ID))
        .forEach(r -> states.put("unit " + r.value1(), r.value2()));
    Code unit = CODE.as("unit_code");
    Code rotor = CODE.as("rotor_code");
    sql.select(unit.SHOWN, LIVE_ROTOR.POSITION, rotor.SHOWN)
        .from(LIVE_ROTOR)
        .join(unit)
        .on(unit.ID.eq(LIVE_ROTOR.UNIT_ID))
        .join(rotor)
        .on(rotor.ID.eq(LIVE_ROTOR.ROTOR_ID))
        .forEach(r -> states.put("member " + r.value1() + "/" + r.value2(), r.value3()));
  }
}
