package lodebook.ui.desk.words;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.Properties;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import lodebook.assembly.survey.Diagnosis;
import org.junit.jupiter.api.Test;

/// Both languages say everything, and say nothing that nobody asks for.
class BundlesTest {
  private static final Path SAID_BY_BOTH_FACES =
      Path.of("src/main/java/lodebook/ui/craft/FillWords.java");
  private static final Path SOURCES = Path.of("src/main/java/lodebook/ui/desk");

  /// Keys that are put together from a word of the program, by the start they share.
  private static final List<String> PUT_TOGETHER =
      List.of(
          "fill.hold.",
          "finding.",
          "fault.",
          "kind.",
          "lot.",
          "mark.",
          "piece.",
          "remedy.",
          "role.",
          "room.",
          "survey.verdict.",
          "verdict.",
          "waiting.",
          "wall.",
          "why.");

  @Test
  void everyReasonOfAVerdictHasWords() throws IOException {
    Properties english = bundle("");
    for (Diagnosis.Reason reason : Diagnosis.Reason.values()) {
      String key = "verdict." + reason.name().toLowerCase(Locale.ROOT).replace('_', '-');
      assertTrue(english.containsKey(key), key);
    }
  }

  private static Properties bundle(String suffix) throws IOException {
    Properties bundle = new Properties();
    try (InputStream in = DeskWords.class.getResourceAsStream("desk" + suffix + ".properties")) {
      bundle.load(new InputStreamReader(Objects.requireNonNull(in), StandardCharsets.UTF_8));
    }
    return bundle;
  }

  @Test
  void germanHasTheKeysOfEnglish() throws IOException {
    assertEquals(
        new TreeSet<>(bundle("").stringPropertyNames()),
        new TreeSet<>(bundle("_de").stringPropertyNames()));
  }

  @Test
  void bothLanguagesFillTheSamePlaces() throws IOException {
    Properties english = bundle("");
    Properties german = bundle("_de");
    List<String> different = new ArrayList<>();
    for (String key : english.stringPropertyNames()) {
      if (!places(english.getProperty(key)).equals(places(german.getProperty(key)))) {
        different.add(key);
      }
    }
    assertEquals(List.of(), different);
  }

  private static Set<String> places(String sentence) {
    Set<String> places = new TreeSet<>();
    Matcher each = Pattern.compile("\\{(\\d)}").matcher(sentence);
    while (each.find()) {
      places.add(each.group(1));
    }
    return places;
  }

  @Test
  void everyKeyIsAskedForAndEveryKeyAskedForIsThere() throws IOException {
    Set<String> keys = new TreeSet<>(bundle("").stringPropertyNames());
    StringBuilder sources = new StringBuilder(Files.readString(SAID_BY_BOTH_FACES));
    try (Stream<Path> files = Files.walk(SOURCES)) {
      for (Path file :
          (Iterable<Path>) files.filter(f -> f.toString().endsWith(".java"))::iterator) {
        sources.append(Files.readString(file));
      }
    }
    Set<String> literals = new TreeSet<>();
    Matcher each =
        Pattern.compile("\"([a-z][a-z-]*(\\.[a-z-]+)+|never-mind|point|odds\\.most)\"")
            .matcher(sources);
    while (each.find()) {
      literals.add(each.group(1));
    }
    List<String> unused = new ArrayList<>();
    for (String key : keys) {
      boolean together = PUT_TOGETHER.stream().anyMatch(key::startsWith);
      if (!literals.contains(key) && !together && !sources.toString().contains("\"" + key + "\"")) {
        unused.add(key);
      }
    }
    assertEquals(List.of(), unused);
    List<String> missing = new ArrayList<>();
    Matcher said = Pattern.compile("\\bsay\\(\\s*\"([a-z][a-z.-]*[a-z])\"").matcher(sources);
    while (said.find()) {
      if (!keys.contains(said.group(1))) {
        missing.add(said.group(1));
      }
    }
    assertEquals(List.of(), missing);
    assertTrue(keys.size() > 200, "the bundle has only " + keys.size() + " keys");
  }

  @Test
  void numbersAndTimesAreAsTheLanguageHasThem() {
    DeskWords german = new DeskWords(Locale.GERMANY, ZoneOffset.UTC);
    assertEquals("−1.234,5", german.number(-1234.5, 1));
    assertEquals("0,0", german.number(-0.01, 1));
    assertEquals("02.12.26, 09:05", german.minute(Instant.parse("2026-12-02T09:05:00Z")));
    DeskWords english = new DeskWords(Locale.UK, ZoneOffset.UTC);
    assertEquals("−1,234.5", english.number(-1234.5, 1));
  }
}
