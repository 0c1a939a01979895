package lodebook.db.builds;

import static lodebook.db.tables.Tables.BATCH;
import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.ROTOR;
import static org.jooq.impl.DSL.noCondition;

import java.util.Comparator;
import java.util.List;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.Writing;
import lodebook.db.code.Code;
import lodebook.db.code.CodeKind;
import lodebook.db.code.CodeText;
import lodebook.db.code.Codes;
import lodebook.db.layouts.GearRevision;
import lodebook.db.layouts.Gears;
import lodebook.db.layouts.LayoutRevision;
import lodebook.db.layouts.Layouts;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import org.jooq.Condition;
import org.jooq.DSLContext;
import org.jspecify.annotations.Nullable;

/// Opening and listing batches.
public final class Batches {
  /// The most gears that one batch may order.
  private static final int MOST = 1000;

  private final Book book;

  /// Batches of an open book.
  public Batches(Book book) {
    this.book = book;
  }

  /// Opens a batch and makes its rotors, inner before outer, gear by gear, with serials that count
  /// on from the highest used.
  ///
  /// @param batch the batch's number
  /// @param gear a released gear model: `CODE` or `CODE@REVISION`
  /// @param gears how many gears
  /// @param serials pattern of the rotors' serials, such as `R-{0001}`; null for `BATCH-{0001}`
  public Batch open(Act act, String batch, String gear, int gears, @Nullable String serials) {
    if (gears < 1 || gears > MOST) {
      throw Refusal.wrongInput("batch.count", batch, gears, MOST)
          .remedy("lodebook help batch open");
    }
    String pattern = serials == null ? batch + "-{0001}" : serials;
    SerialPattern shape = SerialPattern.of(pattern);
    return book.write(
        act,
        Permission.DESIGN,
        "batch open",
        writing -> {
          GearRevision model = Gears.requireReleased(writing.sql(), gear);
          long id = writing.register(batch, CodeKind.BATCH);
          writing
              .sql()
              .insertInto(BATCH)
              .set(BATCH.ID, id)
              .set(BATCH.GEAR_REVISION_ID, model.id())
              .set(BATCH.GEAR_COUNT, (long) gears)
              .set(BATCH.SERIAL_PATTERN, pattern)
              .set(BATCH.RECORDED_AT, writing.recordedAt())
              .set(BATCH.HISTORY_SEQUENCE, writing.sequence())
              .execute();
          writing
              .line()
              .field("batch", batch)
              .field("gear", model.name())
              .field("gears", gears)
              .field("serials", pattern);
          openRotors(writing, id, model, gears, shape);
          return fetch(writing.sql(), BATCH.ID.eq(id)).getFirst();
        });
  }

  private static void openRotors(
      Writing writing, long batchId, GearRevision model, int gears, SerialPattern shape) {
    LayoutRevision inner = Layouts.byId(writing.sql(), model.innerLayoutId());
    LayoutRevision outer = Layouts.byId(writing.sql(), model.outerLayoutId());
    long number = shape.next(writing.sql());
    for (int gear = 1; gear <= gears; gear++) {
      Rotors.insert(
          writing, inner, shape.serial(number), new Rotors.InBatch(batchId, gear, "inner"));
      Rotors.insert(
          writing, outer, shape.serial(number + 1), new Rotors.InBatch(batchId, gear, "outer"));
      number += 2;
    }
  }

  /// The place of one more rotor in a batch, inner or outer by its layout; refused where the
  /// batch's gear model has no ring of that layout.
  static Rotors.InBatch placeFor(
      DSLContext sql, String batch, String serial, LayoutRevision revision) {
    Code found = Codes.require(sql, batch, CodeKind.BATCH);
    long gear = sql.fetchSingle(BATCH, BATCH.ID.eq(found.id())).getGearRevisionId();
    GearRevision model = Gears.byId(sql, gear);
    if (revision.id() == model.innerLayoutId()) {
      return new Rotors.InBatch(found.id(), null, "inner");
    }
    if (revision.id() == model.outerLayoutId()) {
      return new Rotors.InBatch(found.id(), null, "outer");
    }
    throw Refusal.refused(
            "rotor.not-of-batch",
            serial,
            revision.layout().name(),
            found.shown(),
            model.name(),
            Layouts.byId(sql, model.innerLayoutId()).layout().name(),
            Layouts.byId(sql, model.outerLayoutId()).layout().name())
        .remedy("lodebook batch show " + found.shown());
  }

  /// All batches by their numbers.
  public List<Batch> list() {
    return book.read(
        sql ->
            fetch(sql, noCondition()).stream()
                .sorted(Comparator.comparing(batch -> CodeText.fold(batch.code())))
                .toList());
  }

  /// One batch.
  public Batch show(String code) {
    return book.read(
        sql -> fetch(sql, BATCH.ID.eq(Codes.require(sql, code, CodeKind.BATCH).id())).getFirst());
  }

  private static List<Batch> fetch(DSLContext sql, Condition condition) {
    return sql.select()
        .from(BATCH)
        .join(CODE)
        .on(CODE.ID.eq(BATCH.ID))
        .where(condition)
        .orderBy(BATCH.ID)
        .fetch(
            row ->
                new Batch(
                    row.get(CODE.SHOWN),
                    Gears.byId(sql, row.get(BATCH.GEAR_REVISION_ID)).name(),
                    Math.toIntExact(row.get(BATCH.GEAR_COUNT)),
                    row.get(BATCH.SERIAL_PATTERN),
                    row.get(BATCH.RECORDED_AT),
                    RotorRows.fetch(sql, ROTOR.BATCH_ID.eq(row.get(BATCH.ID)))));
  }
}
