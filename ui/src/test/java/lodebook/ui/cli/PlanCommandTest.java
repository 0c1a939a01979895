package lodebook.ui.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import lodebook.ui.craft.BuiltVersion;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.ObjectMapper;

/// Planning by hand: two small gears from three lots.
class PlanCommandTest {
  private static final ObjectMapper JSON = new ObjectMapper();

  @TempDir static Path prepared;
  @TempDir Path folder;
  private Shop shop;

  /// Each test has its own copy of one book.
  @BeforeEach
  void aShopOfItsOwn() throws IOException {
    try (Stream<Path> files = Files.walk(prepared)) {
      for (Path file : files.toList()) {
        Path copy = folder.resolve(prepared.relativize(file).toString());
        if (Files.isRegularFile(file)) {
          Files.createDirectories(copy.getParent());
          Files.copy(file, copy);
        }
      }
    }
    shop = new Shop(folder).with("LODEBOOK_BY", "AB");
  }

  @BeforeAll
  static void aShopWithThreeLotsAndTwoRotors() {
    Shop shop = Shop.open(prepared);
    shop.does("meter", "add", "GM-1", "--accuracy-percent", "1", "--calibration-due", "2027-06-30");
    shop.does(
        "type",
        "import",
        shop.file(
            "types.csv",
            """
            type,shape,thickness_mm,width_mm,length_mm,diameter_mm,inner_diameter_mm,arc_deg,grade,tolerance_mm,coating
            BLK,block,4,4,10,,,,N42,0.05,nickel
            """));
    StringBuilder lots =
        new StringBuilder(
            "lot,type,supplier,received,count,certificate,certificate_br_mT,location\n");
    for (String lot : List.of("L-1", "L-2", "L-3")) {
      lots.append(lot).append(",BLK,Fernhill,2026-10-01,14,C-1,1300,shelf\n");
    }
    shop.does("lot", "import", shop.file("lots.csv", lots.toString()));
    for (String lot : List.of("L-1", "L-2", "L-3")) {
      Random random = new Random(lot.hashCode());
      StringBuilder readings =
          new StringBuilder("piece,tray,cell,value,unit,standoff_mm,temperature_C,meter\n");
      for (int piece = 1; piece <= 14; piece++) {
        double value = (lot.equals("L-2") ? 319 : 326) * (1 + 0.015 * random.nextGaussian());
        readings.append("%d,T-%s,%d,%.2f,mT,1.0,20,GM-1\n".formatted(piece, lot, piece, value));
      }
      shop.does("piece", "import", lot, shop.file("r.csv", readings.toString()));
      shop.does("lot", "accept", lot, "--why", "fine");
    }
    shop.does(
        "layout",
        "import",
        shop.file(
            "own.json",
            """
            { "layout": "RING", "revision": "A", "polePairs": 3, "segmentsPerPolePair": 4, "focus": "out",
              "slotRadiusMillimetres": 10.0, "magnetType": "BLK", "workingRadiusMillimetres": 13.0,
              "numbering": "clockwise", "firstSlotClockDegrees": 0, "firstFacingDegrees": 0,
              "probe": { "radiusMillimetres": 13.0, "heightMillimetres": 0.0,
                         "spots": ["centre"], "components": ["radial", "tangential"] },
              "spread": {}, "adhesive": "epoxy", "bodyTurns": false, "sideMagnetType": null }
            """));
    shop.does("layout", "release", "RING");
    shop.does("rotor", "open", "RING", "--serial", "R-1");
    shop.does("rotor", "open", "RING", "--serial", "R-2");
  }

  @Test
  void onePlanSaysItsPriceAndHowItIsFilled() {
    String text = shop.does("plan", "R-1", "--from", "L-1,L-2,L-3", "--seconds", "0.05");
    List<String> lines = text.lines().toList();
    assertTrue(
        lines
            .get(0)
            .matches(
                "R-1: unwanted harmonics [0-9.]+ % \\(as they come [0-9.]+ %, lower bound [0-9.]+ %\\),"
                    + " working amplitude [0-9.]+ mT"),
        text);
    assertTrue(
        lines
            .get(1)
            .matches(
                "lots taken: L-[123]; unwanted harmonics [0-9.]+ %, with all lots mixed freely"
                    + " [0-9.]+ %"),
        text);
    assertEquals("order of filling: slot after slot round the ring", lines.get(2));
    assertTrue(text.contains("presses on the"), text);
  }

