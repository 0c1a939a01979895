package lodebook.reports.film;

import java.awt.Color;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.Comparator;
import java.util.List;
import lodebook.assembly.layout.Spot;
import lodebook.reports.canvas.Anchor;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Drawing;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Palette;
import lodebook.reports.canvas.Typeface;
import lodebook.reports.canvas.Wrap;
import lodebook.reports.ring.ShownReading;
import lodebook.reports.words.Words;

/// Draws the radial flux density round a ring unrolled: the curve expected, the band allowed, what
/// was read.
public final class FieldDrawing implements Drawing {
  private static final double PLOT = 82;
  private static final double LEFT = 14;
  private static final double TOP = 13;
  private static final double BOTTOM = 10;
  private static final Lettering SMALL = Lettering.plain(8);
  private static final Color READ = new Color(0x8A3B12);

  private final FieldPicture picture;
  private final Words words;
  private final double width;
  private final double full;
  private final double step;
  private final List<String> legend;

  /// @param width width of the place, millimetres
  public FieldDrawing(FieldPicture picture, Typeface typeface, double width) {
    this.picture = picture;
    this.words = new Words(picture.language());
    this.width = width;
    double most = 1e-6;
    for (double tesla : picture.curveTesla()) {
      most = Math.max(most, Math.abs(tesla));
    }
    for (ShownReading reading : picture.readings()) {
      most = Math.max(most, Math.abs(reading.expectedTesla()) + reading.bandTesla());
      Double read = reading.readTesla();
      most = Math.max(most, read == null ? 0 : Math.abs(read));
    }
    step = stepFor(1.05 * most);
    full = step * Math.ceil(1.05 * most / step);
    legend = Wrap.lines(words.say("field.legend"), typeface, SMALL, width);
  }

  /// A round step of which two to five make the height.
  private static double stepFor(double most) {
    double power = Math.pow(10, Math.floor(Math.log10(most)));
    double share = most / power;
    return power * (share <= 2 ? 0.5 : share <= 5 ? 1 : 2);
  }

  @Override
  public double height() {
    return TOP + PLOT + BOTTOM + 4 * legend.size();
  }

  @Override
  public void draw(Canvas canvas) {
    canvas.text(words.say("field.head", picture.title()), 0, 4, Lettering.bold(10), Anchor.START);
    Canvas plot = canvas.moved(LEFT, TOP);
    grid(plot);
    band(plot);
    curve(plot);
    dots(plot);
    for (int i = 0; i < legend.size(); i++) {
      canvas.text(legend.get(i), 0, TOP + PLOT + BOTTOM + 2.5 + 4 * i, SMALL, Anchor.START);
    }
  }

  private double plotWidth() {
    return width - LEFT - 2;
  }

  /// Place on the paper of a place round the ring; 1 is over slot 1.
  private double x(double slot) {
    return (slot - 0.5) / picture.slots() * plotWidth();
  }

  private double y(double tesla) {
    return PLOT / 2 * (1 - tesla / full);
  }

  private void grid(Canvas plot) {
    for (double tesla = -full; tesla <= full + step / 2; tesla += step) {
      boolean zero = Math.abs(tesla) < step / 2;
      plot.stroke(
          new Line2D.Double(0, y(tesla), plotWidth(), y(tesla)),
          zero ? Palette.PENCIL : Palette.RULE,
          zero ? 0.25 : 0.12);
      plot.text(words.number(zero ? 0 : tesla * 1e3, 0), -1.5, y(tesla) + 1, SMALL, Anchor.END);
    }
    plot.text("mT", -1.5, -3, SMALL, Anchor.END);
    int every = Math.max(1, (int) Math.ceil(picture.slots() * 5.0 / plotWidth()));
    for (int slot = 1; slot <= picture.slots(); slot++) {
      plot.stroke(new Line2D.Double(x(slot), PLOT, x(slot), PLOT + 1), Palette.PENCIL, 0.2);
      if ((slot - 1) % every == 0) {
        plot.text(Integer.toString(slot), x(slot), PLOT + 4.4, SMALL, Anchor.MIDDLE);
      }
    }
    plot.text(words.say("field.slot"), plotWidth(), PLOT + 8, SMALL, Anchor.END);
  }

  private static double place(ShownReading reading) {
    return reading.point().slot() + (reading.point().spot() == Spot.CENTRE ? 0 : 0.5);
  }

  private void band(Canvas plot) {
    double half = Math.clamp(plotWidth() / picture.slots() * 0.16, 0.35, 2.2);
    for (ShownReading reading : picture.readings()) {
      double low = y(reading.expectedTesla() - reading.bandTesla());
      double high = y(reading.expectedTesla() + reading.bandTesla());
      double at = x(place(reading));
      plot.fill(
          new Rectangle2D.Double(
              at - half, Math.min(high, low - 0.5), 2 * half, Math.max(low - high, 0.5)),
          Palette.RULE);
    }
  }

  private void curve(Canvas plot) {
    var path = new Path2D.Double();
    int count = picture.curveTesla().length;
    int half = count / (2 * picture.slots());
    for (int i = 0; i <= count; i++) {
      double tesla = picture.curveTesla()[Math.floorMod(i - half, count)];
      double at = (double) i / count * plotWidth();
      if (i == 0) {
        path.moveTo(at, y(tesla));
      } else {
        path.lineTo(at, y(tesla));
      }
    }
    plot.stroke(path, Palette.GRAPHITE, 0.3);
  }

  private void dots(Canvas plot) {
    List<ShownReading> inOrder =
        picture.readings().stream()
            .sorted(Comparator.comparingDouble(FieldDrawing::place))
            .toList();
    for (ShownReading reading : inOrder) {
      Double read = reading.readTesla();
      if (read != null) {
        plot.fill(circle(x(place(reading)), y(read), 0.75), READ);
        if (reading.outside()) {
          plot.stroke(circle(x(place(reading)), y(read), 1.7), READ, 0.35);
        }
      }
    }
  }

  private static Ellipse2D circle(double x, double y, double radius) {
    return new Ellipse2D.Double(x - radius, y - radius, 2 * radius, 2 * radius);
  }
}
