package lodebook.reports.ring;

import java.util.ArrayList;
import java.util.List;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.words.Words;

/// The words in the middle of the ring: its title, the face looked at, which way numbers rise.
final class CentreWords {
  private static final double LEAST_POINTS = 6.5;

  private CentreWords() {}

  /// What is said about the view, a line each.
  static List<String> view(RingPicture picture, Words words) {
    boolean clockwise = new RingView(picture.layout(), picture.face()).sense() > 0;
    return List.of(
        words.say(picture.face() == Face.MARKED ? "ring.marked" : "ring.other"),
        words.say(clockwise ? "ring.clockwise" : "ring.counterclockwise"));
  }

  /// Writes the words in a circle about the axis, if they fit in letters that can be read; without
  /// the title if only that is too long.
  ///
  /// @return whether what is said about the view is written
  static boolean draw(Canvas canvas, RingPicture picture, Words words, double radius) {
    List<String> said = view(picture, words);
    List<String> all = new ArrayList<>(said);
    all.addFirst(picture.title());
    if (!picture.title().isEmpty() && draw(canvas, all, true, radius)) {
      return true;
    }
    return draw(canvas, said, false, radius);
  }

  private static boolean draw(Canvas canvas, List<String> lines, boolean titled, double radius) {
    for (double points = 11; points >= LEAST_POINTS; points -= 0.5) {
      if (fits(canvas, lines, titled, points, 0.94 * radius)) {
        write(canvas, lines, titled, points);
        return true;
      }
    }
    return false;
  }

  private static Lettering lettering(int line, boolean titled, double points) {
    return titled && line == 0 ? Lettering.bold(1.45 * points) : Lettering.plain(points);
  }

  private static double y(int line, int count, double points) {
    return (line - (count - 1) / 2.0) * 1.75 * points * Lettering.MILLIMETRES_PER_POINT;
  }

  private static boolean fits(
      Canvas canvas, List<String> lines, boolean titled, double points, double radius) {
    for (int i = 0; i < lines.size(); i++) {
      Lettering lettering = lettering(i, titled, points);
      double x = canvas.typeface().width(lines.get(i), lettering) / 2;
      double y = Math.abs(y(i, lines.size(), points)) + lettering.capitalMillimetres() / 2;
      if (Math.hypot(x, y) > radius) {
        return false;
      }
    }
    return true;
  }

  private static void write(Canvas canvas, List<String> lines, boolean titled, double points) {
    for (int i = 0; i < lines.size(); i++) {
      canvas.centred(lines.get(i), 0, y(i, lines.size(), points), lettering(i, titled, points));
    }
  }
}
