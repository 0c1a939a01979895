package lodebook.ui.process;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.TreeMap;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.FieldSource;

/// Every importer of the command line with the slips of `slips.txt`: the whole list of problems,
/// exit code 3, and nothing in the book is another. Its right file in another form imports the
/// same.
class EveryImporterTest {
  private static final List<Importer> IMPORTERS = Importer.ALL;
  private static final Map<String, String> SLIPS = new TreeMap<>();

  @TempDir static Path prepared = Path.of(".");
  @TempDir Path folder;

  @BeforeAll
  static void prepare() throws IOException {
    Job.prepare(Station.open(prepared));
    try (InputStream text = EveryImporterTest.class.getResourceAsStream("slips.txt")) {
      byte[] bytes = Objects.requireNonNull(text).readAllBytes();
      for (String part : new String(bytes, StandardCharsets.UTF_8).split("(?m)^@ ", -1)) {
        if (!part.isEmpty()) {
          int end = part.indexOf('\n');
          SLIPS.put(part.substring(0, end), part.substring(end + 1));
        }
      }
    }
  }

  @Test
  void everySlipIsToldWholeAndChangesNothing() {
    Station station = new Station(prepared);
    Map<String, String> before = station.content();
    int tried = 0;
    for (Importer importer : IMPORTERS) {
      for (String slip : List.of("missing", "swapped", "repeated", "comma", "half")) {
        String expected = SLIPS.get(importer + " | " + slip);
        if (expected != null) {
          Said said = station.run(importer.on(station.file("f.csv", importer.with(slip))));
          assertEquals(new Said(3, "", expected), said, importer + " | " + slip);
          tried++;
        }
      }
    }
    assertEquals(SLIPS.size(), tried);
    assertTrue(tried >= 33, tried + " slips");
    assertEquals(before, station.content());
  }

  @ParameterizedTest
  @FieldSource("IMPORTERS")
  void otherFormImportsTheSame(Importer importer) throws IOException {
    Station plain = new Station(prepared).copy(Files.createDirectory(folder.resolve("plain")));
    Station other = new Station(prepared).copy(Files.createDirectory(folder.resolve("other")));
    Said one = plain.run(importer.on(plain.file("f.csv", importer.right())));
    assertEquals(0, one.code(), one::toString);
    assertEquals(one, other.run(importer.on(other.file("f.csv", importer.otherForm()))));
    assertEquals(Job.timeless(plain.content()), Job.timeless(other.content()));
  }
}
