package lodebook.db.layouts;

import static lodebook.db.Workshop.LEAD;
import static lodebook.db.Workshop.PLANNER;
import static lodebook.db.Workshop.assertRefused;
import static lodebook.db.Workshop.inner;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.sql.Connection;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.InsertFrom;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Numbering;
import lodebook.assembly.layout.Probe;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.layout.Spread;
import lodebook.db.TestBook;
import lodebook.db.Workshop;
import lodebook.db.refusal.RefusalKind;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class LayoutsTest {
  /// Every field differs from every other and from its default.
  private static final Layout ODD =
      new Layout(
          "Ödd",
          "B2",
          5,
          3,
          Focus.IN,
          Numbering.COUNTERCLOCKWISE,
          30.5,
          new Facing(12.25),
          21.1e-3,
          "BLK-4",
          "BLK-5",
          17.3e-3,
          new Probe(
              17.5e-3, -1.5e-3, List.of(Spot.TO_NEXT, Spot.CENTRE), List.of(Component.TANGENTIAL)),
          new Spread(0.01e-3, 0.7, 0.2e-3, 1.3),
          "",
          null,
          true,
          InsertFrom.OUTSIDE,
          0.045);

  @ParameterizedTest
  @EnumSource
  void aLayoutComesBackAsItWentIn(TestBook database) {
    try (Workshop shop = new Workshop(database)) {
      Layouts layouts = new Layouts(shop.book());
      assertEquals(ODD, layouts.importDraft(PLANNER, ODD).layout());
      assertEquals(ODD, layouts.show("ÖDD@b2").layout());
      assertEquals("BLK-5", layouts.design("Ödd").typeAt(2).code());
    }
  }

  @ParameterizedTest
  @EnumSource
  void aDraftIsReplacedUntilItIsReleased(TestBook database) {
    try (Workshop shop = new Workshop(database)) {
      Layouts layouts = new Layouts(shop.book());
      layouts.importDraft(PLANNER, inner("RING", "A"));
      Layout changed = changed(inner("RING", "A"), 5.5e-3);
      assertEquals(changed, layouts.importDraft(PLANNER, changed).layout());
      assertEquals(1, layouts.list().size());
      assertTrue(layouts.show("RING").draft());

      LayoutRevision released = layouts.release(PLANNER, "RING");
      assertFalse(released.draft());
      assertEquals("PL", Objects.requireNonNull(released.released()).by());
      assertRefused(
          "RING@A is released and never changes; give the changed layout a new revision",
          "lodebook layout show RING@A",
          () -> layouts.importDraft(PLANNER, inner("ring", "a")));
      assertEquals(changed, layouts.show("RING@A").layout());
    }
  }

  private static Layout changed(Layout layout, double height) {
    return new Layout(
        layout.code(),
        layout.revision(),
        layout.polePairs(),
        layout.segmentsPerPolePair(),
        layout.focus(),
        layout.numbering(),
        layout.firstSlotClockDegrees(),
        layout.firstFacing(),
        layout.slotRadiusMetres(),
        layout.magnetType(),
        layout.sideMagnetType(),
        layout.workingRadiusMetres(),
        new Probe(
            layout.probe().radiusMetres(),
            height,
            layout.probe().spots(),
            layout.probe().components()),
        layout.spread(),
        layout.adhesive(),
        layout.adhesiveWorkingMinutes(),
        layout.bodyTurns(),
        layout.insertFrom(),
        layout.workingAmplitudeTolerance());
  }

  @ParameterizedTest
  @EnumSource
  void aNameWithoutRevisionIsTheLatestReleasedOne(TestBook database) {
    try (Workshop shop = new Workshop(database)) {
      Layouts layouts = new Layouts(shop.book());
      for (String revision : List.of("A", "B", "C")) {
        layouts.importDraft(PLANNER, inner("RING", revision));
      }
      assertEquals("RING@C", layouts.show("RING").layout().name());
      layouts.release(PLANNER, "RING@B");
      layouts.release(PLANNER, "RING@A");
      assertEquals("RING@A", layouts.show("RING").layout().name());
      assertEquals("RING@C", layouts.release(LEAD, "RING").layout().name());
      assertEquals("RING@C", layouts.show("RING").layout().name());
    }
  }

  @ParameterizedTest
  @EnumSource
  void refusalsNameTheLayoutAndTheRemedy(TestBook database) {
    try (Workshop shop = new Workshop(database)) {
      Layouts layouts = new Layouts(shop.book());
      layouts.importDraft(PLANNER, inner("RING", "A"));
      assertRefused(
          "there is no layout WRING", "lodebook layout list", () -> layouts.show("WRING"));
      assertRefused(
          "L-1 is a lot, not a layout", "lodebook layout list", () -> layouts.show("L-1"));
      assertRefused(
          "layout RING has no revision Z; it has A",
          "lodebook layout list",
          () -> layouts.show("RING@Z"));
      assertRefused(
          "L-1 is taken already: it is a lot",
          "lodebook trace L-1",
          () -> layouts.importDraft(PLANNER, inner("l-1", "A")));
      assertRefused(
          "BE is bench and may not do \"layout import\"; it needs planner or lead",
          "lodebook person list",
          () -> layouts.importDraft(Workshop.BENCH, inner("RING", "A")));
      assertEquals(
          RefusalKind.WRONG_INPUT,
          assertRefused(
                  "RING: \"A/1\" cannot be a revision: 1 to 20 letters, digits, \".\", \"_\", \"-\"",
                  null,
                  () -> layouts.importDraft(PLANNER, inner("RING", "A/1")))
              .kind());
      assertRefused(
          "\"RING@\" names no revision: write CODE or CODE@REVISION",
          "lodebook layout list",
          () -> layouts.show("RING@"));
      layouts.importDraft(PLANNER, inner("RING", "B"));
      assertRefused(
          "layout RING has several drafts (RING@A, RING@B); name one of them",
          "lodebook layout release RING@A",
          () -> layouts.release(PLANNER, "RING"));
      layouts.release(PLANNER, "RING@A");
      assertRefused(
          "RING@A is released already",
          "lodebook layout show RING@A",
          () -> layouts.release(PLANNER, "RING@A"));
      layouts.release(PLANNER, "RING");
      assertRefused(
          "layout RING has no draft to release",
          "lodebook layout show RING",
          () -> layouts.release(PLANNER, "RING"));
    }
  }

  @ParameterizedTest
  @EnumSource
  void anUnknownMagnetTypeIsRefused(TestBook database) {
    try (Workshop shop = new Workshop(database)) {
      Layouts layouts = new Layouts(shop.book());
      Layout layout =
          new Layout(
              "RING",
              "A",
              3,
              4,
              Focus.OUT,
              Numbering.CLOCKWISE,
              0,
              Facing.OUT,
              10e-3,
              "BLK-9",
              null,
              13e-3,
              ODD.probe(),
              Spread.DEFAULT,
              "",
              null,
              false,
              InsertFrom.FACE,
              0.03);
      assertRefused(
          "layout RING@A names magnet type BLK-9, which the book does not know",
          "lodebook type import types.csv",
          () -> layouts.importDraft(PLANNER, layout));
      assertNull(layouts.list().stream().findAny().orElse(null));
    }
  }

  @ParameterizedTest
  @EnumSource
  void theSchemaKeepsAReleasedLayoutAsItIs(TestBook database) throws SQLException {
    Workshop shop = new Workshop(database);
    try (shop) {
      Layouts layouts = new Layouts(shop.book());
      layouts.importDraft(PLANNER, inner("RING", "A"));
      layouts.release(PLANNER, "RING");
    }
    try (Connection raw = database.raw(shop.address());
        Statement statement = raw.createStatement()) {
      SQLException refused =
          assertThrows(
              SQLException.class,
              () -> statement.execute("update layout_revision set slot_radius_metres = 0.011"));
      assertTrue(
          String.valueOf(refused.getMessage())
              .toLowerCase(Locale.ROOT)
              .contains("fk_layout_release_all"),
          refused.getMessage());
    }
  }
}