  @Test
  void aPieceKeptForARotorGoesThereAndNowhereElse() {
    JsonNode one =
        json(
            "plan",
            "R-1",
            "--from",
            "L-1",
            "--keep-for",
            "R-1=L-1/3,L-1/0014",
            "--keep-for",
            "R-2=L-1/5",
            "--seconds",
            "0.05");
    List<String> used = pieces(one);
    assertTrue(used.containsAll(List.of("L-1/0003", "L-1/0014")), used.toString());
    assertTrue(!used.contains("L-1/0005"), used.toString());
    assertEquals(12, used.stream().distinct().count());
    JsonNode other =
        json("plan", "R-1", "--from", "L-1", "--without", "L-1/0001,l-1/2", "--seconds", "0.05");
    assertTrue(pieces(other).stream().noneMatch(List.of("L-1/0001", "L-1/0002")::contains));
    assertEquals(
        new Shop.Said(
            4,
            "",
            """
            lodebook: piece L-2/0003 cannot be kept for rotor R-1: it is no free, measured piece of the lots that are planned from
            try: lodebook piece show L-2/0003
            """),
        shop.run("plan", "R-1", "--from", "L-1", "--keep-for", "R-1=L-2/3"));
  }

  @Test
  void lotsThatAreApartAreNotMixed() {
    assertEquals(
        new Shop.Said(
            4,
            "",
            """
            lodebook: lot L-9 is named as apart, but nothing is planned from it and nothing of it stands in these rotors
            try: lodebook lot list
            """),
        shop.run("plan", "R-1", "--from", "L-1", "--apart", "L-1,L-9"));
    JsonNode plan =
        json(
            "plan",
            "R-1",
            "R-2",
            "--from",
            "L-1,L-2,L-3",
            "--mix",
            "free",
            "--apart",
            "L-1,L-2",
            "--seconds",
            "0.05");
    for (JsonNode each : plan.get("plans")) {
      List<String> used = pieces(each);
      assertTrue(
          used.stream().noneMatch(p -> p.startsWith("L-1"))
              || used.stream().noneMatch(p -> p.startsWith("L-2")),
          used.toString());
    }
    assertEquals(18, plan.get("leftOver").size());
  }

  @Test
  void shortPiecesAreCountedBeforePlanning() {
    assertEquals(
        new Shop.Said(
            4,
            "",
            """
            lodebook: 10 magnets of type BLK too few: 24 are needed, 14 may be used
            try: lodebook lot list
            """),
        shop.run("plan", "R-1", "R-2", "--from", "L-1"));
  }

  @Test
  void whatIfStoresNothing() {
    String before = shop.state();
    JsonNode compared = json("plan", "R-1", "--from", "L-1", "--compare", "--seconds", "0.05");
    JsonNode ring = compared.get("compared").get(0);
    double planned = ring.get("planned").get("unwantedHarmonics").asDouble();
    assertTrue(planned < ring.get("sorted").get("unwantedHarmonics").asDouble());
    assertTrue(planned < ring.get("asTheyCome").get("unwantedHarmonics").asDouble());
    assertTrue(compared.get("pullOutSpreadPercent").get("planned").isNull());
    String text = shop.does("plan", "R-1", "--from", "L-1", "--compare", "--seconds", "0.05");
    assertTrue(
        text.endsWith(
            """
            pull-out torque: a spread needs two gears or more with both their rings among these rotors
            nothing was stored
            """),
        text);
    assertEquals(before, shop.state());
  }

  /// A piece that is put on hold after planning is named before anything is printed, in the shop's
  /// words, and planning again lets the paper through.
  @Test
  void aPieceOnHoldIsNamedBeforePrinting() {
    List<String> used = pieces(json("plan", "R-1", "--from", "L-1", "--seconds", "0.05"));
    String held = used.getFirst();
    shop.does("piece", "hold", held, "--why", "chipped");
    String pdf = folder.resolve("t.pdf").toString();
    Shop.Said refused = shop.run("paper", "traveller", "R-1", "-o", pdf);
    assertEquals(4, refused.code());
    assertEquals(
        "lodebook: rotor R-1 waits for a new plan; these pieces of the one it has may not be placed"
            + " any more: "
            + held
            + " (slot 1, on hold)\n"
            + "try: lodebook plan R-1 --from L-1 --mix few --seconds 0.05\n",
        refused.err());
    assertTrue(
        shop.does("rotor", "show", "R-1")
            .contains(
                held + " is on hold since rotor R-1 was planned: slot 1 waits for a new plan"));
    assertTrue(!pieces(json("plan", "R-1", "--from", "L-1", "--seconds", "0.05")).contains(held));
    shop.does("paper", "traveller", "R-1", "-o", pdf);
  }

