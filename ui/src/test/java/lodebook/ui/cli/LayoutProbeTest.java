package lodebook.ui.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// What a layout's probe points tell, as the command line says it.
class LayoutProbeTest {
  @TempDir Path folder;

  private Shop shop(String components) {
    Shop shop = Shop.open(folder);
    shop.does(
        "type",
        "import",
        shop.file(
            "types.csv",
            """
            type,shape,thickness_mm,width_mm,length_mm,diameter_mm,inner_diameter_mm,arc_deg,grade,tolerance_mm,coating,recoil_permeability
            BLK,block,4,4,10,,,,N42,0.05,Ni-Cu-Ni,1
            """));
    shop.does(
        "layout",
        "import",
        shop.file(
            "layout.json",
            """
            {"layout": "RING", "revision": "A", "polePairs": 3, "segmentsPerPolePair": 4,
             "focus": "out", "numbering": "clockwise", "firstSlotClockDegrees": 0,
             "firstFacingDegrees": 0, "slotRadiusMillimetres": 10.0, "magnetType": "BLK",
             "sideMagnetType": null, "workingRadiusMillimetres": 13.0,
             "probe": {"radiusMillimetres": 13.0, "heightMillimetres": 0.0,
                       "spots": ["centre"], "components": [%s]},
             "spread": {}, "adhesive": "epoxy", "bodyTurns": false}
            """
                .formatted(components)));
    return shop;
  }

  @Test
  void radialReadingsAloneLeaveAbsencesOpen() {
    String said = shop("\"radial\"").does("layout", "probe", "RING");
    List<String> lines = said.lines().toList();
    assertEquals("RING rev A: what its 12 readings tell", lines.getFirst());
    assertEquals(
        "NOT told apart: 63 pairs of single faults at 1 in 1000, 0 with a pair of", lines.get(1));
    assertTrue(lines.stream().anyMatch(l -> l.matches("slot 8 reversed +slot 8 missing .* %  +3")));
    assertTrue(said.contains("The fewest readings found that tell enough, 15. Every single"), said);
    assertTrue(lines.stream().anyMatch(l -> l.matches("to-next tangential +1 3 5 7 9 11")), said);
    assertTrue(lines.stream().allMatch(l -> l.length() <= 80), said);
  }

  @Test
  void aReleasedLayoutShowsItInShort() {
    Shop shop = shop("\"radial\", \"tangential\"");
    assertTrue(!shop.does("layout", "show", "RING").contains("probe tells"));
    shop.does("layout", "release", "RING");
    assertTrue(
        shop.does("layout", "show", "RING")
            .contains("probe tells  Every single fault is told apart at 1 in 1000"));
    String json = shop.does("layout", "show", "RING", "--json");
    assertTrue(json.contains("\"probeTells\":{\"tellsAll\":true,\"worstSingle\":{\"one\":"), json);
  }

  @Test
  void theDocumentNamesThePointsProposed() {
    String json = shop("\"radial\"").does("layout", "probe", "RING", "--json");
    assertTrue(
        json.startsWith(
            "{\"layout\":\"RING\",\"revision\":\"A\",\"readings\":12,\"tellsAll\":false,"),
        json);
    assertTrue(json.contains("\"proposed\":{\"readings\":"), json);
    assertTrue(json.contains("\"component\":\"tangential\"}"), json);
  }
}
