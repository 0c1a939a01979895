package lodebook.db;

import static lodebook.db.tables.Tables.CELL_CONTENT;
import static lodebook.db.tables.Tables.GRADE;
import static lodebook.db.tables.Tables.LOT;
import static lodebook.db.tables.Tables.MAGNET_TYPE;
import static lodebook.db.tables.Tables.METER;
import static lodebook.db.tables.Tables.PERSON;
import static lodebook.db.tables.Tables.PIECE;
import static lodebook.db.tables.Tables.TRAY;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.InsertFrom;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Numbering;
import lodebook.assembly.layout.Probe;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.layout.Spread;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.BookAddress;
import lodebook.db.book.Writing;
import lodebook.db.code.CodeKind;
import lodebook.db.code.Codes;
import lodebook.db.refusal.Refusal;
import lodebook.db.refusal.RowsRefused;
import lodebook.db.rights.Permission;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.function.Executable;

/// A small invented workshop in a new book: people LE (lead), BE and BO (bench), PL (planner), IN
/// (inspector); types BLK-4 and BLK-5 of grade N42; accepted lots L-1 and L-2 of 40 pieces of BLK-4
/// and BLK-5, the first 30 of each measured, in trays T-1 and T-2; meter GM-1.
public final class Workshop implements AutoCloseable {
  /// Who leads.
  public static final Act LEAD = Act.by("LE");

  /// Who builds.
  public static final Act BENCH = Act.by("BE");

  /// Who plans.
  public static final Act PLANNER = Act.by("PL");

  private final BookAddress address;
  private final Book book;

  /// Makes the book.
  public Workshop(TestBook database) {
    address = database.newPlace();
    Book.create(address, TestBook.visit(), Workshop::furnish);
    book = Book.open(address, TestBook.visit(TestBook.START.plusSeconds(3600)));
  }

