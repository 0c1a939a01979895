package lodebook.reports.ring;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Shape;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Numbering;
import lodebook.assembly.magnet.MagnetType;
import lodebook.reports.Samples;
import lodebook.reports.canvas.Palette;
import lodebook.reports.canvas.Typeface;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

final class RingDrawingTest {
  private final Typeface typeface = new Typeface();
  private final MagnetType block = Samples.block(4, 4, 10);

  private Recorder drawn(RingDrawing drawing) {
    var recorder = new Recorder(typeface);
    drawing.draw(recorder);
    return recorder;
  }

  private static RingPicture oneFacing(Layout layout, MagnetType type, Facing facing, Face face) {
    List<DrawnSlot> slots = new ArrayList<>();
    for (int slot = 1; slot <= layout.slots(); slot++) {
      slots.add(new DrawnSlot(slot, slot == 2 ? facing : null, null, null));
    }
    return new RingPicture(layout, type, null, "", slots, face, null, List.of(), Locale.ENGLISH);
  }

  /// Slot 2 of 12 with slot 1 at 3 o'clock. By hand: seen on the marked face it stands at 4 o'clock
  /// where numbers rise clockwise, at 2 o'clock where they don't; the other face shows 8 and 10
  /// o'clock. North is turned from the outward direction the way numbers rise.
  @ParameterizedTest
  @CsvSource(
      textBlock =
          """
          CLOCKWISE,        MARKED, 120, 1
          COUNTERCLOCKWISE, MARKED,  60, -1
          CLOCKWISE,        OTHER,  240, -1
          COUNTERCLOCKWISE, OTHER,  300, 1
          """)
  void northStandsWhereTheFacingSays(
      Numbering numbering, Face face, double slotClockDegrees, int sense) {
    Layout layout = Samples.layout(3, 4, Focus.OUT, 10, 13, true).numbered(numbering, 90);
    for (double facing = 0; facing < 360; facing += 15) {
      RingPicture picture = oneFacing(layout, block, new Facing(facing), face);
      RingDrawing drawing = RingDrawing.fitting(picture, typeface, 120, 140);
      Recorder drawn = drawn(drawing);
      double centreX = 60;
      double centreY = drawn.texts.stream().filter(t -> t.text().equals("1")).findFirst().get().y();
      double slot = Math.toRadians(slotClockDegrees);
      double magnetX = centreX + 10 * drawing.scale() * Math.sin(slot);
      double magnetY = centreY - 10 * drawing.scale() * Math.cos(slot);
      var north = drawn.texts.stream().filter(t -> t.text().equals("N")).findFirst().get();
      double expected = slot + sense * Math.toRadians(facing);
      double seen = Math.atan2(north.x() - magnetX, -(north.y() - magnetY));
      String what = numbering + " " + face + " facing " + facing;
      assertEquals(1, Math.cos(expected - seen), 1e-3, what);
      Shape tinted =
          drawn.fills.stream()
              .filter(f -> f.color().equals(Palette.NORTH))
              .findFirst()
              .get()
              .shape();
      assertTrue(tinted.contains(north.x(), north.y()), what);
      assertTrue(Math.hypot(north.x() - magnetX, north.y() - magnetY) > drawing.scale(), what);
    }
  }

  @ParameterizedTest
  @ValueSource(ints = {8, 12, 16, 18, 24, 32, 40, 48, 64, 96, 120, 192})
  void slotNumbersAreAllThereAndNeverTouch(int slots) {
    double radius = 2.6 * slots / Math.PI + 3;
    for (double reach : new double[] {110, 178}) {
      Layout layout = Samples.layout(slots / 2, 2, Focus.OUT, radius, radius + 3, false);
      var picture = Samples.picture(layout, block, "", s -> "L-" + s % 3);
      Recorder drawn = drawn(RingDrawing.fitting(picture, typeface, reach, 1.3 * reach));
      List<Recorder.Written> numbers =
          drawn.texts.stream().filter(t -> t.text().matches("\\d+")).toList();
      assertEquals(slots, numbers.size());
      for (int i = 0; i < slots; i++) {
        assertEquals(Integer.toString(i + 1), numbers.get(i).text());
        for (int j = 0; j < i; j++) {
          assertFalse(
              numbers.get(i).covers(numbers.get(j)),
              "of " + slots + " on " + reach + " mm: " + (i + 1) + " and " + (j + 1));
        }
      }
    }
  }

