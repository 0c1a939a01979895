package lodebook.db.surveys;

import static lodebook.db.Workshop.BENCH;
import static lodebook.db.Workshop.LEAD;
import static lodebook.db.Workshop.PLANNER;
import static lodebook.db.Workshop.assertRefused;
import static lodebook.db.Workshop.assertRowsRefused;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.survey.ExpectedReading;
import lodebook.assembly.survey.ExpectedReadings;
import lodebook.assembly.survey.FaultKind;
import lodebook.assembly.survey.Meter;
import lodebook.assembly.survey.StatedUnit;
import lodebook.assembly.survey.SurveyedRing;
import lodebook.assembly.survey.Verdict;
import lodebook.db.TestBook;
import lodebook.db.Workshop;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.builds.PlaceHow;
import lodebook.db.builds.PlaceHow.Change;
import lodebook.db.builds.PlaceRow;
import lodebook.db.builds.Placements;
import lodebook.db.builds.Rotors;
import lodebook.db.layouts.Layouts;
import lodebook.db.refusal.Refusal;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class SurveysTest {
  private static final Meter GAUGE = new Meter("GM-1", 0.01, 0.2e-3);

  /// A workshop with rotors R-1 (all twelve pieces placed) and R-2 (empty).
  private static Workshop ready(TestBook database) {
    Workshop shop = new Workshop(database);
    Layouts layouts = new Layouts(shop.book());
    layouts.importDraft(PLANNER, Workshop.inner("RING", "A"));
    layouts.release(PLANNER, "RING");
    Rotors rotors = new Rotors(shop.book());
    rotors.open(BENCH, "RING", "R-1");
    rotors.open(BENCH, "RING", "R-2");
    List<PlaceRow> rows = new ArrayList<>();
    for (int slot = 1; slot <= 12; slot++) {
      rows.add(
          new PlaceRow(
              slot,
              slot == 12 ? "L-1" : "L-1/" + slot,
              Workshop.inner("RING", "A").ruleFacing(slot).degrees()));
    }
    new Placements(shop.book()).place(BENCH, "R-1", rows, PlaceHow.PLAIN);
    return shop;
  }

  private static SurveyRow row(int slot, Component component, double milliTesla) {
    return new SurveyRow(slot, Spot.CENTRE, component, milliTesla, FluxUnit.MILLITESLA);
  }

  /// Readings of a ring, one magnet of which is perhaps reversed (0 for none).
  private static List<SurveyRow> readings(SurveyedRing ring, int reversed) {
    ToDoubleFunction<ProbePoint> own =
        reversed == 0
            ? point -> 0
            : point -> only(ring, reversed).at(List.of(point)).getFirst().valueTesla();
    List<SurveyRow> rows = new ArrayList<>();
    for (ExpectedReading each : new ExpectedReadings(ring, GAUGE).all()) {
      double tesla = each.valueTesla() - 2 * own.applyAsDouble(each.point());
      rows.add(row(each.point().slot(), each.point().component(), 1e3 * tesla));
    }
    return rows;
  }

  private static ExpectedReadings only(SurveyedRing ring, int slot) {
    return new ExpectedReadings(
        new SurveyedRing(
            ring.design(), Map.of(slot, java.util.Objects.requireNonNull(ring.at(slot)))),
        GAUGE);
  }

  private static SurveyedRing ring(Workshop shop) {
    Surveys surveys = new Surveys(shop.book());
    Survey probe =
        surveys.importReadings(BENCH, "R-1", List.of(row(1, Component.RADIAL, 1)), "GM-1", null);
    SurveyedRing ring = surveys.asRecorded(List.of("R-1")).stages().getLast().ring();
    surveys.declareVoid(BENCH, probe.code(), "only to see the ring");
    return ring;
  }

  @ParameterizedTest
  @EnumSource
  void aSurveyIsCheckedReworkedAndCheckedAgain(TestBook database) {
    try (Workshop shop = ready(database)) {
      SurveyedRing ring = ring(shop);
      assertEquals(12, ring.magnets().size());
      Surveys surveys = new Surveys(shop.book());
      Survey faulty = surveys.importReadings(BENCH, "R-1", readings(ring, 6), "GM-1", null);
      assertEquals(new Survey("S-2", "R-1", 24, false, "BE", faulty.at(), null), faulty);
      SurveyChecks.Checked found = checked(shop, "R-1");
      assertEquals(Verdict.FAULT, found.diagnosis().verdict());
      assertEquals(6, found.diagnosis().findings().getFirst().slot());
      assertEquals(FaultKind.REVERSED, found.diagnosis().findings().getFirst().kind());
      store(shop, found);
      assertEquals(Verdict.FAULT, surveys.show("S-2").verdict());
      assertEquals(1, shop.count("select count(*) from finding where slot = 6"));

      new Placements(shop.book())
          .place(
              BENCH,
              "R-1",
              List.of(
                  new PlaceRow(6, "L-1/6", Workshop.inner("RING", "A").ruleFacing(6).degrees())),
              new PlaceHow(Change.REWORK, false, "was reversed"));
      assertNull(surveys.show("S-2").verdict());
      assertEquals(Verdict.FAULT, checked(shop, "S-2").diagnosis().verdict());

      surveys.importReadings(BENCH, "R-1", readings(ring, 0), "GM-1", "S-2");
      RecordedSurvey both = surveys.asRecorded(List.of("S-2"));
      assertEquals(
          List.of("24 [6]", "24 []"),
          both.stages().stream()
              .map(stage -> stage.readings().size() + " " + stage.changedSince())
              .toList());
      SurveyChecks.Checked repaired = checked(shop, "S-2");
      assertEquals(Verdict.PASS, repaired.diagnosis().verdict());
      surveys.importReadings(BENCH, "R-1", readings(ring, 0), "GM-1", "S-2");
      assertRefused(
          "S-2 or its rotor changed while it was being checked; check it again",
          "lodebook survey check S-2",
          () -> store(shop, repaired));
      assertEquals(
          "S-2,S-3",
          checked(
                  shop,
                  "S-2",
                  surveys.importReadings(BENCH, "R-1", readings(ring, 0), "GM-1", null).code())
              .survey()
              .name());
    }
  }

  private static SurveyChecks.Checked checked(Workshop shop, String... codes) {
    RecordedSurvey survey = new Surveys(shop.book()).asRecorded(List.of(codes));
    return new SurveyChecks.Checked(survey, StagedExplanation.of(survey));
  }

  private static void store(Workshop shop, SurveyChecks.Checked checked) {
    SurveyChecks.store(shop.book(), LEAD, checked);
  }

  @ParameterizedTest
  @EnumSource
  void aReadingKeepsWhatWasStated(TestBook database) {
    try (Workshop shop = ready(database)) {
      Instant then = Instant.parse("2026-05-03T10:00:00Z");
      SurveyRow full =
          new SurveyRow(
              3,
              Spot.TO_NEXT,
              Component.TANGENTIAL,
              -1234.5,
              FluxUnit.GAUSS,
              23.5,
              13.2e-3,
              -0.5e-3,
              then,
              "bo",
              "gm-1");
      Surveys surveys = new Surveys(shop.book());
      surveys.importReadings(
          BENCH, "r-1", List.of(full, row(1, Component.RADIAL, 2)), "GM-1", null);
      List<RecordedReading> readings = surveys.asRecorded(List.of("s-1")).readings();
      assertEquals(
          new RecordedReading(
              "S-1",
              1,
              new lodebook.assembly.survey.Reading(
                  3,
                  Spot.TO_NEXT,
                  Component.TANGENTIAL,
                  -0.12345,
                  StatedUnit.GAUSS,
                  23.5,
                  13.2e-3,
                  -0.5e-3,
                  GAUGE),
              FluxUnit.GAUSS,
              "BO",
              then,
              readings.getFirst().sequence()),
          readings.getFirst());
      assertEquals(2e-3, readings.getLast().reading().fluxTesla());
      assertNull(readings.getLast().reading().radiusMetres());
    }
  }

  @ParameterizedTest
  @EnumSource
  void refusalsNameTheThingAndTheRemedy(TestBook database) {
    try (Workshop shop = ready(database)) {
      Surveys surveys = new Surveys(shop.book());
      List<SurveyRow> one = List.of(row(1, Component.RADIAL, 1));
      assertRefused(
          "rotor R-1 has no survey",
          "lodebook survey import R-1 survey.csv --meter METER",
          () -> surveys.asRecorded(List.of("R-1")));
      assertRowsRefused(
          List.of(
              "0:slot: rotor R-1 has no slot 13; its slots are 1 to 12 [lodebook rotor show R-1]",
              "1:by: nobody here signs as XX [lodebook person list]",
              "2:meter: there is no meter GM-9 [lodebook meter list]",
              "3:meter: L-1 is a lot, not a meter [lodebook meter list]"),
          () ->
              surveys.importReadings(
                  BENCH,
                  "R-1",
                  List.of(
                      row(13, Component.RADIAL, 1),
                      signed("XX", null),
                      signed(null, "GM-9"),
                      signed(null, "L-1")),
                  "GM-1",
                  null));
      assertRowsRefused(
          List.of("0:meter: the row names no meter: give --meter METER, or a column meter"),
          () -> surveys.importReadings(BENCH, "R-1", one, null, null));
      assertRefused(
          "the survey holds no reading",
          null,
          () -> surveys.importReadings(BENCH, "R-1", List.of(), "GM-1", null));
      assertEquals(0, shop.count("select count(*) from reading"));
      surveys.importReadings(BENCH, "R-1", one, "GM-1", null);
      surveys.importReadings(BENCH, "R-1", one, "GM-1", null);
      assertRefused(
          "S-1 is finished: a later survey of rotor R-1, S-2, was begun",
          "lodebook survey import R-1 survey.csv --meter METER --continue S-2",
          () -> surveys.importReadings(BENCH, "R-1", one, "GM-1", "S-1"));
      assertRefused(
          "S-2 is a survey of rotor R-1, not of R-2",
          "lodebook rotor show R-2",
          () -> surveys.importReadings(BENCH, "R-2", one, "GM-1", "S-2"));
      voidAndMove(surveys, one);
    }
  }

  private static SurveyRow signed(
      @org.jspecify.annotations.Nullable String by,
      @org.jspecify.annotations.Nullable String meter) {
    return new SurveyRow(
        1, Spot.CENTRE, Component.RADIAL, 1, FluxUnit.TESLA, null, null, null, null, by, meter);
  }

  private static void voidAndMove(Surveys surveys, List<SurveyRow> one) {
    assertRefused(
        "S-2 was recorded by BE; only a lead corrects what another person recorded",
        "lodebook person list",
        () -> surveys.declareVoid(Act.by("BO"), "S-2", "wrong meter"));
    assertRefused(
        "say with --why for what reason survey S-2 is changed",
        "lodebook survey void S-2 --why TEXT",
        () -> surveys.declareVoid(BENCH, "S-2", ""));
    assertEquals("R-2", surveys.move(LEAD, "S-2", "R-2", "wrong rotor").rotor());
    assertRefused(
        "S-2 is a survey of rotor R-2 already",
        "lodebook rotor show R-2",
        () -> surveys.move(LEAD, "S-2", "R-2", "wrong rotor"));
    assertEquals(List.of("S-2"), surveys.list("R-2").stream().map(Survey::code).toList());
    assertRefused(
        "S-1, S-2 are surveys of different rotors; check each rotor by itself",
        "lodebook survey check S-1",
        () -> surveys.asRecorded(List.of("S-1", "S-2")));
    assertEquals(true, surveys.declareVoid(BENCH, "S-2", "wrong meter").voided());
    Refusal twice =
        assertRefused(
            "S-2 was declared void",
            "lodebook rotor list",
            () -> surveys.declareVoid(BENCH, "S-2", "again"));
    assertEquals(4, twice.kind().exitCode());
    assertRefused(
        "S-2 was declared void",
        "lodebook survey import R-2 survey.csv --meter METER",
        () -> surveys.importReadings(BENCH, "R-2", one, "GM-1", "S-2"));
  }

  @ParameterizedTest
  @EnumSource
  void aCorrectedPlacementStoodFromTheStart(TestBook database) {
    try (Workshop shop = ready(database);
        Book book = shop.book()) {
      Surveys surveys = new Surveys(book);
      surveys.importReadings(BENCH, "R-1", List.of(row(1, Component.RADIAL, 1)), "GM-1", null);
      double before = strength(surveys);
      new Placements(book)
          .place(
              BENCH,
              "R-1",
              List.of(new PlaceRow(1, "L-1/20", 0)),
              new PlaceHow(Change.REWORK, false, "chipped"));
      assertEquals(before, strength(surveys));
      new Placements(book)
          .place(
              BENCH,
              "R-1",
              List.of(new PlaceRow(2, "L-1/21", 270)),
              new PlaceHow(Change.CORRECT, false, "misread the tray"));
      assertEquals(1.29 + 0.001 * (21 * 7 % 20), strength(surveys, 2), 1e-12);
    }
  }

  private static double strength(Surveys surveys) {
    return strength(surveys, 1);
  }

  private static double strength(Surveys surveys, int slot) {
    return java.util.Objects.requireNonNull(
            surveys.asRecorded(List.of("S-1")).stages().getFirst().ring().at(slot))
        .strength()
        .remanenceTesla();
  }
}
