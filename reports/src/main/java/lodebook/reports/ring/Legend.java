package lodebook.reports.ring;

import java.awt.geom.Line2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import lodebook.assembly.layout.Component;
import lodebook.reports.canvas.Anchor;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Palette;
import lodebook.reports.canvas.Typeface;
import lodebook.reports.canvas.Wrap;
import lodebook.reports.words.Words;

/// The picture's signs explained beneath it, in lines that fill the width.
final class Legend {
  private static final Lettering LETTERING = Lettering.plain(8.5);
  private static final double LINE = 5.2;
  private static final double SWATCH = 7;

  /// A sign of 7 by 4 mm with its left upper corner at (0, 0), and its words in lines.
  private record Entry(Consumer<Canvas> sign, double signWidth, List<String> lines, double width) {}

  private final Typeface typeface;
  private final double width;
  private final List<Entry> entries = new ArrayList<>();

  Legend(
      RingPicture picture, Words words, Typeface typeface, double width, boolean centreIsSilent) {
    this.typeface = typeface;
    this.width = width;
    if (centreIsSilent) {
      CentreWords.view(picture, words).forEach(line -> add(c -> {}, 0, line));
    }
    add(Legend::magnet, SWATCH, words.say("ring.north"));
    add(Legend::shade, SWATCH, words.say("ring.working"));
    if (picture.slots().stream().anyMatch(s -> s.facing() == null)) {
      add(Legend::empty, SWATCH, words.say("ring.empty"));
    }
    lots(picture, words);
    if (!picture.readings().isEmpty()) {
      List<Component> both = ReadingBand.components(picture.readings());
      String which =
          both.size() > 1
              ? words.say("ring.band.two")
              : words.say(both.contains(Component.RADIAL) ? "ring.radial" : "ring.tangential");
      double full = 1e3 * ReadingBand.fullTesla(picture.readings());
      add(c -> {}, 0, words.say("ring.band", which, words.number(full, full < 10 ? 1 : 0)));
    }
  }

  private void lots(RingPicture picture, Words words) {
    var band = new LotBand(picture);
    if (band.lots().size() == 1) {
      add(c -> {}, 0, words.say("ring.oneLot", band.lots().getFirst()));
      return;
    }
    for (String lot : band.lots()) {
      // a sector so far from its axis that it looks like a box
      double far = 2000;
      double half = SWATCH / 2 / far;
      add(
          c ->
              band.draw(
                  c.moved(SWATCH / 2, far + 4.2), lot, new Sector(far, far + 4.2, -half, half)),
          SWATCH,
          words.say("ring.lot", lot));
    }
  }

  private void add(Consumer<Canvas> sign, double signWidth, String text) {
    double room = signWidth == 0 ? 0 : signWidth + 1.5;
    List<String> lines = Wrap.lines(text, typeface, LETTERING, width - room);
    double widest = 0;
    for (String line : lines) {
      widest = Math.max(widest, typeface.width(line, LETTERING));
    }
    entries.add(new Entry(sign, signWidth, lines, room + widest));
  }

  /// Height of the whole legend, millimetres.
  double height() {
    return layOut(null);
  }

  /// Draws the legend below the canvas's origin.
  void draw(Canvas canvas) {
    layOut(canvas);
  }

  private double layOut(@org.jspecify.annotations.Nullable Canvas canvas) {
    double x = 0;
    double y = 0;
    double row = 0;
    for (Entry entry : entries) {
      if (x > 0 && x + entry.width() > width) {
        x = 0;
        y += row;
        row = 0;
      }
      if (canvas != null) {
        entry.sign().accept(canvas.moved(x, y));
        double text = x + (entry.signWidth() == 0 ? 0 : entry.signWidth() + 1.5);
        for (int i = 0; i < entry.lines().size(); i++) {
          canvas.text(entry.lines().get(i), text, y + 3.2 + i * 3.9, LETTERING, Anchor.START);
        }
      }
      x += entry.width() + 6;
      row = Math.max(row, LINE + (entry.lines().size() - 1) * 3.9);
    }
    return y + row;
  }

  private static void magnet(Canvas canvas) {
    canvas.fill(new Rectangle2D.Double(0, 0.2, 3.5, 4), Palette.SOUTH);
    canvas.fill(new Rectangle2D.Double(3.5, 0.2, 3.5, 4), Palette.NORTH);
    canvas.stroke(new Rectangle2D.Double(0, 0.2, 7, 4), Palette.GRAPHITE, 0.2);
    Arrow.draw(canvas, new Point2D.Double(0.6, 2.2), new Point2D.Double(4.2, 2.2), 1.5, 0.3);
    canvas.centred("N", 5.6, 2.2, Lettering.bold(7.5));
  }

  private static void shade(Canvas canvas) {
    canvas.fill(new Rectangle2D.Double(0, 0.2, 7, 4), Palette.SHADE);
    canvas.stroke(new Line2D.Double(0, 0.2, 7, 0.2), Palette.PENCIL, 0.2, 1.2, 0.6);
    canvas.stroke(new Line2D.Double(0, 4.2, 7, 4.2), Palette.RULE, 0.1);
  }

  private static void empty(Canvas canvas) {
    canvas.stroke(new Rectangle2D.Double(0.5, 0.2, 6, 4), Palette.GRAPHITE, 0.2, 0.8, 0.6);
  }
}