  @ParameterizedTest
  @ValueSource(ints = {12, 48, 192})
  void everythingStaysInItsBox(int slots) {
    double radius = 2.6 * slots / Math.PI + 3;
    Layout layout = Samples.layout(slots / 4, 4, Focus.IN, radius, radius - 3, false);
    List<DrawnSlot> marked = new ArrayList<>();
    List<ShownReading> readings = new ArrayList<>();
    for (int slot = 1; slot <= slots; slot++) {
      String mark = slot % 11 == 1 ? "quarter turn forward" : null;
      marked.add(new DrawnSlot(slot, layout.ruleFacing(slot), "LOT-" + slot % 9, mark));
      Samples.expected(layout, slot)
          .forEach(
              e ->
                  readings.add(
                      new ShownReading(e.point(), e.valueTesla(), e.bandTesla(), -e.valueTesla())));
    }
    var picture =
        new RingPicture(
            layout, block, null, "R-1", marked, Face.MARKED, 3, readings, Locale.ENGLISH);
    RingDrawing drawing = RingDrawing.fitting(picture, typeface, 180, 230);
    Recorder drawn = drawn(drawing);
    assertTrue(drawing.height() <= 230.001, "height " + drawing.height());
    drawn.texts.forEach(t -> inBox(t.text(), t.box().getBounds2D()));
    drawn.strokes.forEach(s -> inBox("line", s.getBounds2D()));
    List<Recorder.Written> marks =
        drawn.texts.stream()
            .filter(t -> t.points() == 9 && !t.text().matches("\\d+|[A-Z]"))
            .toList();
    for (int i = 0; i < marks.size(); i++) {
      for (int j = 0; j < i; j++) {
        assertFalse(marks.get(i).covers(marks.get(j)), marks.get(i) + " " + marks.get(j));
      }
    }
  }

  private static void inBox(String what, Rectangle2D bounds) {
    assertTrue(
        bounds.getMinX() > -0.5
            && bounds.getMaxX() < 180.5
            && bounds.getMinY() > -0.5
            && bounds.getMaxY() < 230.5,
        what + " " + bounds);
  }

  @Test
  void wordsSayTheFaceAndTheWayNumbersRise() {
    var picture =
        RingPicture.ofLayout(
            Samples.layout(3, 4, Focus.IN, 20, 16, false), block, null, Locale.ENGLISH);
    assertTrue(says(picture, "marked face", "numbers rise clockwise"));
    assertTrue(
        says(
            picture.seenOn(Face.OTHER),
            "other face, seen mirrored",
            "numbers rise counter-clockwise"));
  }

  private boolean says(RingPicture picture, String... lines) {
    Recorder drawn = drawn(RingDrawing.fitting(picture, typeface, 120, 150));
    var texts = drawn.texts.stream().map(Recorder.Written::text).toList();
    return texts.containsAll(List.of(lines));
  }

  @Test
  void lotsCarryLettersAndALegend() {
    var picture =
        Samples.picture(
            Samples.layout(3, 4, Focus.OUT, 10, 13, false), block, "", s -> s < 5 ? "L-2" : "L-1");
    Recorder drawn = drawn(RingDrawing.fitting(picture, typeface, 120, 150));
    assertEquals(5, drawn.texts.stream().filter(t -> t.text().equals("A")).count());
    assertEquals(9, drawn.texts.stream().filter(t -> t.text().equals("B")).count());
    assertTrue(drawn.texts.stream().anyMatch(t -> t.text().equals("lot L-2")));
    assertTrue(drawn.texts.stream().anyMatch(t -> t.text().equals("lot L-1")));
  }

  @Test
  void aSlotTooManyIsNamed() {
    Layout layout = Samples.layout(1, 2, Focus.OUT, 10, 13, false);
    var slot = new DrawnSlot(2, null, null, null);
    var refused =
        org.junit.jupiter.api.Assertions.assertThrows(
            IllegalArgumentException.class,
            () ->
                new RingPicture(
                    layout,
                    block,
                    null,
                    "",
                    List.of(slot, slot),
                    Face.MARKED,
                    null,
                    List.of(),
                    Locale.ENGLISH));
    assertEquals(
        "the picture of layout STIR-IN@A needs each slot from 1 to 2 once; slot 2 is one too many",
        refused.getMessage());
  }
}
