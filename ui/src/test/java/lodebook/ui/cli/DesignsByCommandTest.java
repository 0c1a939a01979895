package lodebook.ui.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import lodebook.ui.files.Example;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// Layouts and gear models with every slip: the whole list of problems at their places, and the
/// book as before.
class DesignsByCommandTest {
  private static final String ALONE =
      """
      {
        "layout": "X-1", "revision": "A", "polePairs": 3, "segmentsPerPolePair": 4,
        "focus": "out", "numbering": "clockwise",
        "firstSlotClockDegrees": 0, "firstFacingDegrees": 0,
        "slotRadiusMillimetres": 10.0,
        "magnetType": "BLK-4-4-10",
        "workingRadiusMillimetres": 13.0,
        "probe": { "radiusMillimetres": 13.0, "heightMillimetres": 0.0,
                   "spots": ["centre"], "components": ["radial"] },
        "spread": {}, "adhesive": "epoxy", "bodyTurns": false
      }
      """;

  @TempDir static Path folder = Path.of(".");

  @SuppressWarnings("NullAway.Init")
  private static Shop shop;

  @SuppressWarnings("NullAway.Init")
  private String before;

  @BeforeAll
  static void prepare() {
    shop = Day.designed(folder);
  }

  @BeforeEach
  void look() {
    before = shop.state();
  }

  private void refused(int code, String problems, String remedy, String noun, byte[] file) {
    String path = shop.file("d.json", file);
    String last = remedy.isEmpty() ? "" : "try: lodebook " + remedy + "\n";
    assertEquals(
        new Shop.Said(code, "", problems + "nothing was changed\n" + last),
        shop.run(noun, "import", path));
    assertEquals(before, shop.state());
  }

  private void layout(int code, String problems, String remedy, String from, String to) {
    String text = ALONE.replace(from, to);
    refused(code, problems, remedy, "layout", text.getBytes(StandardCharsets.UTF_8));
  }

  private void gear(int code, String problems, String remedy, String from, String to) {
    String text = Example.GEAR.text().replace(from, to);
    refused(code, problems, remedy, "gear", text.getBytes(StandardCharsets.UTF_8));
  }

  @Test
  void layoutsThatCannotBeBuilt() {
    layout(
        3,
        """
        d.json:5:28: layout X-1 rev A: slots 1 and 2 overlap by 2.39 mm at radius 3.00 mm; raise slotRadiusMillimetres to at least 9.47
        """,
        "",
        "10.0",
        "5.0");
    layout(
        4,
        "d.json:6:17: layout X-1@A names magnet type NO, which the book does not know\n",
        "type import types.csv",
        "BLK-4-4-10",
        "NO");
    layout(
        4, "d.json:2:13: L-2404 is taken already: it is a lot\n", "trace L-2404", "X-1", "L-2404");
    layout(
        4,
        "d.json:2:36: STIR-IN@A is released and never changes; give the changed layout a new"
            + " revision\n",
        "layout show STIR-IN@A",
        "X-1",
        "stir-in");
    layout(
        3,
        """
        d.json:15:28: layout X-2 rev A: slots 1 and 2 overlap by 2.39 mm at radius 3.00 mm; raise slotRadiusMillimetres to at least 9.47
        """,
        "",
        "\"bodyTurns\": false\n",
        "\"bodyTurns\": false, \"also\": [\n"
            + ALONE.replace("X-1", "X-2").replace("10.0", "5.0")
            + "]\n");
  }

  @Test
  void layoutsThatAreWrongInThemselves() {
    String example = "layout import --example FILE";
    layout(
        3,
        "d.json:1:1: key focus is missing, expected one of in, out\n",
        example,
        "\"focus\": \"out\", ",
        "");
    layout(
        3,
        "d.json:3:3: key focos is not known, expected focus (the nearest known key)\n"
                .replace("3:3", "1:1")
                .replace(
                    "key focos is not known, expected focus (the nearest known key)",
                    "key focus is missing, expected one of in, out")
            + "d.json:3:3: key focos is not known, expected focus (the nearest known key)\n",
        example,
        "\"focus\"",
        "\"focos\"");
    layout(
        3,
        "d.json:5:28: slotRadiusMillimetres is \"10,0\", expected a number\n",
        example,
        "10.0",
        "\"10,0\"");
    layout(
        3,
        "d.json:3:32: numbering is \"clock\", expected one of clockwise, counterclockwise\n",
        example,
        "\"clockwise\"",
        "\"clock\"");
    layout(
        3,
        "d.json:2:20: key layout stands here for the second time, expected it once\n",
        example,
        "\"layout\": \"X-1\"",
        "\"layout\": \"X-1\", \"layout\": \"X-1\"");
  }

  @Test
  void gearsThatBreakARule() {
    gear(
        3,
        "d.json:3:22: gear model STIR rev A: 8 modulator pieces, but 3 and 4 pole pairs need 7; set"
            + " modulatorPieces to 7\n",
        "",
        "\"modulatorPieces\": 7",
        "\"modulatorPieces\": 8");
    gear(4, "d.json:2:45: there is no layout NO\n", "layout list", "STIR-IN@A", "NO@A");
    gear(
        4,
        "d.json:2:67: layout STIR-OUT has no revision B; it has A\n",
        "layout list",
        "STIR-OUT@A",
        "STIR-OUT@B");
    gear(
        3,
        "d.json:2:45: inner is \"STIR-IN\", expected a layout with its revision, CODE@REVISION\n",
        "gear import --example FILE",
        "STIR-IN@A",
        "STIR-IN");
    gear(
        3,
        "d.json:3:33: held is \"outter\", expected one of inner, modulator, outer (nearest: outer)\n",
        "gear import --example FILE",
        "\"held\": \"outer\"",
        "\"held\": \"outter\"");
    gear(
        4,
        "d.json:2:11: L-2404 is taken already: it is a lot\n",
        "trace L-2404",
        "\"STIR\"",
        "\"L-2404\"");
  }

  @Test
  void otherFormsOfJson() {
    for (String noun : new String[] {"layout", "gear"}) {
      String example = noun + " import --example FILE";
      refused(
          3,
          "d.json:1:1: the file is written in UTF-16, expected UTF-8: save it again in UTF-8\n",
          example,
          noun,
          ALONE.getBytes(StandardCharsets.UTF_16));
      refused(
          3,
          "d.json:1:1: the file is a list, expected an object in braces\n",
          example,
          noun,
          "[]".getBytes(StandardCharsets.UTF_8));
      refused(
          3,
          "d.json:1:1: the file is empty, expected a header row or a JSON value\n",
          example,
          noun,
          new byte[0]);
    }
    String marked = "\uFEFF" + Example.GEAR.text();
    assertEquals(
        "STIR rev A taken in as a draft\n",
        shop.does("gear", "import", shop.file("marked.json", marked)));
  }
}
