package lodebook.reports.canvas;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Random;
import lodebook.reports.Samples;
import org.junit.jupiter.api.Test;

final class WrapTest {
  private final Typeface typeface = new Typeface();
  private final Lettering lettering = Lettering.plain(11);

  @Test
  void breaksAtSpacesThenWithinLongWords() {
    double width = typeface.width("L-2404-LONG-", lettering) + 0.5;
    assertEquals(
        List.of("any of", "L-2404-LONG-", "NAME"),
        Wrap.lines("any of L-2404-LONG-NAME", typeface, lettering, width));
    assertEquals(List.of(""), Wrap.lines("", typeface, lettering, width));
    assertEquals(List.of("a", "b"), Wrap.lines("a\nb", typeface, lettering, width));
  }

  /// Nothing is lost and no line is wider than it may be, for any text and width.
  @Test
  void keepsEveryCharacterAndTheWidth() {
    for (int seed = 0; seed < 200; seed++) {
      var random = new Random(seed);
      var text = new StringBuilder();
      for (int i = 0; i < 60; i++) {
        int at = random.nextInt(Samples.ALPHABETS.length());
        text.append(random.nextInt(7) == 0 ? ' ' : Samples.ALPHABETS.charAt(at));
      }
      double width = 6 + 40 * random.nextDouble();
      List<String> lines = Wrap.lines(text.toString(), typeface, lettering, width);
      String what = "seed " + seed;
      assertEquals(
          typeface.settable(text.toString()).replace(" ", ""),
          String.join("", lines).replace(" ", ""),
          what);
      for (String line : lines) {
        assertTrue(typeface.width(line, lettering) <= width + 1e-6, what + ": " + line);
      }
    }
  }
}
