package lodebook.ui.cli;

import java.util.List;
import lodebook.db.layouts.GearRevision;
import lodebook.db.layouts.Gears;
import lodebook.ui.words.Amounts;
import picocli.CommandLine.Command;

/// Lists the gear models.
@Command(
    name = "list",
    description = "List the gear models and their revisions.",
    footer = {"", "Example:", "  lodebook gear list"})
final class GearList extends Verb {

  GearList(Session session) {
    super(session);
  }

  @Override
  int run() {
    List<GearRevision> all = session.read(book -> new Gears(book).list());
    Table table = new Table("GEAR", "REV", "INNER", "OUTER", ">PIECES", ">RATIO", "STATE");
    all.forEach(
        g ->
            table.row(
                g.model().code(),
                g.model().revision(),
                g.model().inner().layout().name(),
                g.model().outer().layout().name(),
                g.model().modulatorPieces(),
                Amounts.plain(g.model().ratio()),
                g.draft() ? "draft" : "released"));
    session.list(Json.list(all.stream().map(GearShow::json).toList()), table, "gear.none");
    return 0;
  }
}
