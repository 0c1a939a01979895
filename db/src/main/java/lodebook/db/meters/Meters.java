package lodebook.db.meters;

import static lodebook.db.tables.Tables.CODE;
import static lodebook.db.tables.Tables.METER;
import static lodebook.db.tables.Tables.METER_CALIBRATION;

import java.time.LocalDate;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.Writing;
import lodebook.db.code.CodeKind;
import lodebook.db.code.CodeText;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import org.jooq.DSLContext;
import org.jspecify.annotations.Nullable;

/// The instruments of the shop.
public final class Meters {
  private final Book book;

  /// The instruments of a book.
  public Meters(Book book) {
    this.book = book;
  }

  /// Adds an instrument. Its code is a number of the shop; accuracy, floor and depth are not
  /// negative, and the accuracy is below 1.
  public void add(Act act, Meter meter) {
    CodeText.check(meter.code());
    checkRange(meter.code(), "meter.accuracy", 100 * meter.accuracyRelative(), 100);
    checkRange(meter.code(), "meter.floor", 1000 * meter.floorTesla(), 10_000);
    checkRange(meter.code(), "meter.depth", 1000 * meter.sensingDepthMetres(), 1000);
    book.run(act, Permission.INSPECT, "meter add", writing -> insert(writing, meter));
  }

  /// All instruments by code; those that are retired last.
  public List<Meter> list() {
    return book.read(
        sql ->
            all(sql).values().stream()
                .sorted(
                    Comparator.comparing(Meter::retired)
                        .thenComparing(m -> CodeText.fold(m.code())))
                .toList());
  }

  /// All instruments by id, inside a transaction.
  public static Map<Long, Meter> all(DSLContext sql) {
    Map<Long, String> due = new HashMap<>();
    sql.select(METER_CALIBRATION.METER_ID, METER_CALIBRATION.DUE_ON)
        .from(METER_CALIBRATION)
        .orderBy(METER_CALIBRATION.ID)
        .forEach(r -> due.put(r.value1(), r.value2()));
    Map<Long, Meter> meters = new HashMap<>();
    sql.select(CODE.SHOWN, METER.asterisk())
        .from(METER)
        .join(CODE)
        .on(CODE.ID.eq(METER.ID))
        .forEach(
            r ->
                meters.put(
                    r.get(METER.ID),
                    new Meter(
                        r.get(CODE.SHOWN),
                        MeterKind.of(r.get(METER.KIND)),
                        r.get(METER.ACCURACY_RELATIVE),
                        r.get(METER.FLOOR_TESLA),
                        r.get(METER.SENSING_DEPTH_METRES),
                        day(due.get(r.get(METER.ID))),
                        r.get(METER.RETIRED))));
    return meters;
  }

  private static @Nullable LocalDate day(@Nullable String text) {
    return text == null || text.isEmpty() ? null : LocalDate.parse(text);
  }

  private static void insert(Writing writing, Meter meter) {
    DSLContext sql = writing.sql();
    long id = writing.register(meter.code(), CodeKind.METER);
    sql.insertInto(METER)
        .set(METER.ID, id)
        .set(METER.KIND, meter.kind().word())
        .set(METER.ACCURACY_RELATIVE, meter.accuracyRelative())
        .set(METER.FLOOR_TESLA, meter.floorTesla())
        .set(METER.SENSING_DEPTH_METRES, meter.sensingDepthMetres())
        .set(METER.RETIRED, meter.retired())
        .set(METER.RECORDED_AT, writing.recordedAt())
        .set(METER.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    if (meter.calibrationDue() != null) {
      sql.insertInto(METER_CALIBRATION)
          .set(METER_CALIBRATION.ID, writing.newId())
          .set(METER_CALIBRATION.METER_ID, id)
          .set(METER_CALIBRATION.CALIBRATED_ON, "")
          .set(METER_CALIBRATION.DUE_ON, meter.calibrationDue().toString())
          .set(METER_CALIBRATION.CERTIFICATE, "")
          .set(METER_CALIBRATION.PERSON_ID, writing.person().id())
          .set(METER_CALIBRATION.STATED_AT, writing.statedAt())
          .set(METER_CALIBRATION.RECORDED_AT, writing.recordedAt())
          .set(METER_CALIBRATION.HISTORY_SEQUENCE, writing.sequence())
          .execute();
    }
    writing
        .line()
        .field("meter", meter.code())
        .field("kind", meter.kind().word())
        .field("accuracyRelative", meter.accuracyRelative())
        .field("floorTesla", meter.floorTesla())
        .field("sensingDepthMetres", meter.sensingDepthMetres())
        .field("calibrationDue", meter.calibrationDue());
  }

  private static void checkRange(String code, String key, double number, int below) {
    if (!(number >= 0 && number < below)) {
      throw Refusal.wrongInput(key, code, Math.rint(number * 1e6) / 1e6, below)
          .remedy("lodebook help meter add");
    }
  }
}
