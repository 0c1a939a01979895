package lodebook.reports.words;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Locale;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.Layout;
import lodebook.reports.Samples;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class FacingWordsTest {
  private final Layout layout = Samples.layout(3, 4, Focus.OUT, 10, 13, true);

  @ParameterizedTest
  @CsvSource(
      textBlock =
          """
          7,   0, north OUT
          7,  90, north to slot 8
          12, 90, north to slot 1
          7, 180, north IN
          7, 270, north to slot 6
          1, 270, north to slot 12
          7, 359.8, north OUT
          7,  45, 'north OUT, leaning to slot 8'
          7, 135, 'north IN, leaning to slot 8'
          7, 225, 'north IN, leaning to slot 6'
          7, 315, 'north OUT, leaning to slot 6'
          7, 120, north 60° from IN to slot 8
          7, 240, north 60° from IN to slot 6
          7,  72, north 72° from OUT to slot 8
          7, 322.5, north 37.5° from OUT to slot 6
          """)
  void english(int slot, double degrees, String words) {
    assertEquals(words, new FacingWords(Locale.ENGLISH).of(layout, slot, new Facing(degrees)));
  }

  @ParameterizedTest
  @CsvSource(
      textBlock =
          """
          0, Nord nach AUSSEN
          90, Nord zu Platz 8
          180, Nord nach INNEN
          315, 'Nord nach AUSSEN, zu Platz 6 geneigt'
          120, Nord 60° von INNEN zu Platz 8
          """)
  void german(double degrees, String words) {
    assertEquals(words, new FacingWords(Locale.GERMAN).of(layout, 7, new Facing(degrees)));
  }
}
