package lodebook.db.stock;

import static lodebook.db.tables.Tables.LOT;
import static lodebook.db.tables.Tables.MAGNET_TYPE;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.Writing;
import lodebook.db.code.Code;
import lodebook.db.code.CodeKind;
import lodebook.db.code.CodeText;
import lodebook.db.code.Codes;
import lodebook.db.refusal.Refusal;
import lodebook.db.refusal.RowProblem;
import lodebook.db.refusal.RowsRefused;
import lodebook.db.rights.Permission;
import org.jooq.DSLContext;

/// Receiving lots.
public final class LotImport {
  private final Book book;

  /// Receiving lots into a book.
  public LotImport(Book book) {
    this.book = book;
  }

  /// Takes in new lots, all or none; each awaits inspection.
  public void importLots(Act act, List<NewLot> lots) {
    book.run(
        act,
        Permission.ANYTHING_ELSE,
        "lot import",
        writing -> {
          Map<String, Long> types = new HashMap<>();
          writing
              .sql()
              .select(MAGNET_TYPE.FOLDED, MAGNET_TYPE.ID)
              .from(MAGNET_TYPE)
              .forEach(r -> types.put(r.value1(), r.value2()));
          check(writing.sql(), lots, types.keySet());
          for (NewLot lot : lots) {
            Long type = types.get(CodeText.fold(lot.type()));
            if (type == null) {
              throw new IllegalStateException(lot.type());
            }
            insert(writing, lot, type);
          }
        });
  }

  private static void check(DSLContext sql, List<NewLot> lots, Set<String> types) {
    Map<String, Code> known = Codes.findAll(sql, lots.stream().map(NewLot::lot).toList());
    List<RowProblem> problems = new ArrayList<>();
    Set<String> inFile = new HashSet<>();
    for (int row = 0; row < lots.size(); row++) {
      NewLot lot = lots.get(row);
      Code holder = known.get(CodeText.fold(lot.lot()));
      if (!CodeText.isCode(lot.lot())) {
        problems.add(
            new RowProblem(
                row, "lot", Refusal.wrongInput("code.malformed", lot.lot(), CodeText.LONGEST)));
      } else if (!inFile.add(CodeText.fold(lot.lot()))) {
        problems.add(new RowProblem(row, "lot", Refusal.wrongInput("lot.twice", lot.lot())));
      } else if (holder != null) {
        problems.add(new RowProblem(row, "lot", Codes.taken(holder)));
      }
      if (!types.contains(CodeText.fold(lot.type()))) {
        problems.add(
            new RowProblem(
                row,
                "type",
                Refusal.refused("type.unknown", lot.type()).remedy("lodebook type list")));
      }
      if (lot.count() < 1) {
        problems.add(new RowProblem(row, "count", Refusal.wrongInput("lot.count", lot.count())));
      }
    }
    RowsRefused.throwIfAny(problems);
  }

  private static void insert(Writing writing, NewLot lot, long type) {
    long id = writing.register(lot.lot(), CodeKind.LOT);
    writing
        .sql()
        .insertInto(LOT)
        .set(LOT.ID, id)
        .set(LOT.TYPE_ID, type)
        .set(LOT.SUPPLIER, lot.supplier())
        .set(LOT.SUPPLIER_LOT, lot.supplierLot())
        .set(LOT.SUPPLIER_LOT_FOLDED, CodeText.fold(lot.supplierLot()))
        .set(LOT.RECEIVED_ON, lot.received().toString())
        .set(LOT.PIECE_COUNT, (long) lot.count())
        .set(LOT.PLACED_COUNT, 0L)
        .set(LOT.SCRAPPED_COUNT, 0L)
        .set(LOT.CERTIFICATE, lot.certificate())
        .set(LOT.CERTIFICATE_REMANENCE_TESLA, lot.certificateRemanenceTesla())
        .set(LOT.LOCATION, lot.location())
        .set(LOT.STATE, LotState.AWAITING.word())
        .set(LOT.CLEAR, false)
        .set(LOT.RECORDED_AT, writing.recordedAt())
        .set(LOT.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    Double remanence = lot.certificateRemanenceTesla();
    writing
        .line()
        .row(
            List.of(
                lot.lot(),
                lot.type(),
                lot.supplier(),
                lot.supplierLot(),
                lot.received().toString(),
                String.valueOf(lot.count()),
                lot.certificate(),
                remanence == null ? "" : remanence.toString(),
                lot.location()))
        .now("lot", lot.lot(), LotState.AWAITING.word());
  }
}
