package lodebook.ui.cli;

import lodebook.db.builds.RecordedPlacement;
import lodebook.db.builds.Rotor;
import lodebook.db.builds.RotorShown;
import lodebook.db.builds.Rotors;
import lodebook.reports.words.FacingWords;
import lodebook.ui.words.Amounts;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Shows a rotor.
@Command(
    name = "show",
    description = "Show a rotor, what stands in it and what stood in it before.",
    footer = {"", "Example:", "  lodebook rotor show R-0001"})
final class RotorShow extends Verb {
  @Parameters(paramLabel = "ROTOR", description = "its number")
  private String code = "";

  RotorShow(Session session) {
    super(session);
  }

  @Override
  int run() {
    RotorShown shown = session.read(book -> new Rotors(book).show(code));
    if (!session.json(document(shown))) {
      session.say(text(shown));
    }
    return 0;
  }

  private String text(RotorShown shown) {
    Rotor rotor = shown.rotor();
    String head =
        new Table("ROTOR", rotor.code() + ", " + rotor.state())
            .row("layout", rotor.layout())
            .row("filled", rotor.filled() + " of " + rotor.slots())
            .row("plan", rotor.planned() ? "yes" : "none")
            .row("latest survey", RotorList.dash(rotor.latestSurvey()))
            .row("batch", RotorList.dash(rotor.batch()))
            .row("unit", RotorList.dash(rotor.unit()))
            .text();
    FacingWords words = new FacingWords(session.words().locale());
    Table table = new Table(">SLOT", "PIECE", "FACING", "BY", "WHEN", "");
    for (RecordedPlacement placement : shown.placements()) {
      RecordedPlacement.Ended ended = placement.ended();
      table.row(
          placement.slot(),
          placement.magnet(),
          words.of(shown.design().layout(), placement.slot(), placement.facing()),
          placement.by(),
          Amounts.minute(placement.at(), session.zone()),
          (placement.deviation() ? "deviation " : "") + (ended == null ? "" : ended.kind()));
    }
    return table.isEmpty()
        ? head + "\n" + session.words().say("rotor.empty")
        : head + "\n" + table.text();
  }

  private static Json document(RotorShown shown) {
    return json(shown.rotor())
        .put("placements", shown.placements().stream().map(RotorShow::json).toList());
  }

  private static Json json(RecordedPlacement placement) {
    RecordedPlacement.Ended ended = placement.ended();
    return Json.object()
        .put("slot", placement.slot())
        .put("piece", placement.magnet())
        .put("facingDegrees", placement.facing().degrees())
        .put("deviation", placement.deviation())
        .put("why", placement.why())
        .put("by", placement.by())
        .put("at", placement.at())
        .put("ended", ended == null ? null : ended.kind());
  }

  static Json json(Rotor rotor) {
    return Json.object()
        .put("rotor", rotor.code())
        .put("layout", rotor.layout())
        .put("state", rotor.state())
        .put("slots", rotor.slots())
        .put("filled", rotor.filled())
        .put("planned", rotor.planned())
        .put("latestSurvey", rotor.latestSurvey())
        .put("batch", rotor.batch())
        .put("gearNumber", rotor.gearNumber())
        .put("ring", rotor.ring())
        .put("unit", rotor.unit())
        .put("openedAt", rotor.openedAt());
  }
}
