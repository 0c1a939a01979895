package lodebook.ui.files;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/// Filled-in examples of the shop's files. In the order of a day they import into a new book.
public enum Example {
  /// A grade.
  GRADES("grades.csv"),
  /// Magnet types.
  TYPES("types.csv"),
  /// Lots.
  LOTS("lots.csv"),
  /// Readings of the pieces of lot L-2404.
  READINGS("readings.csv"),
  /// Pieces that change their cells.
  MOVES("moves.csv"),
  /// The layouts of an inner rotor and of an outer ring.
  LAYOUT("layout.json"),
  /// A gear of these.
  GEAR("gear.json"),
  /// What was put where in an inner rotor.
  PLACEMENTS("placements.csv"),
  /// A survey of that rotor.
  SURVEY("survey.csv");

  private final String file;

  Example(String file) {
    this.file = file;
  }

  /// The example's text.
  public String text() {
    try (InputStream stream = Example.class.getResourceAsStream("example/" + file)) {
      if (stream == null) {
        throw new IllegalStateException("the example " + file + " is not in the program");
      }
      return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }
}
