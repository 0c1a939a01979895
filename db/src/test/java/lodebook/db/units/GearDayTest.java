package lodebook.db.units;

import static lodebook.db.Workshop.BENCH;
import static lodebook.db.Workshop.LEAD;
import static lodebook.db.Workshop.PLANNER;
import static lodebook.db.Workshop.assertRefused;
import static lodebook.db.Workshop.assertRowsRefused;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Member;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.plan.Candidate;
import lodebook.assembly.plan.Placement;
import lodebook.assembly.plan.RotorPlan;
import lodebook.assembly.survey.Verdict;
import lodebook.db.TestBook;
import lodebook.db.Workshop;
import lodebook.db.book.Book;
import lodebook.db.builds.Batches;
import lodebook.db.builds.PlaceHow;
import lodebook.db.builds.PlaceRow;
import lodebook.db.builds.Placements;
import lodebook.db.builds.PlanDraft;
import lodebook.db.builds.PlanOutdated;
import lodebook.db.builds.PlanStock;
import lodebook.db.builds.PlannedSlot;
import lodebook.db.builds.Plans;
import lodebook.db.builds.Rotor;
import lodebook.db.builds.Rotors;
import lodebook.db.keep.Verification;
import lodebook.db.layouts.GearDraft;
import lodebook.db.layouts.Gears;
import lodebook.db.layouts.Layouts;
import lodebook.db.surveys.FluxUnit;
import lodebook.db.surveys.SurveyRow;
import lodebook.db.surveys.Surveys;
import lodebook.db.surveys.Verdicts;
import lodebook.db.trace.TraceNode;
import lodebook.db.trace.Traces;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/// From a gear model to a unit that comes back, with each refusal on the way.
class GearDayTest {
  private static GearDraft gear(int pieces) {
    return new GearDraft(
        "GEAR", "A", "IN@A", "OUT@A", pieces, Member.OUTER, 12.7e-3, 17e-3, 10e-3, null);
  }

  private static Workshop withLayouts(TestBook database) {
    Workshop shop = new Workshop(database);
    Layouts layouts = new Layouts(shop.book());
    layouts.importDraft(PLANNER, Workshop.inner("IN", "A"));
    layouts.importDraft(PLANNER, Workshop.outer("OUT", "A"));
    return shop;
  }

  private static void release(Book book) {
    new Layouts(book).release(PLANNER, "IN");
    new Layouts(book).release(PLANNER, "OUT");
    new Gears(book).importDraft(PLANNER, gear(7));
    new Gears(book).release(PLANNER, "GEAR");
  }

  @ParameterizedTest
  @EnumSource
  void aGearModelPinsReleasedLayoutsAndABatchMakesItsRotors(TestBook database) {
    try (Workshop shop = withLayouts(database)) {
      Gears gears = new Gears(shop.book());
      Batches batches = new Batches(shop.book());
      assertEquals(
          3,
          assertRefused(
                  "gear model GEAR rev A: 8 modulator pieces, but 3 and 4 pole pairs need 7; set"
                      + " modulatorPieces to 7",
                  null,
                  () -> gears.importDraft(PLANNER, gear(8)))
              .kind()
              .exitCode());
      gears.importDraft(PLANNER, gear(7));
      assertRefused(
          "GEAR@A names layout IN@A, which is a draft",
          "lodebook layout release IN@A",
          () -> gears.release(PLANNER, "GEAR"));
      assertRefused(
          "GEAR@A is a draft; batches and units need a released gear model",
          "lodebook gear release GEAR@A",
          () -> batches.open(PLANNER, "B-1", "GEAR", 2, null));
      release(shop.book());
      assertRefused(
          "GEAR@A is released and never changes; give the changed gear model a new revision",
          "lodebook gear show GEAR@A",
          () -> gears.importDraft(PLANNER, gear(7)));
      assertRefused(
          "gear model GEAR has no draft to release",
          "lodebook gear show GEAR",
          () -> gears.release(PLANNER, "GEAR"));
      assertEquals(
          List.of(
              "B-1-0001 inner 1 IN@A",
              "B-1-0002 outer 1 OUT@A",
              "B-1-0003 inner 2 IN@A",
              "B-1-0004 outer 2 OUT@A"),
          told(batches.open(PLANNER, "B-1", "GEAR", 2, null).rotors()));
      new Rotors(shop.book()).open(BENCH, "IN", "r-7");
      assertEquals(
          List.of("R-008 inner 1 IN@A", "R-009 outer 1 OUT@A"),
          told(batches.open(PLANNER, "B-2", "GEAR@A", 1, "R-{001}").rotors()));
      assertRefused(
          "\"R-1\" is no pattern of serials: one number in braces, such as R-{0001}",
          "lodebook help batch open",
          () -> batches.open(PLANNER, "B-3", "GEAR", 1, "R-1"));
      assertRefused(
          "B-2 is taken already: it is a batch",
          "lodebook trace B-2",
          () -> batches.open(PLANNER, "b-2", "GEAR", 1, null));
    }
  }

