package lodebook.reports.ring;

import java.awt.geom.Ellipse2D;
import java.awt.geom.Point2D;
import java.util.ArrayList;
import java.util.List;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Palette;

/// Marks lots by a pattern and a letter, not by colour.
///
/// The lots of a picture take the letters A, B, C … in the order of their first slots; after eight
/// of them patterns come again, and only the letter parts them.
final class LotBand {
  private static final double LINE = 0.15;
  private static final int PATTERNS = 8;

  private final List<String> lots;

  LotBand(RingPicture picture) {
    lots = new ArrayList<>(RingScale.lots(picture));
  }

  List<String> lots() {
    return lots;
  }

  /// The letter of a lot: A to Z, then AA, AB …
  String letter(String lot) {
    int index = lots.indexOf(lot);
    String last = Character.toString('A' + index % 26);
    return index < 26 ? last : Character.toString('A' + index / 26 - 1) + last;
  }

  void draw(Canvas canvas, String lot, Sector sector) {
    pattern(canvas, lots.indexOf(lot) % PATTERNS, sector);
    canvas.stroke(sector.outline(), Palette.GRAPHITE, LINE);
    double height = sector.outer() - sector.inner();
    double width = sector.at(0.5, 0).distance(sector.at(0.5, 1));
    double capital = Math.min(0.52 * height, 0.8 * width);
    var lettering = Lettering.bold(capital / Lettering.bold(1).capitalMillimetres());
    Point2D middle = sector.at(0.5, 0.5);
    double halo = 0.78 * Math.max(canvas.typeface().width(letter(lot), lettering), capital);
    canvas.fill(
        new Ellipse2D.Double(middle.getX() - halo, middle.getY() - halo, 2 * halo, 2 * halo),
        Palette.PAPER);
    canvas.centred(letter(lot), middle.getX(), middle.getY(), lettering);
  }

  private static void pattern(Canvas canvas, int number, Sector s) {
    canvas.fill(
        s.outline(),
        switch (number) {
          case 3 -> Palette.RULE;
          case 7 -> Palette.PENCIL;
          default -> Palette.PAPER;
        });
    switch (number) {
      case 1 -> {
        for (double a = 0.125; a < 1; a += 0.125) {
          canvas.stroke(s.line(0, a, 1, a), Palette.GRAPHITE, LINE);
        }
      }
      case 2 -> dots(canvas, s);
      case 4 -> {
        for (double r = 0.2; r < 1; r += 0.2) {
          double radius = s.inner() + r * (s.outer() - s.inner());
          canvas.stroke(s.arc(radius, 0, 1), Palette.GRAPHITE, LINE);
        }
      }
      case 5 -> slanted(canvas, s, 1);
      case 6 -> {
        slanted(canvas, s, 1);
        slanted(canvas, s, -1);
      }
      default -> {}
    }
  }

  private static void dots(Canvas canvas, Sector s) {
    for (double r = 0.17; r < 1; r += 0.33) {
      for (double a = 0.1; a < 1; a += 0.2) {
        Point2D p = s.at(r, a);
        canvas.fill(
            new Ellipse2D.Double(p.getX() - 0.22, p.getY() - 0.22, 0.44, 0.44), Palette.GRAPHITE);
      }
    }
  }

  private static void slanted(Canvas canvas, Sector s, int sense) {
    for (double start = -0.75; start < 1; start += 0.25) {
      double low = Math.max(start, 0);
      double high = Math.min(start + 0.75, 1);
      double bottom = (low - start) / 0.75;
      double top = (high - start) / 0.75;
      if (sense > 0) {
        canvas.stroke(s.line(bottom, low, top, high), Palette.GRAPHITE, LINE);
      } else {
        canvas.stroke(s.line(1 - bottom, low, 1 - top, high), Palette.GRAPHITE, LINE);
      }
    }
  }
}
