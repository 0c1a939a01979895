package lodebook.reports.traveller;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import lodebook.assembly.layout.InsertFrom;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.magnet.MagnetType;
import lodebook.reports.canvas.Anchor;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Wrap;
import lodebook.reports.sheet.Flow;
import lodebook.reports.sheet.ScanCode;
import lodebook.reports.words.Words;

/// The head of a traveller: the rotor's number as large as it fits, and what it is.
final class TravellerHead {
  private static final Lettering NAME = Lettering.plain(9.5);
  private static final Lettering VALUE = Lettering.bold(11);

  /// Side of the code to scan, millimetres.
  private static final double CODE = 26;

  private static final double NAME_WIDTH = 27;

  private record Fact(String name, String value) {}

  private final Traveller traveller;
  private final Words words;

  TravellerHead(Traveller traveller, Words words) {
    this.traveller = traveller;
    this.words = words;
  }

  void set(Flow flow) {
    Canvas line = flow.take(7);
    line.text(words.say("traveller.kind"), 0, 5, Lettering.plain(13), Anchor.START);
    if (traveller.facts().copy() > 1) {
      String copy = words.say("sheet.copy", Integer.toString(traveller.facts().copy()));
      line.text(copy, flow.width() - CODE, 5, Lettering.bold(15), Anchor.END);
    }
    ScanCode.draw(line.moved(flow.width() - CODE + 2, -2), traveller.facts().code(), CODE);
    number(flow);
    facts(flow);
  }

  private void number(Flow flow) {
    String code = traveller.facts().code();
    Lettering lettering = Lettering.bold(40);
    while (lettering.sizePoints() > 18
        && flow.typeface().width(code, lettering) > flow.width() - CODE) {
      lettering = lettering.sized(lettering.sizePoints() - 1);
    }
    double beside = CODE - 8;
    for (String part : Wrap.lines(code, flow.typeface(), lettering, flow.width() - CODE)) {
      double height = 1.16 * lettering.sizeMillimetres();
      beside -= height;
      flow.take(height).text(part, 0, 0.86 * height, lettering, Anchor.START);
    }
    flow.gap(Math.max(2, beside));
  }

  private List<Fact> collect() {
    Layout layout = traveller.layout();
    List<Fact> facts = new ArrayList<>();
    facts.add(new Fact(words.say("fact.layout"), layout.code() + " rev " + layout.revision()));
    facts.add(
        new Fact(
            words.say("fact.gear"),
            traveller.gear() == null ? words.say("fact.gear.none") : traveller.gear()));
    facts.add(
        new Fact(
            words.say("fact.batch"),
            traveller.batch() == null ? words.say("fact.batch.none") : traveller.batch()));
    facts.add(new Fact(words.say("fact.magnets"), magnets()));
    facts.add(new Fact(words.say("fact.lots"), lots()));
    facts.add(new Fact(words.say("fact.insert"), words.say("insert." + insertion(layout))));
    if (!layout.adhesive().isEmpty()) {
      Double minutes = layout.adhesiveWorkingMinutes();
      facts.add(
          new Fact(
              words.say("fact.adhesive"),
              minutes == null
                  ? layout.adhesive()
                  : words.say(
                      "fact.adhesive.minutes", layout.adhesive(), words.number(minutes, 0))));
    }
    facts.add(
        new Fact(
            words.say("fact.probe"),
            words.say(
                "fact.probe.at",
                words.trimmed(1e3 * layout.probe().radiusMetres(), 2),
                words.trimmed(1e3 * layout.probe().heightMetres(), 2))));
    return facts;
  }

  private static String insertion(Layout layout) {
    InsertFrom from = layout.insertFrom();
    return switch (from) {
      case FACE -> "face";
      case OUTSIDE -> "outside";
      case INSIDE -> "inside";
    };
  }

  private String magnets() {
    Layout layout = traveller.layout();
    MagnetType side = traveller.sideType();
    if (side == null) {
      return words.say(
          "fact.magnets.of",
          Integer.toString(layout.slots()),
          traveller.type().code(),
          traveller.type().grade());
    }
    long along =
        java.util.stream.IntStream.rangeClosed(1, layout.slots()).filter(layout::liesAlong).count();
    return words.say(
        "fact.magnets.sides",
        Long.toString(layout.slots() - along),
        traveller.type().code(),
        Long.toString(along),
        side.code());
  }

  private String lots() {
    var lots = new TreeSet<String>();
    traveller.steps().forEach(step -> lots.add(step.lot()));
    return lots.isEmpty() ? words.say("fact.lots.none") : String.join(", ", lots);
  }

  /// The facts in two columns.
  private void facts(Flow flow) {
    List<Fact> facts = collect();
    double column = (flow.width() - 6) / 2;
    for (int i = 0; i < facts.size(); i += 2) {
      var left = lines(flow, facts.get(i), column);
      List<String> right = i + 1 < facts.size() ? lines(flow, facts.get(i + 1), column) : List.of();
      double height = 5 * Math.max(left.size(), right.size()) + 0.8;
      Canvas strip = flow.take(height);
      fact(strip, facts.get(i), left);
      if (i + 1 < facts.size()) {
        fact(strip.moved(column + 6, 0), facts.get(i + 1), right);
      }
    }
  }

  private static List<String> lines(Flow flow, Fact fact, double column) {
    return Wrap.lines(fact.value(), flow.typeface(), VALUE, column - NAME_WIDTH);
  }

  private static void fact(Canvas place, Fact fact, List<String> lines) {
    place.text(fact.name(), 0, 4, NAME, Anchor.START);
    for (int i = 0; i < lines.size(); i++) {
      place.text(lines.get(i), NAME_WIDTH, 4 + 5 * i, VALUE, Anchor.START);
    }
  }
}