  private static void furnish(Writing writing) {
    long id = writing.newId();
    for (Map.Entry<String, String> person :
        Map.of("LE", "lead", "BE", "bench", "BO", "bench", "PL", "planner", "IN", "inspector")
            .entrySet()) {
      writing.line().now("person", person.getKey(), person.getValue());
      writing
          .sql()
          .insertInto(PERSON)
          .set(PERSON.ID, writing.newId())
          .set(PERSON.FOLDED, person.getKey().toLowerCase(java.util.Locale.ROOT))
          .set(PERSON.INITIALS, person.getKey())
          .set(PERSON.NAME, "Person " + person.getKey())
          .set(PERSON.ROLE, person.getValue())
          .set(PERSON.RETIRED, false)
          .set(PERSON.RECORDED_AT, writing.recordedAt())
          .set(PERSON.HISTORY_SEQUENCE, writing.sequence())
          .execute();
    }
    writing
        .sql()
        .insertInto(GRADE)
        .set(GRADE.ID, id)
        .set(GRADE.FOLDED, "n42")
        .set(GRADE.NAME, "N42")
        .set(GRADE.REMANENCE_LOW_TESLA, 1.28)
        .set(GRADE.REMANENCE_HIGH_TESLA, 1.32)
        .set(GRADE.REMANENCE_PER_KELVIN, -0.0012)
        .set(GRADE.RECOIL_PERMEABILITY, 1.05)
        .set(GRADE.HIGHEST_TEMPERATURE_CELSIUS, 80.0)
        .set(GRADE.DENSITY_KILOGRAM_PER_CUBIC_METRE, 7500.0)
        .set(GRADE.SOURCE, "test")
        .set(GRADE.RECORDED_AT, writing.recordedAt())
        .set(GRADE.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    lot(writing, type(writing, "BLK-4", 4e-3, id), "L-1", "T-1");
    lot(writing, type(writing, "BLK-5", 5e-3, id), "L-2", "T-2");
    writing
        .sql()
        .insertInto(METER)
        .set(METER.ID, writing.register("GM-1", CodeKind.METER))
        .set(METER.KIND, "field")
        .set(METER.ACCURACY_RELATIVE, 0.01)
        .set(METER.FLOOR_TESLA, 0.2e-3)
        .set(METER.SENSING_DEPTH_METRES, 0.0)
        .set(METER.RETIRED, false)
        .set(METER.RECORDED_AT, writing.recordedAt())
        .set(METER.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    writing.line().field("made", "workshop");
  }

  private static long type(Writing writing, String name, double side, long grade) {
    long id = writing.newId();
    writing
        .sql()
        .insertInto(MAGNET_TYPE)
        .set(MAGNET_TYPE.ID, id)
        .set(MAGNET_TYPE.FOLDED, name.toLowerCase(java.util.Locale.ROOT))
        .set(MAGNET_TYPE.NAME, name)
        .set(MAGNET_TYPE.SHAPE, "block")
        .set(MAGNET_TYPE.THICKNESS_METRES, side)
        .set(MAGNET_TYPE.WIDTH_METRES, side)
        .set(MAGNET_TYPE.LENGTH_METRES, 10e-3)
        .set(MAGNET_TYPE.DIAMETER_METRES, 0.0)
        .set(MAGNET_TYPE.INNER_DIAMETER_METRES, 0.0)
        .set(MAGNET_TYPE.ARC_DEGREES, 0.0)
        .set(MAGNET_TYPE.GRADE_ID, grade)
        .set(MAGNET_TYPE.TOLERANCE_METRES, 0.05e-3)
        .set(MAGNET_TYPE.COATING, "Ni-Cu-Ni")
        .set(MAGNET_TYPE.RECOIL_PERMEABILITY, 1.05)
        .set(MAGNET_TYPE.MAGNETISATION_DEGREES, 0.0)
        .set(MAGNET_TYPE.RECORDED_AT, writing.recordedAt())
        .set(MAGNET_TYPE.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    return id;
  }

  private static void lot(Writing writing, long type, String code, String trayCode) {
    long id = writing.register(code, CodeKind.LOT);
    writing
        .sql()
        .insertInto(LOT)
        .set(LOT.ID, id)
        .set(LOT.TYPE_ID, type)
        .set(LOT.SUPPLIER, "Fernhill Magnetics (invented)")
        .set(LOT.SUPPLIER_LOT, "FH-" + code)
        .set(LOT.SUPPLIER_LOT_FOLDED, "fh-" + code.toLowerCase(java.util.Locale.ROOT))
        .set(LOT.RECEIVED_ON, "2026-05-02")
        .set(LOT.PIECE_COUNT, 40L)
        .set(LOT.PLACED_COUNT, 0L)
        .set(LOT.SCRAPPED_COUNT, 0L)
        .set(LOT.CERTIFICATE, "C-1")
        .set(LOT.CERTIFICATE_REMANENCE_TESLA, 1.3)
        .set(LOT.LOCATION, "shelf 3")
        .set(LOT.STATE, "accepted")
        .set(LOT.CLEAR, true)
        .set(LOT.RECORDED_AT, writing.recordedAt())
        .set(LOT.HISTORY_SEQUENCE, writing.sequence())
        .execute();
    writing.line().now("lot", code, "accepted");
    long tray = writing.register(trayCode, CodeKind.TRAY);
    writing
        .sql()
        .insertInto(TRAY, TRAY.ID, TRAY.RECORDED_AT, TRAY.HISTORY_SEQUENCE)
        .values(tray, writing.recordedAt(), writing.sequence())
        .execute();
    for (long number = 1; number <= 30; number++) {
      long piece = writing.newId();
      writing
          .sql()
          .insertInto(PIECE)
          .set(PIECE.ID, piece)
          .set(PIECE.LOT_ID, id)
          .set(PIECE.NUMBER, number)
          .set(PIECE.STATE, "usable")
          .set(PIECE.CLEAR, true)
          .set(PIECE.REMANENCE_TESLA, 1.29 + 0.001 * (number * 7 % 20))
          .set(PIECE.REMANENCE_UNCERTAINTY_TESLA, 0.015)
          .set(PIECE.RECORDED_AT, writing.recordedAt())
          .set(PIECE.HISTORY_SEQUENCE, writing.sequence())
          .execute();
      writing
          .sql()
          .insertInto(CELL_CONTENT, CELL_CONTENT.TRAY_ID, CELL_CONTENT.CELL, CELL_CONTENT.PIECE_ID)
          .values(tray, "A" + number, piece)
          .execute();
    }
  }

  /// The open book.
  public Book book() {
    return book;
  }

  /// Where it is.
  public BookAddress address() {
    return address;
  }

  /// A ring of twelve slots, three pole pairs, focus out, of 4 mm blocks.
  public static Layout inner(String code, String revision) {
    return ring(code, revision, 3, Focus.OUT, 10e-3, 13e-3, "BLK-4");
  }

  /// A ring of sixteen slots, four pole pairs, focus in, of 5 mm blocks.
  public static Layout outer(String code, String revision) {
    return ring(code, revision, 4, Focus.IN, 20e-3, 16.5e-3, "BLK-5");
  }

  private static Layout ring(
      String code,
      String revision,
      int polePairs,
      Focus focus,
      double slotRadius,
      double workingRadius,
      String type) {
    return new Layout(
        code,
        revision,
        polePairs,
        4,
        focus,
        Numbering.CLOCKWISE,
        0,
        Facing.OUT,
        slotRadius,
        type,
        null,
        workingRadius,
        new Probe(
            workingRadius,
            0,
            List.of(Spot.CENTRE),
            List.of(Component.RADIAL, Component.TANGENTIAL)),
        Spread.DEFAULT,
        "two-part epoxy, 5 min",
        5.0,
        false,
        InsertFrom.FACE,
        0.03);
  }

  /// Puts a lot into a state, as the operations on stock do.
  public void lotState(String lot, String state) {
    book.run(
        LEAD,
        Permission.LEAD,
        "test lot state",
        writing -> {
          long id = Codes.require(writing.sql(), lot, CodeKind.LOT).id();
          if (state.equals("held")) {
            writing
                .sql()
                .execute("update live_slot set stood_before_hold = true where lot_id = ?", id);
          }
          writing
              .sql()
              .update(LOT)
              .set(LOT.STATE, state)
              .set(LOT.STATE_BEFORE_HOLD, state.equals("held") ? "accepted" : null)
              .set(LOT.CLEAR, state.equals("accepted"))
              .where(LOT.ID.eq(id))
              .execute();
        });
  }

  /// Puts a piece into a state, as the operations on stock do.
  public void pieceState(String lot, long number, String state) {
    book.run(
        LEAD,
        Permission.LEAD,
        "test piece state",
        writing -> {
          long id = Codes.require(writing.sql(), lot, CodeKind.LOT).id();
          writing
              .sql()
              .execute(
                  "update live_placement set stood_before_hold = true where piece_id in"
                      + " (select id from piece where lot_id = ? and number = ?)",
                  id,
                  number);
          writing
              .sql()
              .update(PIECE)
              .set(PIECE.STATE, state)
              .set(PIECE.CLEAR, state.equals("usable"))
              .where(PIECE.LOT_ID.eq(id).and(PIECE.NUMBER.eq(number)))
              .execute();
        });
  }

  /// One number out of the tables.
  public long count(String query) {
    return book.read(sql -> sql.fetchSingle(query).get(0, Long.class));
  }

  /// Asserts a refusal, its whole sentence and the command that helps.
  public static Refusal assertRefused(
      String sentence, @Nullable String remedy, Executable operation) {
    Refusal refusal = assertThrows(Refusal.class, operation);
    assertEquals(sentence, refusal.getMessage());
    assertEquals(remedy, refusal.remedy());
    return refusal;
  }

  /// Asserts a refusal of rows: each as `row:column: sentence [remedy]`.
  public static RowsRefused assertRowsRefused(List<String> expected, Executable operation) {
    RowsRefused refusal = assertThrows(RowsRefused.class, operation);
    assertEquals(
        expected,
        refusal.problems().stream()
            .map(
                problem ->
                    problem.row()
                        + ":"
                        + problem.column()
                        + ": "
                        + problem.refusal().getMessage()
                        + (problem.refusal().remedy() == null
                            ? ""
                            : " [" + problem.refusal().remedy() + "]"))
            .toList());
    return refusal;
  }

  @Override
  public void close() {
    book.close();
  }
}