  @ParameterizedTest
  @EnumSource
  void aBatchTakesOneMoreRotorOfItsLayouts(TestBook database) {
    try (Workshop shop = withLayouts(database)) {
      release(shop.book());
      new Layouts(shop.book()).importDraft(PLANNER, Workshop.inner("OTHER", "A"));
      new Layouts(shop.book()).release(PLANNER, "OTHER");
      new Batches(shop.book()).open(PLANNER, "B-1", "GEAR", 1, null);
      Rotors rotors = new Rotors(shop.book());
      rotors.open(BENCH, "OUT", "R-9", "b-1");
      assertEquals(
          List.of("B-1-0001 inner 1 IN@A", "B-1-0002 outer 1 OUT@A", "R-9 outer null OUT@A"),
          told(new Batches(shop.book()).show("B-1").rotors()));
      assertRefused(
          "rotor R-10 would be built to OTHER@A; batch B-1 of GEAR@A takes IN@A and OUT@A",
          "lodebook batch show B-1",
          () -> rotors.open(BENCH, "OTHER", "R-10", "B-1"));
      assertRefused(
          "there is no batch B-2",
          "lodebook batch list",
          () -> rotors.open(BENCH, "IN", "R-10", "B-2"));
      assertEquals(List.of(), Verification.of(shop.book(), null).faults());
    }
  }

  private static List<String> told(List<Rotor> rotors) {
    return rotors.stream()
        .map(r -> r.code() + " " + r.ring() + " " + r.gearNumber() + " " + r.layout())
        .toList();
  }

  /// A plan of the first free pieces in the order of their numbers.
  private static PlanDraft draft(PlanStock stock, String rotor, int from) {
    Layout layout = stock.rings().getFirst().design().layout();
    List<Placement> placements = new ArrayList<>();
    for (int slot = 1; slot <= layout.slots(); slot++) {
      Candidate piece = stock.candidates().get(from + slot - 1);
      placements.add(
          new Placement(
              slot, piece.piece(), piece.lot(), layout.ruleFacing(slot), piece.strength(), false));
    }
    RotorPlan plan =
        new RotorPlan(placements, 1, 0.003, null, 0.01, 0.42, 0.42, true, List.of("L-1"), null);
    return new PlanDraft(rotor, plan, Map.of(), Map.of(3, "lifts"), "--from L-1", "0.1.0");
  }

