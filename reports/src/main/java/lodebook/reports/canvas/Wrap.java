package lodebook.reports.canvas;

import java.util.ArrayList;
import java.util.List;

/// Breaks a text into lines that fit a width.
///
/// Breaks at spaces; a word wider than the line breaks after a hyphen, slash, point, colon or
/// underscore, or where it must, never inside a character.
public final class Wrap {
  private static final String BREAK_AFTER = "-/._:";

  private final Typeface typeface;
  private final Lettering lettering;
  private final double width;
  private final List<String> lines = new ArrayList<>();
  private String line = "";

  private Wrap(Typeface typeface, Lettering lettering, double width) {
    this.typeface = typeface;
    this.lettering = lettering;
    this.width = width;
  }

  /// The lines of a text, at least one.
  public static List<String> lines(
      String text, Typeface typeface, Lettering lettering, double widthMillimetres) {
    var wrap = new Wrap(typeface, lettering, widthMillimetres);
    for (String paragraph : text.split("\n", -1)) {
      for (String word : typeface.settable(paragraph).split(" ", -1)) {
        wrap.add(word);
      }
      wrap.lines.add(wrap.line);
      wrap.line = "";
    }
    return List.copyOf(wrap.lines);
  }

  private boolean fits(String text) {
    return typeface.width(text, lettering) <= width + 1e-9;
  }

  private void add(String word) {
    String longer = line.isEmpty() ? word : line + " " + word;
    if (fits(longer)) {
      line = longer;
      return;
    }
    if (!line.isEmpty()) {
      lines.add(line);
    }
    String rest = word;
    while (!fits(rest)) {
      int cut = cut(rest);
      lines.add(rest.substring(0, cut));
      rest = rest.substring(cut);
    }
    line = rest;
  }

  /// Where to break a word that does not fit: at least one character stays.
  private int cut(String word) {
    int most = word.offsetByCodePoints(0, 1);
    int friendly = 0;
    while (most < word.length()) {
      int longer = word.offsetByCodePoints(most, 1);
      if (!fits(word.substring(0, longer))) {
        break;
      }
      most = longer;
      if (BREAK_AFTER.indexOf(word.charAt(most - 1)) >= 0) {
        friendly = most;
      }
    }
    return friendly > most / 3 ? friendly : most;
  }
}
