package lodebook.db.book;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.sql.Connection;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.List;
import lodebook.db.TestBook;
import lodebook.db.TestShop;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import org.jooq.exception.DataAccessException;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

/// The rules that the tables hold, tried with bare SQL: each is refused by the constraint that is
/// meant, and the constraint has its sentence.
class ConstraintTest {
  private static final String STAMP = "timestamp with time zone '2026-05-04 08:00:00+00', 1";
  private static final String TWICE_STAMP =
      "timestamp with time zone '2026-05-04 08:00:00+00', " + STAMP;

  /// A lot's pieces 901 and 902, a released layout 920, a draft 921, rotors 930 and 931, piece 901
  /// in slot 1 of rotor 930.
  private static final List<String> SHOP =
      List.of(
          "insert into piece values (901, %lot, 1, 'usable', true, null, null, " + STAMP + ")",
          "insert into piece values (902, %lot, 2, 'usable', true, null, null, " + STAMP + ")",
          "insert into code values (910, 'stir-in', 'STIR-IN', 'layout')",
          "insert into layout values (910, " + STAMP + ")",
          layout(920, "A"),
          layout(921, "B"),
          release(920, "A"),
          "insert into code values (930, 'r-1', 'R-1', 'rotor')",
          "insert into code values (931, 'r-2', 'R-2', 'rotor')",
          "insert into rotor values (930, 920, null, null, null, 'open', " + STAMP + ")",
          "insert into rotor values (931, 920, null, null, null, 'open', " + STAMP + ")",
          placement(940, 930, 1, "901"),
          placement(941, 931, 1, "901"),
          placement(942, 930, 1, "902"),
          placement(943, 930, 2, "902"),
          "insert into live_slot values (930, 1, 940, %lot, true, false)",
          "insert into live_placement values (901, 940, true, false)");

  /// A rule: what must have happened before, what is refused, by which constraint, in which words.
  record Rule(String constraint, String sentence, String refused, List<String> before) {
    Rule(String constraint, String sentence, String refused, String... before) {
      this(constraint, sentence, refused, List.of(before));
    }

    @Override
    public String toString() {
      return constraint;
    }
  }