  @ParameterizedTest
  @EnumSource
  void aPlanKeepsItsPiecesAndIsCheckedAgainWhenStored(TestBook database) {
    try (Workshop shop = withLayouts(database)) {
      release(shop.book());
      new Rotors(shop.book()).open(BENCH, "IN", "R-1");
      new Rotors(shop.book()).open(BENCH, "IN", "R-2");
      Plans plans = new Plans(shop.book());
      PlanStock stock = plans.stockFor(List.of("r-1"), List.of("l-1"));
      assertEquals(30, stock.candidates().size());
      assertEquals(10, stock.unmeasured().getFirst().count());
      assertRefused(
          "BE is bench and may not do \"plan\"; it needs planner or lead",
          "lodebook person list",
          () -> plans.store(BENCH, stock, List.of(draft(stock, "R-1", 0))));
      plans.store(PLANNER, stock, List.of(draft(stock, "R-1", 0)));
      PlannedSlot third = plans.show("R-1").slots().get(2);
      assertEquals(
          "L-1/0003 T-1 A3 lifts planned",
          third.magnet()
              + " "
              + third.tray()
              + " "
              + third.cell()
              + " "
              + third.remark()
              + " "
              + third.state());
      assertEquals(18, plans.stockFor(List.of("R-2"), List.of("L-1")).candidates().size());
      assertEquals(30, plans.stockFor(List.of("R-1"), List.of("L-1")).candidates().size());

      PlanOutdated kept =
          assertThrows(
              PlanOutdated.class,
              () -> plans.store(PLANNER, stock, List.of(draft(stock, "R-2", 11))));
      assertEquals(
          "piece L-1/0012 was taken meanwhile: it is kept for rotor R-1 by its plan",
          kept.getMessage());
      assertRowsRefused(
          List.of(
              "0:piece: piece L-1/0001 is kept for rotor R-1 by its plan"
                  + " [lodebook plan R-1 --drop]"),
          () ->
              new Placements(shop.book())
                  .place(BENCH, "R-2", List.of(new PlaceRow(1, "L-1/1", 0)), PlaceHow.PLAIN));
      new Placements(shop.book())
          .place(BENCH, "R-2", List.of(new PlaceRow(1, "L-1/20", 0)), PlaceHow.PLAIN);
      assertEquals(
          "piece L-1/0020 was placed meanwhile: it stands in rotor R-2, slot 1",
          assertThrows(
                  PlanOutdated.class,
                  () -> plans.store(PLANNER, stock, List.of(draft(stock, "R-1", 15))))
              .getMessage());
      shop.pieceState("L-1", 5, "held");
      assertEquals(
          List.of("L-1/0005 on hold"),
          plans.show("R-1").spoilt().stream().map(s -> s.magnet() + " " + s.state()).toList());
      plans.drop(PLANNER, List.of("R-1"));
      assertEquals(0, shop.count("select count(*) from reserved_piece"));
      assertRefused(
          "rotor R-1 has no plan", "lodebook plan R-1 --from LOT[,LOT…]", () -> plans.show("R-1"));
      shop.lotState("L-2", "awaiting");
      assertRefused(
          "lot L-2 awaits inspection; it cannot be planned before it is accepted",
          "lodebook lot accept L-2 --why TEXT",
          () -> plans.stockFor(List.of("R-1"), List.of("L-2")));
    }
  }

  private static void fill(Book book, String rotor, String lot, Layout layout) {
    List<PlaceRow> rows = new ArrayList<>();
    for (int slot = 1; slot <= layout.slots(); slot++) {
      rows.add(new PlaceRow(slot, lot + "/" + slot, layout.ruleFacing(slot).degrees()));
    }
    new Placements(book).place(BENCH, rotor, rows, PlaceHow.PLAIN);
  }

  private static String survey(Book book, String rotor) {
    return new Surveys(book)
        .importReadings(
            BENCH,
            rotor,
            List.of(new SurveyRow(1, Spot.CENTRE, Component.RADIAL, 400, FluxUnit.MILLITESLA)),
            "GM-1",
            null)
        .code();
  }

