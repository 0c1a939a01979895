package lodebook.ui.cli;

import lodebook.db.builds.Batch;
import lodebook.db.builds.Batches;
import lodebook.ui.words.Amounts;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Shows a batch.
@Command(
    name = "show",
    description = "Show a batch and its rotors.",
    footer = {"", "Example:", "  lodebook batch show B-31"})
final class BatchShow extends Verb {
  @Parameters(paramLabel = "BATCH", description = "its number")
  private String code = "";

  BatchShow(Session session) {
    super(session);
  }

  @Override
  int run() {
    Batch batch = session.read(book -> new Batches(book).show(code));
    if (!session.json(json(batch))) {
      session.say(
          new Table("BATCH", batch.code())
              .row("gear", batch.gear())
              .row("gears", batch.gears())
              .row("serials", batch.serials())
              .row("opened", Amounts.minute(batch.openedAt(), session.zone()))
              .text());
      Table table =
          new Table("ROTOR", ">GEAR", "RING", "STATE", ">FILLED", "PLAN", "SURVEY", "UNIT");
      batch
          .rotors()
          .forEach(
              r ->
                  table.row(
                      r.code(),
                      r.gearNumber() == null ? "-" : r.gearNumber(),
                      RotorList.dash(r.ring()),
                      r.state(),
                      r.filled() + "/" + r.slots(),
                      r.planned() ? "yes" : "-",
                      RotorList.dash(r.latestSurvey()),
                      RotorList.dash(r.unit())));
      session.say(table.text());
    }
    return 0;
  }

  static Json json(Batch batch) {
    return Json.object()
        .put("batch", batch.code())
        .put("gear", batch.gear())
        .put("gears", batch.gears())
        .put("serials", batch.serials())
        .put("openedAt", batch.openedAt())
        .put("rotors", batch.rotors().stream().map(RotorShow::json).toList());
  }
}
