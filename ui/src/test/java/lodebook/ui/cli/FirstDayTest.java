package lodebook.ui.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.Predicate;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// The examples of all files, imported in the order of a day into a new book.
class FirstDayTest {
  @TempDir Path folder;

  @Test
  void examplesImportInTheOrderOfTheDay() throws IOException {
    Shop shop = new Shop(folder);
    said(shop, "a new book is at lodebook/book\n", "book", "create");
    said(
        shop,
        "AB (A. Baker) signs from now on as lead\n",
        "person",
        "add",
        "AB",
        "--name",
        "A. Baker");
    shop.with("LODEBOOK_BY", "ab");
    said(
        shop,
        "meter GM-1 is in the book, calibrated until 2027-06-30\n",
        "meter",
        "add",
        "GM-1",
        "--accuracy-percent",
        "1",
        "--calibration-due",
        "2027-06-30");
    takeIn(shop, "1 grade taken in\n", "grades.csv", "grade", "import");
    takeIn(shop, "2 magnet types taken in\n", "types.csv", "type", "import");
    takeIn(shop, "2 lots received, awaiting inspection\n", "lots.csv", "lot", "import");
    takeIn(
        shop,
        "26 readings of 26 pieces taken in, 26 of them new\n",
        "r.csv",
        "piece",
        "import",
        "L-2404");
    takeIn(shop, "2 pieces lie in their new cells\n", "moves.csv", "tray", "move");
    said(
        shop,
        "lot L-2404 is accepted: its pieces can be planned and placed\n",
        "lot",
        "accept",
        "L-2404",
        "--why",
        "fine");
    takeIn(
        shop, "STIR-IN rev A, STIR-OUT rev A taken in as drafts\n", "l.json", "layout", "import");
    said(
        shop,
        "STIR-IN rev A is released and never changes from now on\n",
        "layout",
        "release",
        "STIR-IN");
    said(
        shop,
        "rotor R-0001 is open, to be built to STIR-IN@A with 12 magnets\n",
        "rotor",
        "open",
        "STIR-IN",
        "--serial",
        "R-0001");
    takeIn(shop, "STIR rev A taken in as a draft\n", "g.json", "gear", "import");
    takeIn(shop, "rotor R-0001: 12 slots recorded, 12 of 12 filled\n", "p.csv", "place", "R-0001");
    takeIn(shop, "S-1\n", "s.csv", "survey", "import", "R-0001", "--meter", "GM-1");
    said(shop, "S-1: rotor R-0001 PASSES; every magnet is shown right\n", "survey", "check", "S-1");
    reads(shop, "S-2", line -> line.contains(",radial,"));
    judged(
        shop, "S-2", 0, "S-2: rotor R-0001 PASSES, provided that no pocket named below is empty");
    reads(shop, "S-3", line -> Integer.parseInt(line.substring(0, line.indexOf(','))) <= 6);
    judged(
        shop,
        "S-3",
        1,
        "S-3: CANNOT TELL about rotor R-0001; what was read looks right, but does not");
  }

  /// Takes in some of the example's readings.
  private void reads(Shop shop, String survey, Predicate<String> taken) throws IOException {
    List<String> lines = Files.readAllLines(folder.resolve("s.csv"));
    List<String> some = new ArrayList<>(List.of(lines.getFirst()));
    lines.stream().skip(1).filter(taken).forEach(some::add);
    Path file = Files.write(folder.resolve(survey + ".csv"), some);
    said(shop, survey + "\n", "survey", "import", "R-0001", file.toString(), "--meter", "GM-1");
  }

  private static void judged(Shop shop, String survey, int code, String firstLine) {
    Shop.Said said = shop.run("survey", "check", survey);
    assertEquals(code, said.code());
    assertEquals(firstLine, said.out().lines().findFirst().orElse(""));
  }

  private static void said(Shop shop, String expected, String... command) {
    assertEquals(expected, shop.does(command));
  }

  private void takeIn(Shop shop, String expected, String name, String... command) {
    String path = folder.resolve(name).toString();
    String[] example = Arrays.copyOf(command, command.length + 2);
    example[command.length] = "--example";
    example[command.length + 1] = path;
    said(shop, "an example is in " + name + "\n", example);
    String[] real = Arrays.copyOf(command, command.length + 1);
    real[command.length] = path;
    said(shop, expected, real);
  }
}
