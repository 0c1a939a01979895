package lodebook.reports.words;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.Map;
import java.util.Properties;
import java.util.TreeMap;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

final class WordsTest {
  @Test
  void numbersAreSetAsPrintersDo() {
    var english = new Words(Locale.ENGLISH);
    assertEquals("\u2212453.5", english.number(-453.49, 1));
    assertEquals("+12", english.signed(12.4, 0));
    assertEquals("0.0", english.signed(-0.04, 1));
    assertEquals("0", english.signed(0.3, 0));
    assertEquals("13", english.trimmed(13.0, 2));
    assertEquals("13.25", english.trimmed(13.25, 2));
    assertEquals("+0,5", new Words(Locale.GERMANY).signed(0.5, 1));
  }

  @Test
  void aLanguageWithoutTranslationReadsEnglish() {
    assertEquals("marked face", new Words(Locale.FRENCH).say("ring.marked"));
    assertEquals(Locale.ENGLISH, new Words(Locale.FRENCH).language());
    assertEquals("markierte Stirnseite", new Words(Locale.GERMANY).say("ring.marked"));
  }

  /// Both languages say the same things with the same values.
  @Test
  void languagesHaveTheSameKeysAndPlaces() throws IOException {
    assertEquals(places("sheets.properties"), places("sheets_de.properties"));
  }

  private static Map<String, String> places(String file) throws IOException {
    var properties = new Properties();
    try (var in = Words.class.getResourceAsStream(file)) {
      properties.load(new InputStreamReader(in, StandardCharsets.UTF_8));
    }
    var places = new TreeMap<String, String>();
    properties.forEach(
        (key, text) ->
            places.put(
                key.toString(),
                Pattern.compile("\\{\\d}")
                    .matcher(text.toString())
                    .results()
                    .map(m -> m.group())
                    .sorted()
                    .toList()
                    .toString()));
    return places;
  }
}
