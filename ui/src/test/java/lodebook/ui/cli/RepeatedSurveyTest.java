package lodebook.ui.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// Two surveys of one rotor, and what a shop believes before them, on the command line.
class RepeatedSurveyTest {
  @TempDir Path folder;

  @Test
  void surveysThatDisagreeAreSaidSo() throws IOException {
    Shop shop = Shop.open(folder);
    shop.does("meter", "add", "GM-1", "--accuracy-percent", "1", "--calibration-due", "2027-06-30");
    for (List<String> importer :
        List.of(
            List.of("grade", "import"),
            List.of("type", "import"),
            List.of("lot", "import"),
            List.of("piece", "import", "L-2404"))) {
      example(shop, importer);
    }
    shop.does("lot", "accept", "L-2404", "--why", "fine");
    example(shop, List.of("layout", "import"));
    shop.does("layout", "release", "STIR-IN");
    shop.does("rotor", "open", "STIR-IN", "--serial", "R-0001");
    example(shop, List.of("place", "R-0001"));
    Path survey = folder.resolve("s.csv");
    shop.does("survey", "import", "--example", survey.toString());
    shop.does("survey", "import", "R-0001", survey.toString(), "--meter", "GM-1");
    List<String> lines = Files.readAllLines(survey);
    String[] cells = lines.get(1).split(",");
    List<String> header = List.of(lines.getFirst().split(","));
    int value = header.indexOf("value");
    cells[value] = Double.toString(Double.parseDouble(cells[value]) + 300);
    String other =
        lines.getFirst()
            + "\n"
            + String.join(",", cells)
            + "\n"
            + String.join("\n", lines.subList(2, lines.size()))
            + "\n";
    shop.does("survey", "import", "R-0001", shop.file("s2.csv", other), "--meter", "GM-1");
    Shop.Said said = shop.run("survey", "check", "S-1,S-2");
    assertEquals(1, said.code(), said::toString);
    assertTrue(
        said.out()
            .startsWith(
                "S-1,S-2: CANNOT TELL what rotor R-0001 is; the surveys disagree by more than"),
        said::toString);
    String json = shop.run("survey", "check", "S-1,S-2", "--json").out();
    assertTrue(json.contains("\"disagreements\":[{\"slot\":1,"), json);
    assertTrue(json.contains("\"surveys\":[\"S-1\",\"S-2\"]"), json);
    assertTrue(json.contains("\"reason\":\"surveys disagree\""), json);
  }

  private void example(Shop shop, List<String> importer) {
    Path file = folder.resolve(String.join("-", importer));
    shop.does(with(importer, "--example", file.toString()));
    shop.does(with(importer, file.toString()));
  }

  private static String[] with(List<String> command, String... more) {
    List<String> all = new ArrayList<>(command);
    all.addAll(List.of(more));
    return all.toArray(String[]::new);
  }

  @Test
  void theOddsBeforeTheFirstReadingAreSettledByName() {
    Shop shop = Shop.open(folder);
    assertEquals("0.001\n", shop.does("book", "setting", "prior-missing"));
    assertEquals(
        "prior-missing is now 0.005\n", shop.does("book", "setting", "prior-missing", "0.005"));
    assertEquals("0.005\n", shop.does("book", "setting", "prior-missing"));
    Shop.Said refused = shop.run("book", "setting", "prior-missing", "0.9");
    assertEquals(3, refused.code());
    assertTrue(
        refused
            .err()
            .contains("prior-missing is 0.9, expected a probability above 0 and up to 0.5"),
        refused::toString);
  }
}
