package lodebook.reports.ring;

import java.util.Comparator;
import java.util.List;
import lodebook.assembly.layout.Focus;
import lodebook.reports.canvas.Anchor;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Palette;
import lodebook.reports.canvas.Typeface;
import lodebook.reports.words.Words;

/// The picture of a ring, laid out for a place on the paper: the one drawing code for sheets,
/// picture files and the screen.
///
/// Round the axis from inside: magnets true in shape, the working side shaded as far as the working
/// circle, a band of lots on the other side where there are several, slot numbers, a band of
/// readings where there are any, words for marked slots. Beneath it the signs are explained.
public final class RingDrawing {
  private static final double SCALE_LINE = 5;

  private final RingPicture picture;
  private final Words words;
  private final RingScale radii;
  private final double width;
  private final Legend legend;
  private final boolean centreSpeaks;

  private RingDrawing(RingPicture picture, Typeface typeface, RingScale radii, double width) {
    this.picture = picture;
    this.words = new Words(picture.language());
    this.radii = radii;
    this.width = width;
    this.centreSpeaks = CentreWords.draw(new Silence(typeface), picture, words, centreRadius());
    this.legend = new Legend(picture, words, typeface, width, !centreSpeaks);
  }

  /// The picture as large as fits a box.
  public static RingDrawing fitting(
      RingPicture picture, Typeface typeface, double widthMillimetres, double heightMillimetres) {
    double marks = MarkWords.any(picture) ? 2 * MarkWords.COLUMN + 4 : 0;
    double room = heightMillimetres;
    RingDrawing drawing = null;
    for (int i = 0; i < 2; i++) {
      double radius = Math.min(widthMillimetres - marks, room) / 2;
      if (radius < 5) {
        throw new IllegalArgumentException(
            "a ring's picture needs more than "
                + widthMillimetres
                + " by "
                + heightMillimetres
                + " mm");
      }
      var radii = RingScale.fitting(picture, typeface, radius);
      drawing = new RingDrawing(picture, typeface, radii, widthMillimetres);
      room = heightMillimetres - drawing.legend.height() - SCALE_LINE - 2;
    }
    return java.util.Objects.requireNonNull(drawing);
  }

  /// The picture at a given scale.
  ///
  /// @param scale millimetres on the paper for a millimetre of the ring; 1 is true size
  /// @param widthMillimetres width of the place; the picture may need more, see [#ringWidth]
  public static RingDrawing scaled(
      RingPicture picture, Typeface typeface, double scale, double widthMillimetres) {
    return new RingDrawing(
        picture, typeface, RingScale.of(picture, typeface, scale), widthMillimetres);
  }

  /// Millimetres on the paper for a millimetre of the ring.
  public double scale() {
    return radii.scale();
  }

  /// Width that the ring with all that stands round it takes, millimetres.
  public double ringWidth() {
    double marks = MarkWords.any(picture) ? 2 * MarkWords.COLUMN + 4 : 0;
    return 2 * ringRadius() + marks;
  }

  private double ringRadius() {
    return radii.bandOuter();
  }

  /// Height of the whole picture with its legend, millimetres.
  public double height() {
    return bareHeight() + legend.height();
  }

  private double centreRadius() {
    boolean in = picture.layout().focus() == Focus.IN;
    double free = in ? radii.shadeInner() : Math.min(radii.inner(), radii.lotInner());
    return picture.highlighted() == null ? free : free - SlotNumbers.POINTER;
  }

  /// Draws the picture below and to the right of the canvas's origin.
  public void draw(Canvas canvas) {
    drawBare(canvas);
    legend.draw(canvas.moved(0, bareHeight()));
  }

  /// Height of the picture without its legend, millimetres.
  public double bareHeight() {
    return 2 * ringRadius() + 2 + SCALE_LINE;
  }

  /// Draws the ring and its scale without the legend.
  public void drawBare(Canvas canvas) {
    drawRing(canvas.moved(width / 2, ringRadius()));
    scaleLine(canvas.moved(0, 2 * ringRadius() + 2));
  }

  private void drawRing(Canvas canvas) {
    canvas.fill(Sector.annulus(radii.shadeInner(), radii.shadeOuter()), Palette.SHADE);
    double circle = radii.scale() * 1e3 * picture.layout().workingRadiusMetres();
    if (circle >= radii.shadeInner() - 1e-6 && circle <= radii.shadeOuter() + 1e-6) {
      canvas.stroke(Sector.circle(circle), Palette.PENCIL, 0.2, 1.2, 0.6);
    }
    var view = new RingView(picture.layout(), picture.face());
    List<DrawnSlot> slots =
        picture.slots().stream().sorted(Comparator.comparingInt(DrawnSlot::slot)).toList();
    var magnets = new MagnetPainter(canvas, picture, radii.scale());
    slots.forEach(magnets::draw);
    if (radii.lotOuter() > radii.lotInner()) {
      lots(canvas, view, slots);
    }
    var numbers = new SlotNumbers(canvas, view, radii);
    numbers.draw();
    new ReadingBand(canvas, picture, radii).draw();
    new MarkWords(canvas, picture, radii).draw(slots, ringRadius());
    if (picture.highlighted() != null) {
      numbers.point(picture.highlighted());
    }
    if (centreSpeaks) {
      CentreWords.draw(canvas, picture, words, centreRadius());
    }
  }

  private void lots(Canvas canvas, RingView view, List<DrawnSlot> slots) {
    var band = new LotBand(picture);
    double half = 0.94 * Math.PI / picture.layout().slots();
    for (DrawnSlot drawn : slots) {
      if (drawn.lot() != null) {
        double clock = view.clockRadians(drawn.slot());
        var sector = new Sector(radii.lotInner(), radii.lotOuter(), clock - half, clock + half);
        band.draw(canvas, drawn.lot(), sector);
      }
    }
  }

  /// What the scale is, with a bar of ten millimetres of the ring.
  private void scaleLine(Canvas canvas) {
    double bar = 10 * radii.scale();
    var path = new java.awt.geom.Path2D.Double();
    path.moveTo(0, 1.2);
    path.lineTo(0, 3.2);
    path.moveTo(0, 2.2);
    path.lineTo(bar, 2.2);
    path.moveTo(bar, 1.2);
    path.lineTo(bar, 3.2);
    canvas.stroke(path, Palette.GRAPHITE, 0.3);
    String text = words.say("ring.bar") + ", " + scaleWords();
    canvas.text(text, bar + 2, 3.3, Lettering.plain(8.5), Anchor.START);
  }

  private String scaleWords() {
    double scale = radii.scale();
    if (Math.abs(scale - 1) < 1e-9) {
      return words.say("ring.scale.true");
    }
    return scale > 1
        ? words.say("ring.scale.enlarged", words.number(scale, 2))
        : words.say("ring.scale.reduced", words.number(1 / scale, 2));
  }
}
