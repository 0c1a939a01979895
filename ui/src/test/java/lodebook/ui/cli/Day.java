package lodebook.ui.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import lodebook.ui.files.Example;

/// A shop whose book holds what the examples bring: types, two accepted lots, one of them measured,
/// both layouts and the gear model released.
final class Day {
  private Day() {}

  static Shop ready(Path folder) {
    Shop shop = designed(folder);
    shop.does("lot", "accept", "L-2404", "--why", "fine");
    shop.does("lot", "accept", "L-2407", "--why", "fine");
    shop.does("piece", "import", "L-2404", shop.file("pieces.csv", Example.READINGS.text()));
    shop.does("gear", "import", shop.file("gear.json", Example.GEAR.text()));
    shop.does("gear", "release", "STIR");
    return shop;
  }

  /// As far as the layouts: the lots await inspection.
  static Shop designed(Path folder) {
    Shop shop = Shop.open(folder);
    shop.does("meter", "add", "GM-1", "--accuracy-percent", "1", "--calibration-due", "2027-06-30");
    shop.does("type", "import", shop.file("types.csv", Example.TYPES.text()));
    shop.does("lot", "import", shop.file("lots.csv", Example.LOTS.text()));
    shop.does("layout", "import", shop.file("layout.json", Example.LAYOUT.text()));
    shop.does("layout", "release", "STIR-IN");
    shop.does("layout", "release", "STIR-OUT");
    return shop;
  }

  /// A ring of unmeasured magnets of a lot as a placements file, facings in quarter turns.
  ///
  /// @param turn degrees from one slot to the next
  static String ring(String lot, int slots, int turn) {
    StringBuilder rows = new StringBuilder("slot,piece,facing_deg\n");
    for (int slot = 1; slot <= slots; slot++) {
      rows.append(slot + "," + lot + "," + Math.floorMod((slot - 1) * turn, 360) + "\n");
    }
    return rows.toString();
  }

  /// A command line with quoted words.
  static String[] words(String line, String... more) {
    List<String> words = new ArrayList<>(List.of(line.split(" ")));
    words.addAll(Arrays.asList(more));
    return words.toArray(String[]::new);
  }
}
