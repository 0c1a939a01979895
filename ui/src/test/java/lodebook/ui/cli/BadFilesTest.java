package lodebook.ui.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import lodebook.ui.files.Example;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// A bad file changes nothing, whatever it is for: exit code 3, one list of problems, the book as
/// before.
class BadFilesTest {
  private static final List<List<String>> IMPORTS =
      List.of(
          List.of("grade", "import"),
          List.of("type", "import"),
          List.of("lot", "import"),
          List.of("piece", "import", "L-2404"),
          List.of("tray", "move"),
          List.of("layout", "import"),
          List.of("gear", "import"),
          List.of("place", "R-0001"),
          List.of("survey", "import", "R-0001", "--meter", "GM-1"));

  @TempDir Path folder;

  @SuppressWarnings("NullAway.Init")
  private Shop shop;

  @BeforeEach
  void open() {
    shop = Shop.open(folder);
    shop.does("meter", "add", "GM-1", "--accuracy-percent", "1", "--calibration-due", "2027-06-30");
    shop.does("type", "import", shop.file("types.csv", Example.TYPES.text()));
    shop.does("lot", "import", shop.file("lots.csv", Example.LOTS.text()));
    shop.does("lot", "accept", "L-2404", "--why", "fine");
    shop.does("layout", "import", shop.file("layout.json", Example.LAYOUT.text()));
    shop.does("layout", "release", "STIR-IN");
    shop.does("rotor", "open", "STIR-IN", "--serial", "R-0001");
  }

  private Shop.Said takeIn(List<String> command, String file) {
    String[] line = new String[command.size() + 1];
    command.toArray(line);
    line[command.size()] = file;
    return shop.run(line);
  }

  private void refused(List<String> command, String file, String expected) {
    String noun = command.getFirst();
    String verb = noun.equals("place") ? noun : noun + " " + command.get(1);
    assertEquals(
        new Shop.Said(
            3, "", expected + "\nnothing was changed\ntry: lodebook " + verb + " --example FILE\n"),
        takeIn(command, file));
  }

  @Test
  void everyImporterLeavesTheBookAsItWas() {
    String before = shop.state();
    String zip = shop.file("zip.csv", new byte[] {'P', 'K', 3, 4, 0, 0});
    String wide = shop.file("wide.csv", "piece,tray\n".getBytes(StandardCharsets.UTF_16));
    String empty = shop.file("empty.csv", "");
    for (List<String> command : IMPORTS) {
      refused(
          command,
          zip,
          "zip.csv:1:1: this is a packed file (zip or a spreadsheet), expected plain text: unpack"
              + " it, or save it as text in UTF-8");
      refused(
          command,
          wide,
          "wide.csv:1:1: the file is written in UTF-16, expected UTF-8: save it again in UTF-8");
      refused(
          command,
          empty,
          "empty.csv:1:1: the file is empty, expected a header row or a JSON value");
    }
    assertEquals(before, shop.state());
  }

  @Test
  void oneWrongRowOfManyRefusesAll() {
    String before = shop.state();
    refused(
        List.of("piece", "import", "L-2404"),
        shop.file(
            "r.csv",
            "piece,tray,cell,value,unit,standoff_mm,temperature_C\n1,C,1,325,mT,1,20\n2,C,2,325,mm,1,20\n"),
        "r.csv:3:11: unit is \"mm\", expected one of mT, T, G, kG (nearest: mT)");
    assertEquals(before, shop.state());
    assertEquals("no piece of the lot has a number yet\n", shop.does("piece", "list", "L-2404"));
  }

  @Test
  void whatOnlyTheBookKnowsIsToldAtItsPlaceWithCodeFour() {
    String before = shop.state();
    String placements =
        shop.file("p.csv", "slot;piece;facing_deg\n1;L-2404;0\n2;L-2404;0\n13;L-77;90\n");
    Shop.Said said = takeIn(List.of("place", "R-0001"), placements);
    assertEquals(4, said.code());
    assertEquals("", said.out());
    List<String> lines = said.err().lines().toList();
    assertEquals("p.csv:3:10: ", lines.get(0).substring(0, 12));
    assertEquals("p.csv:4:1: ", lines.get(1).substring(0, 11));
    assertEquals(before, shop.state());
  }

  @Test
  void meantAsOneAndTheSame() {
    String header = "piece,tray,cell,value,unit,standoff_mm,temperature_C\n";
    shop.does(
        "piece",
        "import",
        "L-2404",
        shop.file(
            "semi.csv", (header + "1,C,1,325.9,mT,1.5,20\n").replace(',', ';').replace('.', ',')));
    Shop.Said again =
        takeIn(
            List.of("piece", "import", "L-2404"),
            shop.file("plain.csv", header + "L-2404/0001,C,1,325.9,mT,1.5,20\n"));
    assertEquals(4, again.code(), again.err());
  }
}