  static List<Rule> rules() {
    return List.of(
        new Rule(
            "pk_live_placement",
            "the piece stands in another slot",
            "insert into live_placement values (901, 941, true, false)",
            "insert into live_slot values (931, 1, 941, %lot, true, false)"),
        new Rule(
            "pk_live_slot",
            "the slot is filled",
            "insert into live_slot values (930, 1, 942, %lot, true, false)"),
        new Rule(
            "fk_layout_release_all",
            "a released layout revision never changes; import a new revision",
            "update layout_revision set slot_radius_metres = 0.011 where id = 920"),
        new Rule(
            "fk_layout_release_all",
            "a released layout revision never changes; import a new revision",
            "update layout_release set adhesive = 'none' where id = 920"),
        new Rule(
            "fk_layout_release_all",
            "a released layout revision never changes; import a new revision",
            "delete from layout_revision where id = 920"),
        new Rule(
            "fk_live_slot_lot_clear",
            "the lot is not accepted, or on hold: none of it can be placed",
            "insert into live_slot values (930, 2, 943, %lot, true, false)",
            "update live_slot set stood_before_hold = true",
            "update lot set state = 'held', state_before_hold = 'accepted', clear = false"),
        new Rule(
            "ck_live_slot_lot_clear",
            "the lot is not accepted, or on hold: none of it can be placed",
            "insert into live_slot values (930, 2, 943, %lot, false, false)",
            "update live_slot set stood_before_hold = true",
            "update lot set state = 'held', state_before_hold = 'accepted', clear = false"),
        new Rule(
            "fk_live_placement_piece_clear",
            "the piece is on hold or scrapped and cannot be placed",
            "insert into live_placement values (902, 943, true, false)",
            "insert into live_slot values (930, 2, 943, %lot, true, false)",
            "update piece set state = 'held', clear = false where id = 902"),
        new Rule(
            "ck_live_placement_piece_clear",
            "the piece is on hold or scrapped and cannot be placed",
            "update piece set state = 'held', clear = false where id = 901"),
        new Rule(
            "fk_rotor_layout",
            "the layout revision is not released",
            "update rotor set layout_revision_id = 921 where id = 930"),
        new Rule(
            "ck_lot_count",
            "placed and scrapped pieces together would exceed what the lot counts",
            "update lot set placed_count = 40, scrapped_count = 21"),
        new Rule(
            "uq_piece_number",
            "there is a piece of that number in the lot already",
            "insert into piece values (903, %lot, 2, 'usable', true, null, null, " + STAMP + ")"),
        new Rule(
            "uq_code_folded",
            "that number is taken already",
            "insert into code values (903, 'r-1', 'r-1', 'tray')"),
        new Rule(
            "uq_person_initials",
            "somebody signs with these initials already",
            "update person set folded = 'le' where initials = 'BE'"),
        new Rule(
            "uq_grade_name",
            "there is a grade of that name already",
            "update grade set folded = 'n35' where name = 'N42'"),
        new Rule(
            "uq_magnet_type_name",
            "there is a magnet type of that name already",
            "insert into magnet_type select 905, folded, name, shape, thickness_metres,"
                + " width_metres, length_metres, diameter_metres, inner_diameter_metres,"
                + " arc_degrees, grade_id, tolerance_metres, coating, recoil_permeability,"
                + " magnetisation_degrees, recorded_at, history_sequence from magnet_type"),
        new Rule(
            "pk_cell_content",
            "the cell holds another piece",
            "insert into cell_content values (950, 'A1', 902)",
            "insert into code values (950, 't-1', 'T-1', 'tray')",
            "insert into tray values (950, " + STAMP + ")",
            "insert into cell_content values (950, 'A1', 901)"),
        new Rule(
            "uq_cell_content_piece",
            "the piece lies in another cell",
            "insert into cell_content values (950, 'A2', 901)",
            "insert into code values (950, 't-1', 'T-1', 'tray')",
            "insert into tray values (950, " + STAMP + ")",
            "insert into cell_content values (950, 'A1', 901)"),
        new Rule(
            "ck_piece_reading_north",
            "a reading over the north face is not negative: south face, or the sign inverted?",
            reading(951, "-0.1", "0")),
        new Rule(
            "uq_piece_reading_once",
            "that reading is in the book already",
            reading(952, "0.1", "0"),
            reading(951, "0.1", "0")),
        new Rule(
            "pk_placement_end",
            "the placement was superseded already",
            "insert into placement_end values (940, 'reworked', null, 'x', %person, "
                + TWICE_STAMP
                + ")",
            "insert into placement_end values (940, 'corrected', null, 'x', %person, "
                + TWICE_STAMP
                + ")"),
        new Rule(
            "uq_layout_revision_name", "the layout has that revision already", layout(922, "B")));
  }

  @ParameterizedTest
  @MethodSource("rules")
  void onH2(Rule rule) throws SQLException {
    tryRule(TestBook.EMBEDDED, rule);
  }

  @ParameterizedTest
  @MethodSource("rules")
  void onPostgresql(Rule rule) throws SQLException {
    tryRule(TestBook.SERVER, rule);
  }

  @ParameterizedTest
  @EnumSource
  void aLotWithPlacedPiecesIsHeldAndFreed(TestBook database) throws SQLException {
    BookAddress place = shop(database);
    run(
        database,
        place,
        List.of(
            "update live_slot set stood_before_hold = true",
            "update lot set state = 'held', state_before_hold = 'accepted', clear = false",
            "update lot set state = 'accepted', state_before_hold = null, clear = true",
            "update live_slot set stood_before_hold = false"));
    try (Connection connection = database.raw(place);
        Statement statement = connection.createStatement();
        var rows = statement.executeQuery("select lot_clear from live_slot")) {
      assertEquals(true, rows.next() && rows.getBoolean(1));
    }
  }

