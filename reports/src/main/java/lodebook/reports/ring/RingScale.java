package lodebook.reports.ring;

import java.awt.Shape;
import java.awt.geom.PathIterator;
import java.util.LinkedHashSet;
import java.util.Set;
import lodebook.assembly.layout.Focus;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Typeface;

/// The radii of a ring's picture, millimetres on the paper, from the axis outwards.
///
/// What belongs to the ring (magnets, working circle) is drawn to scale; what is written round it
/// takes the room that letters need.
///
/// @param scale millimetres on the paper for a millimetre of the ring
/// @param inner smallest radius of any magnet
/// @param outer largest radius of any magnet
/// @param shadeInner where the shading of the working side begins
/// @param shadeOuter where it ends
/// @param lotInner where the band of lots begins; equal to lotOuter where there is none
/// @param lotOuter where it ends
/// @param numbers middle of the slot numbers
/// @param numberPoints size of the slot numbers, points
/// @param numbersTurned whether the numbers are turned along the radius
/// @param bandInner where the band of readings begins
/// @param bandOuter where it ends, and all that is drawn round the ring but marks
record RingScale(
    double scale,
    double inner,
    double outer,
    double shadeInner,
    double shadeOuter,
    double lotInner,
    double lotOuter,
    double numbers,
    double numberPoints,
    boolean numbersTurned,
    double bandInner,
    double bandOuter) {
  private static final double GAP = 1.0;
  private static final double LOT_BAND = 4.6;

  /// Scales a picture so that all that is drawn round the axis fits a circle.
  static RingScale fitting(RingPicture picture, Typeface typeface, double radiusMillimetres) {
    double[] magnets = magnetRadii(picture);
    double low = 0;
    double high = radiusMillimetres / magnets[1];
    for (int i = 0; i < 30; i++) {
      double middle = (low + high) / 2;
      if (of(picture, magnets, typeface, middle).bandOuter <= radiusMillimetres) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return of(picture, magnets, typeface, low);
  }

  /// The radii at a given scale.
  static RingScale of(RingPicture picture, Typeface typeface, double scale) {
    return of(picture, magnetRadii(picture), typeface, scale);
  }

  private static RingScale of(
      RingPicture picture, double[] magnets, Typeface typeface, double scale) {
    double inner = scale * magnets[0];
    double outer = scale * magnets[1];
    boolean out = picture.layout().focus() == Focus.OUT;
    double working = scale * 1e3 * picture.layout().workingRadiusMetres();
    double shadeInner = out ? outer : Math.clamp(working, 0.4 * inner, inner);
    double shadeOuter = out ? Math.clamp(working, outer, 1.4 * outer) : inner;
    double lotBand = lots(picture).size() < 2 ? 0 : LOT_BAND;
    double lotInner = out ? Math.max(inner - GAP - lotBand, 0.5 * inner) : outer + GAP;
    double lotOuter = out ? inner - GAP : outer + GAP + lotBand;
    if (lotBand == 0 || lotOuter < lotInner) {
      lotInner = lotOuter = out ? inner : outer;
    }
    double written = Math.max(Math.max(outer, shadeOuter), lotOuter) + GAP;
    Numbers numbers = Numbers.round(picture.layout().slots(), typeface, written);
    double bandInner = written + numbers.room + (picture.readings().isEmpty() ? 0 : GAP);
    double bands =
        Math.clamp(0.2 * outer, 5, 11) * ReadingBand.components(picture.readings()).size();
    return new RingScale(
        scale,
        inner,
        outer,
        shadeInner,
        shadeOuter,
        lotInner,
        lotOuter,
        written + numbers.room / 2,
        numbers.points,
        numbers.turned,
        bandInner,
        bandInner + bands);
  }

  /// Radius of the outermost of magnets, shading and lots, within the slot numbers.
  double outermostDrawn() {
    return Math.max(Math.max(outer, shadeOuter), lotOuter);
  }

  /// The lots of a picture in the order of its slots.
  static Set<String> lots(RingPicture picture) {
    Set<String> lots = new LinkedHashSet<>();
    picture.slots().stream()
        .sorted((a, b) -> Integer.compare(a.slot(), b.slot()))
        .map(DrawnSlot::lot)
        .filter(lot -> lot != null)
        .forEach(lots::add);
    return lots;
  }

  /// Smallest and largest radius of any magnet, millimetres of the ring.
  private static double[] magnetRadii(RingPicture picture) {
    double near = Double.POSITIVE_INFINITY;
    double far = 0;
    double slotRadius = 1e3 * picture.layout().slotRadiusMetres();
    for (DrawnSlot drawn : picture.slots()) {
      MagnetBody magnet = MagnetPainter.body(picture, drawn);
      Shape body = magnet.outline();
      double[] p = new double[6];
      for (PathIterator i = body.getPathIterator(null, 0.01); !i.isDone(); i.next()) {
        if (i.currentSegment(p) != PathIterator.SEG_CLOSE) {
          double r = Math.hypot(slotRadius + p[0], p[1]);
          far = Math.max(far, r);
          near = Math.min(near, r);
        }
      }
      near = Math.min(near, slotRadius - magnet.reach(Math.PI));
    }
    return new double[] {Math.max(near, 0), far};
  }

  /// Size and room of the slot numbers round a circle.
  private record Numbers(double points, boolean turned, double room) {
    static Numbers round(int slots, Typeface typeface, double radius) {
      String widest = "8".repeat(Integer.toString(slots).length());
      for (double points = 11; points >= 7; points -= 0.5) {
        var lettering = Lettering.bold(points);
        double width = typeface.width(widest, lettering);
        double room = Math.max(width, lettering.capitalMillimetres()) + 1.6;
        double pitch = 2 * Math.PI * (radius + room / 2) / slots;
        if (Math.hypot(width, lettering.capitalMillimetres()) * 0.97 + 0.4 < pitch) {
          return new Numbers(points, false, room);
        }
      }
      double pitch = 2 * Math.PI * radius / slots;
      double points = Math.clamp(pitch / Lettering.bold(1).capitalMillimetres() / 1.25, 2.5, 9);
      return new Numbers(points, true, typeface.width(widest, Lettering.bold(points)) + 1.6);
    }
  }
}
