package lodebook.db.stock;

import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.LOT;
import static lodebook.db.tables.Tables.LOT_STATE;
import static lodebook.db.tables.Tables.MAGNET_TYPE;
import static lodebook.db.tables.Tables.PERSON;
import static lodebook.db.tables.Tables.PIECE;
import static org.jooq.impl.DSL.count;
import static org.jooq.impl.DSL.noCondition;

import java.time.LocalDate;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.db.book.Book;
import lodebook.db.code.Code;
import lodebook.db.code.CodeKind;
import lodebook.db.code.CodeText;
import lodebook.db.code.Codes;
import org.jooq.Condition;
import org.jooq.DSLContext;
import org.jooq.Record;

/// Looking at lots.
public final class Lots {
  private final Book book;

  /// The lots of a book.
  public Lots(Book book) {
    this.book = book;
  }

  /// All lots by number.
  public List<Lot> list() {
    return book.read(
        sql ->
            fetch(sql, noCondition()).stream()
                .sorted(Comparator.comparing(l -> CodeText.fold(l.code())))
                .toList());
  }

  /// One lot; an unknown number is refused.
  public Lot show(String lot) {
    return book.read(
        sql -> {
          Code code = Codes.require(sql, lot, CodeKind.LOT);
          return fetch(sql, LOT.ID.eq(code.id())).getFirst();
        });
  }

  /// What was decided about a lot, first decision first.
  public List<StateChange> decisions(String lot) {
    return book.read(
        sql -> {
          Code code = Codes.require(sql, lot, CodeKind.LOT);
          return sql.select(
                  LOT_STATE.STATE,
                  LOT_STATE.WHY,
                  PERSON.INITIALS,
                  LOT_STATE.STATED_AT,
                  LOT_STATE.RECORDED_AT)
              .from(LOT_STATE)
              .join(PERSON)
              .on(PERSON.ID.eq(LOT_STATE.PERSON_ID))
              .where(LOT_STATE.LOT_ID.eq(code.id()))
              .orderBy(LOT_STATE.HISTORY_SEQUENCE)
              .fetch(
                  r -> new StateChange(r.value1(), r.value2(), r.value3(), r.value4(), r.value5()));
        });
  }

  private static List<Lot> fetch(DSLContext sql, Condition which) {
    Map<Long, Integer> measured = counts(sql, which.and(PIECE.REMANENCE_TESLA.isNotNull()));
    Map<Long, Integer> held = counts(sql, which.and(PIECE.STATE.eq(PieceState.HELD.word())));
    return sql.select(CODE.SHOWN, MAGNET_TYPE.NAME, LOT.asterisk())
        .from(LOT)
        .join(CODE)
        .on(CODE.ID.eq(LOT.ID))
        .join(MAGNET_TYPE)
        .on(MAGNET_TYPE.ID.eq(LOT.TYPE_ID))
        .where(which)
        .fetch(
            r ->
                lot(
                    r,
                    measured.getOrDefault(r.get(LOT.ID), 0),
                    held.getOrDefault(r.get(LOT.ID), 0)));
  }

  private static Map<Long, Integer> counts(DSLContext sql, Condition which) {
    Map<Long, Integer> counts = new HashMap<>();
    sql.select(PIECE.LOT_ID, count())
        .from(PIECE)
        .join(LOT)
        .on(LOT.ID.eq(PIECE.LOT_ID))
        .where(which)
        .groupBy(PIECE.LOT_ID)
        .forEach(r -> counts.put(r.value1(), r.value2()));
    return counts;
  }

  private static Lot lot(Record r, int measured, int held) {
    NewLot received =
        new NewLot(
            r.get(CODE.SHOWN),
            r.get(MAGNET_TYPE.NAME),
            r.get(LOT.SUPPLIER),
            r.get(LOT.SUPPLIER_LOT),
            LocalDate.parse(r.get(LOT.RECEIVED_ON)),
            Math.toIntExact(r.get(LOT.PIECE_COUNT)),
            r.get(LOT.CERTIFICATE),
            r.get(LOT.CERTIFICATE_REMANENCE_TESLA),
            r.get(LOT.LOCATION));
    return new Lot(
        received,
        LotState.of(r.get(LOT.STATE)),
        measured,
        Math.toIntExact(r.get(LOT.PLACED_COUNT)),
        Math.toIntExact(r.get(LOT.SCRAPPED_COUNT)),
        held);
  }
}
