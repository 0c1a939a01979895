package lodebook.reports.ring;

import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Point2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import lodebook.reports.canvas.Anchor;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Palette;
import lodebook.reports.canvas.Wrap;

/// Writes the marks of slots beside the ring, each with its slot and a line to it.
///
/// Marks of the right half stand in a column on the right, those of the left half on the left; they
/// are moved up and down so that none covers another.
final class MarkWords {
  /// Room that a column of marks takes, millimetres.
  static final double COLUMN = 25;

  private static final Lettering LETTERING = Lettering.bold(9);
  private static final double LINE = 4.2;

  private final Canvas canvas;
  private final RingView view;
  private final RingScale radii;

  MarkWords(Canvas canvas, RingPicture picture, RingScale radii) {
    this.canvas = canvas;
    this.view = new RingView(picture.layout(), picture.face());
    this.radii = radii;
  }

  static boolean any(RingPicture picture) {
    return picture.slots().stream().anyMatch(s -> s.mark() != null);
  }

  private record Mark(Point2D from, List<String> lines, double y) {
    double height() {
      return lines.size() * LINE + 1.2;
    }

    Mark at(double otherY) {
      return new Mark(from, lines, otherY);
    }
  }

  void draw(List<DrawnSlot> slots, double halfHeight) {
    List<Mark> right = new ArrayList<>();
    List<Mark> left = new ArrayList<>();
    for (DrawnSlot drawn : slots) {
      if (drawn.mark() != null) {
        Point2D from = Sector.polar(radii.bandOuter() + 0.3, view.clockRadians(drawn.slot()));
        String words = drawn.slot() + " " + drawn.mark();
        var lines = Wrap.lines(words, canvas.typeface(), LETTERING, COLUMN - 5);
        (from.getX() >= 0 ? right : left).add(new Mark(from, lines, from.getY()));
      }
    }
    column(right, 1, halfHeight);
    column(left, -1, halfHeight);
  }

  private void column(List<Mark> marks, int side, double halfHeight) {
    marks.sort(Comparator.comparingDouble(m -> m.from().getY()));
    double free = -halfHeight;
    for (int i = 0; i < marks.size(); i++) {
      Mark m = marks.get(i).at(Math.max(marks.get(i).y(), free + marks.get(i).height() / 2));
      marks.set(i, m);
      free = m.y() + m.height() / 2;
    }
    double end = halfHeight;
    for (int i = marks.size() - 1; i >= 0; i--) {
      Mark m = marks.get(i).at(Math.min(marks.get(i).y(), end - marks.get(i).height() / 2));
      marks.set(i, m);
      end = m.y() - m.height() / 2;
    }
    double x = side * (radii.bandOuter() + 4.5);
    for (Mark m : marks) {
      var leader =
          new Path2D.Double(new Line2D.Double(m.from(), new Point2D.Double(x - side, m.y())));
      canvas.stroke(leader, Palette.GRAPHITE, 0.25);
      double y = m.y() - (m.lines().size() - 1) * LINE / 2 + LETTERING.capitalMillimetres() / 2;
      for (String line : m.lines()) {
        canvas.text(line, x, y, LETTERING, side > 0 ? Anchor.START : Anchor.END);
        y += LINE;
      }
    }
  }
}
