package lodebook.reports.canvas;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lodebook.reports.Samples;
import org.junit.jupiter.api.Test;

final class TypefaceTest {
  private final Typeface typeface = new Typeface();

  @Test
  void everyEuropeanLetterCanBeSet() {
    assertEquals(Samples.ALPHABETS, typeface.settable(Samples.ALPHABETS));
    assertEquals("აბგ ԱԲԳ", typeface.settable("აბგ ԱԲԳ"));
  }

  @Test
  void whatTheTypefaceLacksIsAnEmptyBoxAndNothingBreaks() {
    assertEquals("lot □□ 7", typeface.settable("lot 磁石 7"));
    assertEquals("a b c", typeface.settable("a\tb\u0007c"));
    assertEquals("ab", typeface.settable("a\u200Bb"));
  }

  @Test
  void accentsWrittenApartAreComposed() {
    assertEquals("Ő é", typeface.settable("O\u030B e\u0301"));
  }

  /// The outline of a line of capitals ends where its width says, but for the side bearings.
  @Test
  void outlineIsAsWideAsTheWidthSays() {
    Lettering lettering = Lettering.bold(72);
    double width = typeface.width("HHHHHHHHHH", lettering);
    var bounds = typeface.outline("HHHHHHHHHH", lettering).getBounds2D();
    assertTrue(bounds.getMaxX() < width && bounds.getMinX() > 0, bounds + " in " + width);
    assertEquals(width, bounds.getMaxX() + bounds.getMinX(), 0.1);
    assertEquals(lettering.capitalMillimetres(), bounds.getHeight(), 0.05);
    assertEquals(0, bounds.getMaxY(), 0.01);
  }
}