  @Test
  void aRotorIsShownWithItsPlan() {
    shop.does("plan", "R-1", "--from", "L-1", "--seed", "7", "--seconds", "0.05");
    JsonNode plan = json("rotor", "show", "R-1").get("plan");
    assertEquals(7, plan.get("seed").asInt());
    assertEquals("--from L-1 --mix few --seconds 0.05", plan.get("settings").asString());
    assertEquals(BuiltVersion.text(), plan.get("programVersion").asString());
    assertTrue(plan.get("stockLine").asInt() > 0);
    JsonNode first = plan.get("placements").get(0);
    assertEquals(2, first.get("expected").size());
    assertEquals(2, first.get("expectedWhenPlaced").size());
    String text = shop.does("rotor", "show", "R-1");
    assertTrue(
        text.contains(
            "with seed 7, --from L-1 --mix few --seconds 0.05, program "
                + BuiltVersion.text()
                + ", from the stock at line"),
        text);
    assertTrue(
        text.contains("STEP  SLOT  SPOT    COMPONENT   WHEN PLACED    +-  FINISHED    +-"), text);
  }

  /// A ring of which seven slots are built; one magnet chips and is scrapped, the plan fills only
  /// what is empty.
  @Test
  void aRepairLeavesWhatIsBuilt() {
    JsonNode plan = json("plan", "R-1", "--from", "L-1", "--seconds", "0.05");
    StringBuilder rows = new StringBuilder("slot,piece,facing_deg\n");
    for (JsonNode each : plan.get("placements")) {
      rows.append(each.get("slot").asInt())
          .append(',')
          .append(each.get("piece").asString())
          .append(',')
          .append(each.get("facingDegrees").asDouble())
          .append('\n');
    }
    shop.does("place", "R-1", shop.file("p.csv", rows.toString()));
    String chipped = plan.get("placements").get(4).get("piece").asString();
    shop.does("piece", "scrap", chipped, "--why", "chipped");
    JsonNode again = json("plan", "R-1", "--from", "L-1", "--seconds", "0.05");
    assertEquals(1, again.get("placements").size());
    assertEquals(5, again.get("placements").get(0).get("slot").asInt());
    assertTrue(!pieces(plan).contains(again.get("placements").get(0).get("piece").asString()));
    assertEquals(
        again.get("unwantedHarmonics").asDouble(), again.get("lowerBound").asDouble(), 1e-12);
  }

  @Test
  void wrongLinesSaySo() {
    assertWrong("--keep-for is R-1, expected ROTOR=PIECE[,PIECE...]", "--keep-for", "R-1");
    assertWrong("--apart is L-1, expected two lots or more, such as L-1,L-2", "--apart", "L-1");
    assertWrong(
        "piece L-1/3 is kept for rotors R-1 and R-2, expected one",
        "--keep-for",
        "R-1=L-1/3",
        "--keep-for",
        "R-2=L-1/3");
  }

  private void assertWrong(String sentence, String... options) {
    String[] line =
        Stream.concat(Stream.of("plan", "R-1", "--from", "L-1"), Arrays.stream(options))
            .toArray(String[]::new);
    Shop.Said said = shop.run(line);
    assertEquals(
        new Shop.Said(2, "", "lodebook: " + sentence + "\ntry: lodebook help plan\n"), said);
  }

  private JsonNode json(String... command) {
    String[] line = Arrays.copyOf(command, command.length + 1);
    line[command.length] = "--json";
    return JSON.readTree(shop.does(line));
  }

  private static List<String> pieces(JsonNode plan) {
    return plan.get("placements").valueStream().map(each -> each.get("piece").asString()).toList();
  }
}
