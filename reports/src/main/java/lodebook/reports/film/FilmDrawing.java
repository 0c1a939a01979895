package lodebook.reports.film;

import java.awt.Color;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import lodebook.reports.canvas.Anchor;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Drawing;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Palette;
import lodebook.reports.canvas.Typeface;
import lodebook.reports.canvas.Wrap;
import lodebook.reports.words.Words;
import org.jspecify.annotations.Nullable;

/// Draws films at true size: dark where the flux goes straight through, light where it runs along
/// the film or where there is little of it.
public final class FilmDrawing implements Drawing {
  private static final int TONES = 14;
  private static final double GAP = 6;
  private static final double TITLE = 6;
  private static final double NUMBERS = 4.5;
  private static final double BAR = 8;
  private static final Lettering SMALL = Lettering.plain(8.5);
  private static final Color LIGHT = new Color(0xE9EBDD);
  private static final Color DARK = new Color(0x1F3A33);

  private final FilmPicture picture;
  private final Words words;
  private final double width;
  private final double full;
  private final List<String> legend;

  /// @param width width of the place, millimetres
  public FilmDrawing(FilmPicture picture, Typeface typeface, double width) {
    this.picture = picture;
    this.words = new Words(picture.language());
    this.width = width;
    double most = 0;
    for (FilmPanel panel : picture.panels()) {
      for (FilmMap map : List.of(panel.flat(), panel.wrapped())) {
        for (double tesla : map.throughTesla()) {
          most = Math.max(most, tesla);
        }
      }
    }
    full = most;
    legend =
        Wrap.lines(words.say("film.legend", words.number(most * 1e3, 0)), typeface, SMALL, width);
  }

  @Override
  public double height() {
    return place(null);
  }

  @Override
  public void draw(Canvas canvas) {
    place(canvas);
  }

  /// A film and where it stands.
  private record Piece(FilmMap map, double fromShare, double toShare, String title, boolean strip) {
    double width() {
      return map.widthMillimetres() * (toShare - fromShare);
    }
  }

  private double place(@Nullable Canvas canvas) {
    double y = 0;
    y =
        rows(
            canvas,
            y,
            words.say("film.flat", words.number(picture.heightMillimetres(), 1)),
            flats());
    y =
        rows(
            canvas,
            y,
            words.say("film.wrapped", words.number(picture.radiusMillimetres(), 1)),
            strips());
    if (canvas != null) {
      bar(canvas.moved(0, y));
      for (int i = 0; i < legend.size(); i++) {
        canvas.text(legend.get(i), 0, y + BAR + 3 + 4 * i, SMALL, Anchor.START);
      }
    }
    return y + BAR + 4 * legend.size();
  }

  private List<Piece> flats() {
    return picture.panels().stream().map(p -> new Piece(p.flat(), 0, 1, p.title(), false)).toList();
  }

  /// The wrapped films, cut at slot borders where they are longer than the place is wide.
  private List<Piece> strips() {
    List<Piece> pieces = new ArrayList<>();
    for (FilmPanel panel : picture.panels()) {
      int parts = (int) Math.ceil(panel.wrapped().widthMillimetres() / width);
      int each = (int) Math.ceil((double) picture.slots() / parts);
      for (int from = 0; from < picture.slots(); from += each) {
        int to = Math.min(from + each, picture.slots());
        pieces.add(
            new Piece(
                panel.wrapped(),
                (double) from / picture.slots(),
                (double) to / picture.slots(),
                from == 0 ? panel.title() : "",
                true));
      }
    }
    return pieces;
  }

  private double rows(@Nullable Canvas canvas, double top, String head, List<Piece> pieces) {
    if (canvas != null) {
      canvas.text(head, 0, top + 4, Lettering.bold(10), Anchor.START);
    }
    double y = top + 7;
    double x = 0;
    double row = 0;
    for (Piece piece : pieces) {
      if (x > 0 && x + piece.width() > width) {
        x = 0;
        y += row + GAP;
        row = 0;
      }
      if (canvas != null) {
        Canvas here = canvas.moved(x, y);
        here.text(piece.title(), 0, 3.6, SMALL, Anchor.START);
        film(here.moved(0, TITLE), piece);
        if (piece.strip()) {
          numbers(here.moved(0, TITLE + piece.map().heightMillimetres()), piece);
        }
      }
      x += piece.width() + GAP;
      row = Math.max(row, TITLE + piece.map().heightMillimetres() + (piece.strip() ? NUMBERS : 0));
    }
    return y + row + GAP;
  }

  private void film(Canvas canvas, Piece piece) {
    FilmMap map = piece.map();
    int first = (int) Math.round(piece.fromShare() * map.columns());
    int last = (int) Math.round(piece.toShare() * map.columns());
    double cell = map.widthMillimetres() / map.columns();
    double tall = map.heightMillimetres() / map.rows();
    var frame = new Rectangle2D.Double(0, 0, piece.width(), map.heightMillimetres());
    canvas.fill(frame, LIGHT);
    for (int tone = 1; tone < TONES; tone++) {
      double least = full * tone / TONES;
      var path = new Path2D.Double();
      for (int row = 0; row < map.rows(); row++) {
        int start = -1;
        for (int column = first; column <= last; column++) {
          boolean in = column < last && map.throughTesla()[row * map.columns() + column] >= least;
          if (in && start < 0) {
            start = column;
          } else if (!in && start >= 0) {
            double left = (start - first) * cell;
            double right = (column - first) * cell;
            path.append(new Rectangle2D.Double(left, row * tall, right - left, tall), false);
            start = -1;
          }
        }
      }
      canvas.fill(path, between(tone / (TONES - 1.0)));
    }
    canvas.stroke(frame, Palette.PENCIL, 0.15);
  }

  private static Color between(double share) {
    return new Color(
        mixed(LIGHT.getRed(), DARK.getRed(), share),
        mixed(LIGHT.getGreen(), DARK.getGreen(), share),
        mixed(LIGHT.getBlue(), DARK.getBlue(), share));
  }

  private static int mixed(int light, int dark, double share) {
    return (int) Math.round(light + (dark - light) * share);
  }

  private void numbers(Canvas canvas, Piece piece) {
    int slots = picture.slots();
    double pitch = piece.map().widthMillimetres() / slots;
    int from = (int) Math.round(piece.fromShare() * slots);
    int to = (int) Math.round(piece.toShare() * slots);
    for (int i = from; i < to; i++) {
      double x = (i - from + 0.5) * pitch;
      canvas.stroke(new Line2D.Double(x, 0, x, 0.9), Palette.PENCIL, 0.2);
      int slot = picture.risingRight() ? i + 1 : slots - i;
      canvas.text(Integer.toString(slot), x, 3.9, Lettering.plain(7), Anchor.MIDDLE);
    }
  }

  private void bar(Canvas canvas) {
    var path = new Path2D.Double();
    path.moveTo(0, 1.2);
    path.lineTo(0, 3.2);
    path.moveTo(0, 2.2);
    path.lineTo(10, 2.2);
    path.moveTo(10, 1.2);
    path.lineTo(10, 3.2);
    canvas.stroke(path, Palette.GRAPHITE, 0.3);
    canvas.text(
        words.say("ring.bar") + ", " + words.say("ring.scale.true"), 12, 3.3, SMALL, Anchor.START);
  }
}
