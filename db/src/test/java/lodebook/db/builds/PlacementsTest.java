package lodebook.db.builds;

import static lodebook.db.Workshop.BENCH;
import static lodebook.db.Workshop.LEAD;
import static lodebook.db.Workshop.PLANNER;
import static lodebook.db.Workshop.assertRefused;
import static lodebook.db.Workshop.assertRowsRefused;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.sql.Connection;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import lodebook.db.TestBook;
import lodebook.db.Workshop;
import lodebook.db.book.Act;
import lodebook.db.book.ConstraintNames;
import lodebook.db.builds.PlaceHow.Change;
import lodebook.db.layouts.Layouts;
import lodebook.db.refusal.RefusalKind;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class PlacementsTest {
  private static final PlaceHow CORRECT =
      new PlaceHow(Change.CORRECT, false, "written into the wrong row");
  private static final PlaceHow REWORK = new PlaceHow(Change.REWORK, false, "was reversed");

  /// A workshop with released layout RING and open rotors.
  private static Workshop ready(TestBook database) {
    Workshop shop = new Workshop(database);
    Layouts layouts = new Layouts(shop.book());
    layouts.importDraft(PLANNER, Workshop.inner("RING", "A"));
    layouts.release(PLANNER, "RING");
    Rotors rotors = new Rotors(shop.book());
    rotors.open(BENCH, "RING", "R-1");
    rotors.open(BENCH, "RING@A", "R-2");
    return shop;
  }

  private static double facing(int slot) {
    return Workshop.inner("RING", "A").ruleFacing(slot).degrees();
  }

  private static PlaceRow row(int slot, String magnet) {
    return new PlaceRow(slot, magnet, facing(slot));
  }

  @ParameterizedTest
  @EnumSource
  void aRingIsBuiltChangedAndCorrectedAndNothingVanishes(TestBook database) {
    try (Workshop shop = ready(database)) {
      Placements placements = new Placements(shop.book());
      Rotors rotors = new Rotors(shop.book());
      Instant then = Instant.parse("2026-05-03T10:00:00Z");
      assertEquals(
          new Placed("R-1", List.of(1, 2, 3), 3, 12, List.of()),
          placements.place(
              BENCH,
              "r-1",
              List.of(
                  row(1, "L-1/1"),
                  new PlaceRow(3, "l-1/0003", facing(3) + 4.9, then, "bo"),
                  row(2, "L-1")),
              PlaceHow.PLAIN));
      assertEquals(3, shop.count("select placed_count from lot where supplier_lot = 'FH-L-1'"));
      assertEquals(58, shop.count("select count(*) from cell_content"));

      assertEquals(
          List.of("L-1/0001"),
          placements.place(BENCH, "R-1", List.of(row(1, "L-1/9")), REWORK).takenOut());
      assertEquals(
          List.of(),
          placements
              .place(LEAD, "R-1", List.of(row(1, "L-1/3"), row(3, "L-1/9")), CORRECT)
              .takenOut());

      List<RecordedPlacement> all = rotors.show("R-1").placements();
      assertEquals(
          List.of(
              "1 L-1/0001 0.0 BE reworked was reversed",
              "1 L-1/0009 0.0 BE corrected written into the wrong row",
              "1 L-1/0003 0.0 LE stands",
              "2 L-1 270.0 BE stands",
              "3 L-1/0003 184.9 BO corrected written into the wrong row",
              "3 L-1/0009 180.0 LE stands"),
          all.stream().map(PlacementsTest::told).toList());
      assertEquals(then, all.get(4).at());
      assertEquals(
          all.get(1).id(), java.util.Objects.requireNonNull(all.get(0).ended()).supersededBy());
      assertEquals(3, shop.count("select placed_count from lot where supplier_lot = 'FH-L-1'"));
    }
  }

  private static String told(RecordedPlacement placement) {
    RecordedPlacement.Ended ended = placement.ended();
    return "%d %s %s %s %s"
        .formatted(
            placement.slot(),
            placement.magnet(),
            placement.facing().degrees(),
            placement.by(),
            ended == null ? "stands" : ended.kind() + " " + ended.why());
  }

  @ParameterizedTest
  @EnumSource
  void everyRowAtFaultIsNamedAndNothingIsPlaced(TestBook database) {
    try (Workshop shop = ready(database)) {
      Placements placements = new Placements(shop.book());
      placements.place(BENCH, "R-2", List.of(row(1, "L-1/7"), row(2, "L-1/8")), PlaceHow.PLAIN);
      shop.pieceState("L-1", 5, "held");
      shop.pieceState("L-1", 6, "scrapped");
      assertRowsRefused(
          List.of(
              "0:slot: rotor R-2 has no slot 13; its slots are 1 to 12 [lodebook rotor show R-2]",
              "1:slot: slot 1 of rotor R-2 holds L-1/0007 already; --rework says that the magnet"
                  + " was changed, --correct that the record was wrong"
                  + " [lodebook place R-2 placements.csv --rework --why TEXT]",
              "2:facing_deg: slot 3 of rotor R-2 would face 0°, but RING@A says 180°; only a lead"
                  + " may record that as a deviation"
                  + " [lodebook place R-2 placements.csv --deviation --why TEXT]",
              "3:piece: slot 4 of rotor R-2 takes magnet type BLK-4, but lot L-2 is of type BLK-5"
                  + " [lodebook lot list]",
              "4:piece: piece L-1/0005 is on hold and cannot be placed"
                  + " [lodebook piece show L-1/0005]",
              "5:piece: piece L-1/0006 is scrapped and cannot be placed"
                  + " [lodebook piece show L-1/0006]",
              "6:piece: there is no piece L-1/0031; an unmeasured magnet is named by its lot alone:"
                  + " L-1 [lodebook piece list L-1]",
              "7:piece: piece L-1/0008 stands in rotor R-2, slot 2 [lodebook rotor show R-2]",
              "8:piece: there is no lot L-9 [lodebook lot list]",
              "9:piece: GM-1 is a meter, not a lot [lodebook lot list]",
              "10:by: nobody here signs as XX [lodebook person list]"),
          () ->
              placements.place(
                  BENCH,
                  "R-2",
                  List.of(
                      new PlaceRow(13, "L-1/1", 0),
                      row(1, "L-1/2"),
                      new PlaceRow(3, "L-1/3", 0),
                      row(4, "L-2/1"),
                      row(5, "L-1/5"),
                      row(6, "L-1/6"),
                      row(7, "L-1/31"),
                      row(8, "L-1/8"),
                      row(9, "L-9/1"),
                      row(10, "GM-1"),
                      new PlaceRow(11, "L-1/4", facing(11), null, "XX")),
                  PlaceHow.PLAIN));
      assertEquals(2, shop.count("select count(*) from placement"));
      assertEquals(
          RefusalKind.WRONG_INPUT,
          assertRowsRefused(
                  List.of(
                      "1:slot: slot 1 stands twice in the file",
                      "2:piece: piece l-1/0001 stands twice in the file",
                      "3:piece: \"L-1/x\" names no magnet: write LOT/NUMBER for a piece, or LOT for"
                          + " an unmeasured magnet of it [lodebook lot list]"),
                  () ->
                      placements.place(
                          BENCH,
                          "R-1",
                          List.of(
                              row(1, "L-1/1"), row(1, "L-1/2"), row(3, "l-1/01"), row(4, "L-1/x")),
                          PlaceHow.PLAIN))
              .kind());
      refusalsOfTheWhole(shop, placements);
    }
  }

  private static void refusalsOfTheWhole(Workshop shop, Placements placements) {
    assertRefused(
        "say with --why for what reason the record of rotor R-1 is changed, or differs from its"
            + " layout",
        "lodebook help place",
        () ->
            placements.place(
                LEAD, "R-1", List.of(row(1, "L-1")), new PlaceHow(Change.NONE, true, " ")));
    PlaceHow deviation = new PlaceHow(Change.NONE, true, "the customer wants it so");
    assertRefused(
        "BE is bench and may not do \"place --deviation\"; it needs lead",
        "lodebook person list",
        () -> placements.place(BENCH, "R-1", List.of(new PlaceRow(1, "L-1", 180)), deviation));
    placements.place(LEAD, "R-1", List.of(new PlaceRow(1, "L-1", 180)), deviation);
    assertEquals(
        List.of("the customer wants it so"),
        new Rotors(shop.book())
            .show("R-1").standing().stream()
                .filter(RecordedPlacement::deviation)
                .map(RecordedPlacement::why)
                .toList());
    assertRowsRefused(
        List.of(
            "0:slot: slot 1 of rotor R-2 was recorded by BE; only a lead corrects what another"
                + " person recorded [lodebook person list]"),
        () -> placements.place(Act.by("BO"), "R-2", List.of(row(1, "L-1/2")), CORRECT));
    assertRefused(
        "there is no rotor R-3",
        "lodebook rotor list",
        () -> placements.place(BENCH, "R-3", List.of(row(1, "L-1")), PlaceHow.PLAIN));
  }

  @ParameterizedTest
  @EnumSource
  void lotsThatMayNotBeUsedAndLotsUsedUpAreRefused(TestBook database) {
    try (Workshop shop = ready(database)) {
      Placements placements = new Placements(shop.book());
      placements.place(BENCH, "R-1", List.of(row(1, "L-1"), row(2, "L-1/2")), PlaceHow.PLAIN);
      for (List<String> state :
          List.of(
              List.of(
                  "awaiting",
                  "lot L-1 awaits inspection; none of it can be placed before it is accepted"
                      + " [lodebook lot accept L-1 --why TEXT]"),
              List.of(
                  "rejected",
                  "lot L-1 is rejected; none of it can be placed [lodebook lot show L-1]"),
              List.of(
                  "held",
                  "lot L-1 is on hold; none of it can be placed"
                      + " [lodebook lot free L-1 --why TEXT]"))) {
        shop.book()
            .run(
                LEAD,
                lodebook.db.rights.Permission.LEAD,
                "test",
                writing -> writing.sql().execute("update live_slot set stood_before_hold = true"));
        shop.lotState("L-1", state.getFirst());
        assertRowsRefused(
            List.of("0:piece: " + state.getLast()),
            () -> placements.place(BENCH, "R-1", List.of(row(3, "L-1")), PlaceHow.PLAIN));
      }
      placements.place(BENCH, "R-1", List.of(row(1, "L-1"), row(2, "L-1/2")), CORRECT);
      shop.lotState("L-1", "accepted");
      shop.book()
          .run(
              LEAD,
              lodebook.db.rights.Permission.LEAD,
              "test",
              writing ->
                  writing
                      .sql()
                      .execute("update lot set piece_count = 4 where supplier_lot = 'FH-L-1'"));
      assertRowsRefused(
          List.of(
              "2:piece: lot L-1 has only 2 magnets left that are neither placed nor scrapped"
                  + " [lodebook lot show L-1]"),
          () ->
              placements.place(
                  BENCH,
                  "R-1",
                  List.of(row(3, "L-1"), row(4, "L-1/4"), row(5, "L-1"), row(6, "L-1")),
                  PlaceHow.PLAIN));
    }
  }

  @ParameterizedTest
  @EnumSource
  void aScrappedRotorTakesItsMagnetsWithIt(TestBook database) {
    try (Workshop shop = ready(database)) {
      Placements placements = new Placements(shop.book());
      Rotors rotors = new Rotors(shop.book());
      placements.place(BENCH, "R-1", List.of(row(1, "L-1/1"), row(2, "L-1")), PlaceHow.PLAIN);
      assertRefused(
          "BE is bench and may not do \"rotor scrap\"; it needs lead",
          "lodebook person list",
          () -> rotors.scrap(BENCH, "R-1", "cracked"));
      assertRefused(
          "say with --why for what reason rotor R-1 is scrapped",
          "lodebook rotor scrap R-1 --why TEXT",
          () -> rotors.scrap(LEAD, "R-1", ""));
      assertEquals("scrapped", rotors.scrap(LEAD, "R-1", "cracked").state());
      assertEquals(0, rotors.show("R-1").standing().size());
      assertEquals(
          List.of("1 L-1/0001 0.0 BE scrapped cracked", "2 L-1 270.0 BE scrapped cracked"),
          rotors.show("R-1").placements().stream().map(PlacementsTest::told).toList());
      assertEquals(2, shop.count("select max(scrapped_count) from lot"));
      assertEquals(0, shop.count("select max(placed_count) from lot"));
      assertRefused(
          "rotor R-1 is scrapped already",
          "lodebook rotor show R-1",
          () -> rotors.scrap(LEAD, "R-1", "again"));
      assertRefused(
          "rotor R-1 is scrapped",
          "lodebook rotor show R-1",
          () -> placements.place(BENCH, "R-1", List.of(row(3, "L-1")), PlaceHow.PLAIN));
      assertRowsRefused(
          List.of(
              "0:piece: piece L-1/0001 is scrapped and cannot be placed"
                  + " [lodebook piece show L-1/0001]"),
          () -> placements.place(BENCH, "R-2", List.of(row(1, "L-1/1")), PlaceHow.PLAIN));
      assertEquals(
          List.of("R-1 scrapped 0/12", "R-2 open 0/12"),
          rotors.list().stream()
              .map(r -> r.code() + " " + r.state() + " " + r.filled() + "/" + r.slots())
              .toList());
      new Layouts(shop.book()).importDraft(PLANNER, Workshop.inner("RING", "B"));
      assertRefused(
          "RING@B is a draft; rotors and gear models need a released layout",
          "lodebook layout release RING@B",
          () -> rotors.open(BENCH, "RING@B", "R-4"));
      assertRefused(
          "R-2 is taken already: it is a rotor",
          "lodebook trace R-2",
          () -> rotors.open(BENCH, "RING", "r-2"));
    }
  }

  @ParameterizedTest
  @EnumSource
  void theSchemaRefusesWhatTheOperationsRefuse(TestBook database) throws SQLException {
    Workshop shop = ready(database);
    try (shop) {
      new Placements(shop.book())
          .place(BENCH, "R-1", List.of(row(1, "L-1/1"), row(2, "L-1/2")), PlaceHow.PLAIN);
    }
    String slot1 = "(select min(placement_id) from live_slot)";
    String slot2 = "(select max(placement_id) from live_slot)";
    List<List<String>> tries = new ArrayList<>();
    tries.add(
        List.of(
            "pk_live_placement",
            "insert into live_placement select piece_id, "
                + slot2
                + ", true, false from live_placement where placement_id = "
                + slot1));
    tries.add(
        List.of(
            "pk_live_slot",
            "insert into live_slot select rotor_id, 1, placement_id, lot_id, true, false"
                + " from live_slot where slot = 2"));
    tries.add(
        List.of(
            "ck_live_slot_lot_clear",
            "update lot set state = 'held', state_before_hold = 'accepted', clear = false"));
    tries.add(
        List.of(
            "ck_live_placement_piece_clear",
            "update piece set state = 'held', clear = false where number = 1"));
    tries.add(List.of("ck_lot_count", "update lot set placed_count = 41"));
    tries.add(
        List.of(
            "pk_placement_end",
            "insert into placement_end select id, 'removed', cast(null as bigint), 'x', person_id, stated_at,"
                + " recorded_at, history_sequence from placement union all select id, 'removed',"
                + " null, 'x', person_id, stated_at, recorded_at, history_sequence from"
                + " placement"));
    try (Connection raw = database.raw(shop.address());
        Statement statement = raw.createStatement()) {
      for (List<String> one : tries) {
        SQLException refused =
            assertThrows(SQLException.class, () -> statement.execute(one.getLast()));
        String message = String.valueOf(refused.getMessage());
        assertTrue(ConstraintNames.in(message).anyMatch(one.getFirst()::equals), message);
      }
    }
  }
}
