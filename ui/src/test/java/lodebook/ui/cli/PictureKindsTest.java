package lodebook.ui.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// Pictures of what is computed: the flux round a ring and what a viewing film shows.
class PictureKindsTest {
  @TempDir Path folder;

  private Shop shop() {
    Shop shop = Shop.open(folder);
    shop.does("meter", "add", "GM-1", "--accuracy-percent", "1", "--calibration-due", "2027-06-30");
    for (List<String> importer :
        List.of(
            List.of("grade", "import"),
            List.of("type", "import"),
            List.of("lot", "import"),
            List.of("piece", "import", "L-2404"),
            List.of("layout", "import"))) {
      example(shop, importer);
    }
    shop.does("lot", "accept", "L-2404", "--why", "fine");
    shop.does("layout", "release", "STIR-IN");
    shop.does("rotor", "open", "STIR-IN", "--serial", "R-0001");
    example(shop, List.of("place", "R-0001"));
    return shop;
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

  /// The example's readings with those of slot 5 as if its magnet were reversed.
  private void read(Shop shop) throws IOException {
    Path survey = folder.resolve("s.csv");
    shop.does("survey", "import", "--example", survey.toString());
    List<String> lines = new ArrayList<>(Files.readAllLines(survey));
    List<String> header = List.of(lines.getFirst().split(","));
    for (int i = 1; i < lines.size(); i++) {
      String[] cells = lines.get(i).split(",");
      boolean radial = cells[header.indexOf("component")].equals("radial");
      double value = Double.parseDouble(cells[header.indexOf("value")]);
      if (cells[header.indexOf("slot")].equals("5") && radial) {
        cells[header.indexOf("value")] = Double.toString(-0.47 * value);
        lines.set(i, String.join(",", cells));
      }
    }
    String file = shop.file("s5.csv", String.join("\n", lines) + "\n");
    shop.does("survey", "import", "R-0001", file, "--meter", "GM-1");
  }

  private byte[] drawn(Shop shop, String code, String kind, String name) throws IOException {
    Path file = folder.resolve(name);
    assertEquals(
        "the picture is in " + name + "\n",
        shop.does("layout", "picture", code, "--kind", kind, "-o", file.toString()));
    Path kept = Path.of("target/pictures", name);
    Files.createDirectories(kept.getParent());
    Files.write(kept, Files.readAllBytes(file));
    return Files.readAllBytes(file);
  }

  @Test
  void filmAndFieldOfALayoutAndARotor() throws IOException {
    Shop shop = shop();
    drawn(shop, "STIR-IN", "field", "field-layout.png");
    String svg =
        new String(drawn(shop, "STIR-IN", "film", "film-layout.svg"), StandardCharsets.UTF_8);
    assertTrue(svg.contains("aria-label=\"10 mm, true size\""));
    assertTrue(svg.contains("aria-label=\"as planned\""));
    assertTrue(svg.contains("aria-label=\"Film flat on the marked face, 1.0 mm above it\""));
    read(shop);
    drawn(shop, "R-0001", "film", "film-rotor.png");
    drawn(shop, "R-0001", "field", "field-rotor.png");
    byte[] pdf = drawn(shop, "R-0001", "film", "film-rotor.pdf");
    assertEquals("%PDF-", new String(pdf, 0, 5, StandardCharsets.US_ASCII));
    BufferedImage image = ImageIO.read(folder.resolve("film-rotor.png").toFile());
    assertEquals(1440, image.getWidth());
    Shop.Said refused = shop.run("layout", "picture", "STIR-IN", "--kind", "map", "-o", "map.png");
    assertEquals(2, refused.code());
    assertTrue(
        refused.err().contains("--kind is map, expected one of ring, field, film"),
        refused::toString);
  }
}
