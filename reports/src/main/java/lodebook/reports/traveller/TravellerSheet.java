package lodebook.reports.traveller;

import java.awt.geom.Line2D;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.reports.canvas.Anchor;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Palette;
import lodebook.reports.canvas.Typeface;
import lodebook.reports.ring.DrawnSlot;
import lodebook.reports.ring.Face;
import lodebook.reports.ring.RingDrawing;
import lodebook.reports.ring.RingPicture;
import lodebook.reports.ring.RingSizes;
import lodebook.reports.sheet.Flow;
import lodebook.reports.sheet.Sheet;
import lodebook.reports.sheet.SheetFacts;
import lodebook.reports.sheet.Table;
import lodebook.reports.words.Words;

/// Writes the traveller of a rotor as a PDF/A-2b file.
///
/// First page: the rotor's number, its facts, the ring. Then the notices for handling magnets, the
/// steps with room to write, the readings of the finished ring, and who built and checked it.
public final class TravellerSheet {
  private static final double LEAST_RING_HEIGHT = 110;
  private static final double INSET = 52;

  private final Traveller traveller;
  private final Words words;
  private final Flow flow;

  private TravellerSheet(Traveller traveller, Words words, Flow flow) {
    this.traveller = traveller;
    this.words = words;
    this.flow = flow;
  }

  /// The file of a traveller; the same bytes for the same traveller.
  ///
  /// @throws IllegalArgumentException if two steps name the same slot or a slot is not the layout's
  public static byte[] pdf(Traveller traveller) {
    return pdf(List.of(traveller));
  }

  /// One file of several travellers in their order, pages counted traveller by traveller.
  ///
  /// @param travellers at least one, in one language
  public static byte[] pdf(List<Traveller> travellers) {
    var words = new Words(travellers.getFirst().facts().language());
    String kind = words.say("traveller.kind");
    List<SheetFacts> facts = travellers.stream().map(Traveller::facts).toList();
    try (var sheet = new Sheet(kind, facts, new Typeface())) {
      for (int i = 0; i < travellers.size(); i++) {
        if (i > 0) {
          sheet.nextSheet();
        }
        new TravellerSheet(travellers.get(i), words, new Flow(sheet)).write();
      }
      return sheet.finish();
    }
  }

  private void write() {
    new TravellerHead(traveller, words).set(flow);
    flow.gap(3);
    ring();
    Notices.set(
        flow,
        words,
        traveller.type(),
        traveller.handling(),
        traveller.layout().slots(),
        traveller.layout().adhesive());
    var tables = new StepTable(words, traveller.layout());
    Table steps = tables.steps(flow, traveller);
    flow.heading(
        words.say(traveller.inFillingOrder() ? "step.title.filling" : "step.title.slots"),
        17 + 6 * traveller.planned().size() + steps.startHeight());
    for (String sentence : traveller.planned()) {
      flow.paragraph(sentence, Lettering.bold(11));
    }
    flow.paragraph(words.say("step.explained"), Lettering.plain(11));
    flow.gap(1.5);
    steps.set();
    if (!traveller.finished().isEmpty()) {
      Table finished = tables.finished(flow, traveller.finished());
      flow.heading(words.say("finished.title"), finished.startHeight());
      finished.set();
    }
    signatures();
  }

  private RingPicture picture() {
    Map<Integer, Step> steps = new HashMap<>();
    for (Step step : traveller.steps()) {
      if (steps.put(step.slot(), step) != null) {
        throw new IllegalArgumentException(
            "the traveller of rotor "
                + traveller.facts().code()
                + " names slot "
                + step.slot()
                + " twice");
      }
    }
    List<DrawnSlot> slots = new ArrayList<>();
    for (int slot = 1; slot <= traveller.layout().slots(); slot++) {
      Step step = steps.remove(slot);
      slots.add(
          step == null
              ? new DrawnSlot(slot, null, null, null)
              : new DrawnSlot(slot, step.facing(), step.lot(), null));
    }
    if (!steps.isEmpty()) {
      throw new IllegalArgumentException(
          "layout "
              + traveller.layout().name()
              + " has slots 1 to "
              + traveller.layout().slots()
              + ", not "
              + steps.keySet().iterator().next());
    }
    return new RingPicture(
        traveller.layout(),
        traveller.type(),
        traveller.sideType(),
        traveller.facts().code(),
        slots,
        Face.MARKED,
        null,
        List.of(),
        words.language());
  }

  /// The ring; one that is small at true size is drawn enlarged with its true size beside it.
  private void ring() {
    RingPicture picture = picture();
    if (flow.room() < LEAST_RING_HEIGHT) {
      flow.newPage();
    }
    double height = flow.room() - 1;
    var trueSize = RingDrawing.scaled(picture, flow.typeface(), 1, INSET);
    if (trueSize.ringWidth() <= INSET) {
      double left = flow.width() - INSET - 6;
      var large = RingDrawing.fitting(picture, flow.typeface(), left, height);
      Canvas strip = flow.take(large.height());
      large.draw(strip);
      trueSize.drawBare(strip.moved(left + 6, 4));
    } else {
      var drawing = RingSizes.best(picture, flow.typeface(), flow.width(), height);
      drawing.draw(flow.take(drawing.height()));
    }
  }

  private void signatures() {
    flow.gap(6);
    flow.need(3 * 13);
    for (String key : List.of("sign.built", "sign.checked", "sign.remarks")) {
      Canvas strip = flow.take(13);
      strip.text(words.say(key), 0, 10, Lettering.plain(11), Anchor.START);
      strip.stroke(new Line2D.Double(48, 10.5, flow.width(), 10.5), Palette.GRAPHITE, 0.25);
    }
  }
}
