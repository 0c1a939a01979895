package lodebook.reports.canvas;

import java.awt.geom.Path2D;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.text.Normalizer;
import java.util.HashMap;
import java.util.Map;
import org.apache.fontbox.ttf.CmapLookup;
import org.apache.fontbox.ttf.GlyphData;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;

/// The one typeface of paper and pictures in its two weights, read from the program itself.
///
/// Widths and outlines come from the font file and never from the computer's own fonts, so a sheet
/// looks the same everywhere. It covers the Latin, Greek, Cyrillic, Armenian and Georgian scripts;
/// a character that it lacks is shown as an empty box. Not for use by several threads at once.
public final class Typeface {
  private static final String BOX = "\u25A1";

  private final Cut plain;
  private final Cut bold;

  /// Reads the typeface.
  public Typeface() {
    plain = new Cut("DejaVuSansCondensed.ttf");
    bold = new Cut("DejaVuSansCondensed-Bold.ttf");
  }

  /// The font file of a weight, as PDF needs it for embedding.
  public TrueTypeFont file(boolean heavy) {
    return (heavy ? bold : plain).font;
  }

  /// The text as it can be set: composed letters, no control characters, an empty box for what the
  /// typeface lacks.
  public String settable(String text) {
    if (isPlainAscii(text)) {
      return text;
    }
    var composed = Normalizer.normalize(text, Normalizer.Form.NFC);
    var out = new StringBuilder();
    composed
        .codePoints()
        .forEach(
            c -> {
              if (Character.isWhitespace(c) || Character.isISOControl(c)) {
                out.append(' ');
              } else if (Character.getType(c) != Character.FORMAT) {
                out.append(plain.glyph(c) == 0 ? BOX : Character.toString(c));
              }
            });
    return out.toString();
  }

  private static boolean isPlainAscii(String text) {
    for (int i = 0; i < text.length(); i++) {
      if (text.charAt(i) < ' ' || text.charAt(i) > '~') {
        return false;
      }
    }
    return true;
  }

  /// Width of a text, millimetres.
  public double width(String text, Lettering lettering) {
    Cut cut = lettering.bold() ? bold : plain;
    String line = settable(text);
    int units = 0;
    for (int i = 0; i < line.length(); ) {
      int character = line.codePointAt(i);
      units += cut.advance(cut.glyph(character));
      i += Character.charCount(character);
    }
    return units * lettering.sizeMillimetres() / cut.unitsPerEm;
  }

  /// Outline of a text in millimetres, its baseline beginning at (0, 0), y down.
  public Path2D outline(String text, Lettering lettering) {
    Cut cut = lettering.bold() ? bold : plain;
    double scale = lettering.sizeMillimetres() / cut.unitsPerEm;
    var all = new Path2D.Double(Path2D.WIND_NON_ZERO);
    var place = new java.awt.geom.AffineTransform(scale, 0, 0, -scale, 0, 0);
    settable(text)
        .codePoints()
        .forEach(
            c -> {
              int glyph = cut.glyph(c);
              all.append(cut.path(glyph).getPathIterator(place), false);
              place.translate(cut.advance(glyph), 0);
            });
    return all;
  }

  /// One weight of the typeface.
  private static final class Cut {
    final TrueTypeFont font;
    final CmapLookup glyphs;
    final int unitsPerEm;
    final Map<Integer, Path2D> paths = new HashMap<>();

    Cut(String file) {
      try (InputStream in = Typeface.class.getResourceAsStream(file)) {
        if (in == null) {
          throw new IllegalStateException("the program was built without its font " + file);
        }
        font = new TTFParser().parse(new RandomAccessReadBuffer(in.readAllBytes()));
        glyphs = font.getUnicodeCmapLookup();
        unitsPerEm = font.getUnitsPerEm();
      } catch (IOException unreadable) {
        throw new UncheckedIOException(
            "the program's font " + file + " cannot be read", unreadable);
      }
    }

    int glyph(int character) {
      return glyphs.getGlyphId(character);
    }

    int advance(int glyph) {
      try {
        return font.getAdvanceWidth(glyph);
      } catch (IOException unreadable) {
        throw new UncheckedIOException(unreadable);
      }
    }

    Path2D path(int glyph) {
      return paths.computeIfAbsent(glyph, this::readPath);
    }

    private Path2D readPath(int glyph) {
      try {
        GlyphData data = font.getGlyph().getGlyph(glyph);
        return data == null ? new Path2D.Double() : data.getPath();
      } catch (IOException unreadable) {
        throw new UncheckedIOException(unreadable);
      }
    }
  }
}