  @ParameterizedTest
  @EnumSource
  void aUnitIsAssembledFromPassingRotorsComesBackAndIsTraced(TestBook database) {
    try (Workshop shop = withLayouts(database)) {
      Book book = shop.book();
      release(book);
      new Batches(book).open(PLANNER, "B-1", "GEAR", 1, "R-{1}");
      Units units = new Units(book);
      assertRefused(
          "rotor R-1 has magnets in 0 of its 12 slots only",
          "lodebook rotor show R-1",
          () -> units.assemble(PLANNER, "U-1", "GEAR", "R-1", "R-2", null));
      fill(book, "R-1", "L-1", Workshop.inner("IN", "A"));
      fill(book, "R-2", "L-2", Workshop.outer("OUT", "A"));
      assertRefused(
          "rotor R-1 was never surveyed",
          "lodebook survey import R-1 survey.csv --meter METER",
          () -> units.assemble(PLANNER, "U-1", "GEAR", "R-1", "R-2", null));
      String first = survey(book, "R-1");
      assertRefused(
          "the latest survey of rotor R-1, S-1, was not checked since it or the rotor changed",
          "lodebook survey check S-1",
          () -> units.assemble(PLANNER, "U-1", "GEAR", "R-1", "R-2", null));
      Verdicts.record(book, first, Verdict.CANNOT_TELL);
      assertRefused(
          "the latest survey of rotor R-1, S-1, does not pass: cannot tell",
          "lodebook survey check S-1",
          () -> units.assemble(PLANNER, "U-1", "GEAR", "R-1", "R-2", null));
      Verdicts.record(book, first, Verdict.PASS);
      Verdicts.record(book, survey(book, "R-2"), Verdict.PASS);
      assertRefused(
          "rotor R-2 is built to OUT@A; the inner rotor of GEAR@A is built to IN@A",
          "lodebook rotor list",
          () -> units.assemble(PLANNER, "U-1", "GEAR", "R-2", "R-1", null));
      assertRefused(
          "unit U-1 cannot have rotor R-1 inside and outside",
          "lodebook rotor list",
          () -> units.assemble(PLANNER, "U-1", "GEAR", "R-1", "r-1", null));
      assertRefused(
          "PL is planner and may not do \"unit assemble --override\"; it needs lead",
          "lodebook person list",
          () -> units.assemble(PLANNER, "U-1", "GEAR", "R-1", "R-2", "trust me"));
      GearUnit unit = units.assemble(PLANNER, "U-1", "GEAR", "R-1", "R-2", null);
      assertEquals("B-1 assembled", unit.batch() + " " + unit.state());
      assertRefused(
          "rotor R-1 is in unit U-1",
          "lodebook unit show U-1",
          () -> units.assemble(LEAD, "U-2", "GEAR", "R-1", "R-2", "again"));
      units.takeBack(BENCH, "u-1", "slips at half torque");
      assertEquals(
          List.of("assembled ", "returned slips at half torque"),
          units.show("U-1").events().stream().map(e -> e.state() + " " + e.why()).toList());
      assertRefused(
          "unit U-1 is returned already",
          "lodebook unit show U-1",
          () -> units.takeBack(BENCH, "U-1", "again"));
      traced(new Traces(book));
      new Rotors(book).open(BENCH, "IN", "R-3");
      new Placements(book)
          .place(
              BENCH,
              "R-3",
              List.of(new PlaceRow(1, "L-1/30", 0), new PlaceRow(2, "L-1", 270.5)),
              PlaceHow.PLAIN);
      new Rotors(book).scrap(LEAD, "R-3", "cracked");
      assertEquals(List.of(), Verification.of(book, null).faults());
    }
  }

  private static void traced(Traces traces) {
    TraceNode inner = traces.trace("u-1").madeFrom().getFirst();
    assertEquals("R-1 rotor 12", inner.code() + " " + inner.kind() + " " + inner.branches().size());
    assertEquals(
        List.of("L-1/0001 piece", "L-1 lot", "FH-L-1 supplier lot"), chain(inner.branches()));
    assertEquals(
        List.of("L-1 lot", "L-1/0001 piece", "R-1 rotor", "U-1 unit"),
        chain(traces.trace("fh-l-1").wentInto()));
    assertEquals(List.of("R-1 rotor", "U-1 unit"), chain(traces.trace("l-1/1").wentInto()));
    assertEquals(
        List.of("S-1 survey", "R-1 rotor", "U-1 unit"), chain(traces.trace("GM-1").wentInto()));
    assertEquals(List.of("U-1 unit"), chain(traces.trace("B-1").wentInto()));
    assertEquals("returned", traces.trace("R-2").wentInto().getFirst().state());
    assertRefused(
        "nothing in the book has the number X-1", "lodebook history", () -> traces.trace("X-1"));
    assertRefused(
        "there is no piece L-1/0031", "lodebook piece list L-1", () -> traces.trace("L-1/31"));
  }

  private static List<String> chain(List<TraceNode> nodes) {
    List<String> chain = new ArrayList<>();
    List<TraceNode> at = nodes;
    while (!at.isEmpty()) {
      chain.add(at.getFirst().code() + " " + at.getFirst().kind());
      at = at.getFirst().branches();
    }
    return chain;
  }
}
