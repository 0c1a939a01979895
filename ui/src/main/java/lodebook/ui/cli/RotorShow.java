package lodebook.ui.cli;

import java.util.ArrayList;
import java.util.List;
import lodebook.assembly.survey.ExpectedReading;
import lodebook.assembly.survey.Verdict;
import lodebook.db.book.Book;
import lodebook.db.builds.Plan;
import lodebook.db.builds.PlannedSlot;
import lodebook.db.builds.Plans;
import lodebook.db.builds.RecordedPlacement;
import lodebook.db.builds.Rotor;
import lodebook.db.builds.RotorShown;
import lodebook.db.builds.Rotors;
import lodebook.db.layouts.LayoutWords;
import lodebook.db.surveys.Surveys;
import lodebook.reports.words.FacingWords;
import lodebook.ui.craft.Expectations;
import lodebook.ui.craft.PlannedRing;
import lodebook.ui.words.Amounts;
import org.jspecify.annotations.Nullable;
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

  /// What is shown of a rotor.
  ///
  /// @param ring its plan, or null
  /// @param verdict what the latest survey's check said, or null where none was made
  private record Shown(RotorShown rotor, @Nullable PlannedRing ring, @Nullable Verdict verdict) {}

  @Override
  int run() {
    Shown shown = session.read(this::read);
    if (session.common().json) {
      session.json(document(shown));
    } else {
      session.say(text(shown));
    }
    return 0;
  }

  private Shown read(Book book) {
    RotorShown shown = new Rotors(book).show(code);
    Rotor rotor = shown.rotor();
    boolean open = rotor.planned() && rotor.state().equals("open");
    String survey = rotor.latestSurvey();
    return new Shown(
        shown,
        open ? PlannedRing.of(book, new Plans(book).show(rotor.code())) : null,
        survey == null ? null : new Surveys(book).show(survey).verdict());
  }

  private String text(Shown all) {
    RotorShown shown = all.rotor();
    Rotor rotor = shown.rotor();
    PlannedRing ring = all.ring();
    String head =
        new Table("ROTOR", rotor.code() + ", " + rotor.state())
            .row("layout", rotor.layout())
            .row("filled", rotor.filled() + " of " + rotor.slots())
            .row("plan", rotor.planned() ? "yes" : "none")
            .row("latest survey", survey(rotor, all.verdict()))
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
    List<String> parts = new ArrayList<>(List.of(head));
    parts.add(table.isEmpty() ? session.words().say("rotor.empty") : table.text());
    if (ring != null) {
      parts.add("");
      parts.add(plan(ring));
    }
    return String.join("\n", parts);
  }

  private String survey(Rotor rotor, @Nullable Verdict verdict) {
    String survey = rotor.latestSurvey();
    return survey == null
        ? "-"
        : verdict == null
            ? session.words().say("rotor.survey-unchecked", survey)
            : session.words().say("rotor.survey-verdict", survey, verdict.word());
  }

  private String plan(PlannedRing ring) {
    Plan plan = ring.plan();
    String made =
        session
            .words()
            .say(
                "plan.made",
                plan.by(),
                Amounts.minute(plan.at(), session.zone()),
                plan.seed(),
                plan.settings(),
                plan.programVersion(),
                plan.stockLine());
    return new PlanWords(session.words()).of(ring, null)
        + "\n"
        + made
        + "\n"
        + session.words().say("plan.readings")
        + "\n"
        + readings(ring).text();
  }

  private static Table readings(PlannedRing ring) {
    Expectations expectations = ring.expectations();
    Table table =
        new Table(">STEP", ">SLOT", "SPOT", "COMPONENT", ">WHEN PLACED", ">+-", ">FINISHED", ">+-");
    for (PlannedSlot slot : PlanWords.inOrder(ring.plan())) {
      List<ExpectedReading> placed = expectations.whenPlaced(slot.slot());
      List<ExpectedReading> finished = expectations.finished(slot.slot());
      for (int i = 0; i < finished.size(); i++) {
        table.row(
            slot.fillStep(),
            slot.slot(),
            LayoutWords.word(finished.get(i).point().spot()),
            LayoutWords.word(finished.get(i).point().component()),
            Amounts.milliTesla(placed.get(i).valueTesla()),
            Amounts.milliTesla(placed.get(i).bandTesla()),
            Amounts.milliTesla(finished.get(i).valueTesla()),
            Amounts.milliTesla(finished.get(i).bandTesla()));
      }
    }
    return table;
  }

  private static Json document(Shown all) {
    PlannedRing ring = all.ring();
    Verdict verdict = all.verdict();
    return json(all.rotor().rotor())
        .put("latestVerdict", verdict == null ? null : verdict.word())
        .put("placements", all.rotor().placements().stream().map(RotorShow::json).toList())
        .put("plan", ring == null ? null : PlanJson.of(ring, null));
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
