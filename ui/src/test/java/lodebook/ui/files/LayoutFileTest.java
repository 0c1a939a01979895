package lodebook.ui.files;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.List;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.InsertFrom;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Member;
import lodebook.assembly.layout.Numbering;
import lodebook.assembly.layout.Probe;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.layout.Spread;
import lodebook.db.layouts.GearDraft;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// Layout and gear files: right ones, and what wrong ones are told.
class LayoutFileTest {
  static final String LAYOUT =
      """
      {
        "layout": "STIR-IN", "revision": "A", "polePairs": 3, "segmentsPerPolePair": 4,
        "focus": "out", "numbering": "clockwise", "firstSlotClockDegrees": 0,
        "firstFacingDegrees": 0,
        "slotRadiusMillimetres": 10.0, "magnetType": "BLK-4-4-10", "sideMagnetType": null,
        "workingRadiusMillimetres": 13.0,
        "probe": { "radiusMillimetres": 13.0, "heightMillimetres": 0.5,
                   "spots": ["centre"], "components": ["radial", "tangential"] },
        "spread": { "pocketMillimetres": 0.1 },
        "adhesive": "two-part epoxy, 5 min", "bodyTurns": false
      }
      """;
  static final String GEAR =
      """
      {"gear": "STIR", "revision": "A", "inner": "STIR-IN@A", "outer": "STIR-OUT@A",
       "modulatorPieces": 11, "held": "outer", "stackMillimetres": 10}
      """;

  @TempDir Path folder;
  private FileBench bench = new FileBench(Path.of("."));

  @BeforeEach
  void open() {
    bench = new FileBench(folder);
  }

  private List<String> layout(String from, String to) {
    return bench.problems(bench.file("l.json", LAYOUT.replace(from, to)), LayoutFile::read);
  }

  @Test
  void rightLayout() {
    Layout expected =
        new Layout(
            "STIR-IN",
            "A",
            3,
            4,
            Focus.OUT,
            Numbering.CLOCKWISE,
            0,
            Facing.OUT,
            0.010,
            "BLK-4-4-10",
            null,
            0.013,
            new Probe(
                0.013,
                0.0005,
                List.of(Spot.CENTRE),
                List.of(Component.RADIAL, Component.TANGENTIAL)),
            new Spread(0.1e-3, 1, 0.15e-3, 2),
            "two-part epoxy, 5 min",
            null,
            false,
            InsertFrom.FACE,
            0.03);
    assertEquals(List.of(expected), LayoutFile.read(bench.file("l.json", LAYOUT)).all());
    assertEquals(List.of(expected), LayoutFile.read(bench.file("l.json", "\uFEFF" + LAYOUT)).all());
  }

  @Test
  void everythingWrongIsListedAtOnce() {
    String text =
        LAYOUT
            .replace("\"polePairs\": 3", "\"polePairs\": 3.5")
            .replace("\"segmentsPerPolePair\": 4", "\"segmentsPerPolePair\": 7")
            .replace("\"focus\": \"out\"", "\"focus\": \"outside\"")
            .replace("\"probe\"", "\"prob\"")
            .replace("\"bodyTurns\": false", "\"bodyTurns\": \"no\"");
    assertEquals(
        List.of(
            "l.json:1:1: key probe is missing, expected an object",
            "l.json:2:54: polePairs is 3.5, expected a whole number",
            "l.json:2:82: segmentsPerPolePair is 7, expected 2, 3, 4, 5, 6 or 8",
            "l.json:3:12: focus is \"outside\", expected one of in, out",
            "l.json:7:3: key prob is not known, expected probe (the nearest known key)",
            "l.json:10:53: bodyTurns is \"no\", expected true or false"),
        bench.problems(bench.file("l.json", text), LayoutFile::read));
  }

  @Test
  void keysTwiceOrUnknownInside() {
    assertEquals(
        List.of("l.json:2:24: key layout stands here for the second time, expected it once"),
        layout("\"revision\"", "\"layout\": \"X-1\", \"revision\""));
    assertEquals(
        List.of(
            "l.json:9:15: key pocketMm is not known, expected one of pocketMillimetres,"
                + " facingDegrees, probeMillimetres, probeTiltDegrees"),
        layout("pocketMillimetres", "pocketMm"));
  }

  @Test
  void workingCircleOnTheSideOfTheFocus() {
    assertEquals(
        List.of(
            "l.json:6:31: workingRadiusMillimetres is 9.0, expected more than slotRadiusMillimetres"
                + " (10.0), since the focus is out"),
        layout("\"workingRadiusMillimetres\": 13.0", "\"workingRadiusMillimetres\": 9.0"));
    assertEquals(
        List.of(
            "l.json:6:31: workingRadiusMillimetres is 13.0, expected less than slotRadiusMillimetres"
                + " (10.0), since the focus is in"),
        layout("\"focus\": \"out\"", "\"focus\": \"in\""));
  }

  @Test
  void listsOfTheProbe() {
    assertEquals(
        List.of("l.json:8:23: spots is [], expected at least one"), layout("[\"centre\"]", "[]"));
    assertEquals(
        List.of(
            "l.json:8:50: components is \"radial \", expected one of radial, tangential (nearest:"
                + " radial)"),
        layout("[\"radial\",", "[\"radial \","));
  }

  @Test
  void brokenJson() {
    assertEquals(
        List.of(
            "l.json:1:12: this is not proper JSON (Unexpected character (',' (code 44)): expected a"
                + " valid value (JSON String, Number, Array, Object or token 'null', 'true' or"
                + " 'false')), expected a JSON value as RFC 8259 has it"),
        bench.problems(bench.file("l.json", "{\"layout\": ,}"), LayoutFile::read));
    assertEquals(
        List.of(
            "l.json:12:1: this is not proper JSON (text follows its end), expected a JSON value as"
                + " RFC 8259 has it"),
        bench.problems(bench.file("l.json", LAYOUT + "{}"), LayoutFile::read));
    assertEquals(
        List.of("l.json:1:1: the file is a list, expected an object in braces"),
        bench.problems(bench.file("l.json", "[]"), LayoutFile::read));
    assertEquals(
        List.of("l.json:1:1: the file is empty, expected a header row or a JSON value"),
        bench.problems(bench.file("l.json", " \n"), LayoutFile::read));
  }

  @Test
  void gear() {
    assertEquals(
        new GearDraft(
            "STIR", "A", "STIR-IN@A", "STIR-OUT@A", 11, Member.OUTER, null, null, 0.01, null),
        GearFile.read(bench.file("g.json", GEAR)).all().getFirst());
    String wrong =
        GEAR.replace("STIR-IN@A", "STIR-IN").replace("\"held\": \"outer\"", "\"held\": \"ring\"");
    assertEquals(
        List.of(
            "g.json:1:44: inner is \"STIR-IN\", expected a layout with its revision, CODE@REVISION",
            "g.json:2:33: held is \"ring\", expected one of inner, modulator, outer"),
        bench.problems(bench.file("g.json", wrong), GearFile::read));
  }
}