  private static void tryRule(TestBook database, Rule rule) throws SQLException {
    BookAddress place = shop(database);
    run(database, place, rule.before());
    SQLException failure =
        assertThrows(
            SQLException.class,
            () -> run(database, place, List.of(rule.refused())),
            rule.refused());
    String message = String.valueOf(failure.getMessage());
    assertEquals(
        rule.constraint(), ConstraintNames.in(message).findFirst().orElse(""), () -> message);
    try (Book book = Book.open(place, TestBook.visit())) {
      RuntimeException explained =
          assertThrows(
              RuntimeException.class,
              () ->
                  book.run(
                      TestShop.LEAD,
                      Permission.LEAD,
                      "test",
                      writing -> writing.sql().execute(filled(rule.refused(), place, database))));
      assertEquals(Refusal.class, explained.getClass(), () -> String.valueOf(explained));
      assertEquals(rule.sentence(), explained.getMessage());
      assertEquals(DataAccessException.class.isInstance(explained.getCause()), true);
    }
  }

  private static BookAddress shop(TestBook database) throws SQLException {
    BookAddress place = database.newShop();
    run(database, place, SHOP);
    return place;
  }

  private static void run(TestBook database, BookAddress place, List<String> statements)
      throws SQLException {
    try (Connection connection = database.raw(place);
        Statement statement = connection.createStatement()) {
      for (String text : statements) {
        statement.execute(filled(connection, text));
      }
    }
  }

  private static String filled(String text, BookAddress place, TestBook database) {
    if (!text.contains("%")) {
      return text;
    }
    if (database == TestBook.EMBEDDED) {
      return text.replace("%lot", "(select min(id) from lot)")
          .replace("%type", "(select min(id) from magnet_type)")
          .replace("%person", "(select min(id) from person)");
    }
    try (Connection connection = database.raw(place)) {
      return filled(connection, text);
    } catch (SQLException failure) {
      throw new IllegalStateException(failure);
    }
  }

  private static String filled(Connection connection, String text) throws SQLException {
    return text.replace("%lot", id(connection, "lot"))
        .replace("%type", id(connection, "magnet_type"))
        .replace("%person", id(connection, "person"));
  }

  private static String id(Connection connection, String table) throws SQLException {
    try (Statement statement = connection.createStatement();
        var rows = statement.executeQuery("select min(id) from " + table)) {
      rows.next();
      return rows.getString(1);
    }
  }

  private static String layout(int id, String revision) {
    return "insert into layout_revision values (%d, 910, '%s', ".formatted(id, revision)
        + CONTENT
        + ", "
        + STAMP
        + ")";
  }

  private static String release(int id, String revision) {
    return "insert into layout_release values (%d, 910, '%s', ".formatted(id, revision)
        + CONTENT
        + ", %person, "
        + STAMP
        + ")";
  }

  private static final String CONTENT =
      "3, 4, 'out', 'clockwise', 0, 0, 0.01, %type, %type, 0.013, 0.013, 0, 'centre',"
          + " 'radial,tangential', 0.00005, 1, 0.00015, 2, 'epoxy', 5, false, 'face', 0.03";

  private static String placement(int id, int rotor, int slot, String piece) {
    return "insert into placement values (%d, %d, %d, ".formatted(id, rotor, slot)
        + "%lot, "
        + piece
        + ", 90, false, '', %person, "
        + TWICE_STAMP
        + ")";
  }

  private static String reading(int id, String flux, String repeat) {
    return "insert into piece_reading values ("
        + id
        + ", 901, "
        + flux
        + ", 0.001, null, null, %person, 'ab', "
        + repeat
        + ", false, "
        + TWICE_STAMP
        + ")";
  }
}
