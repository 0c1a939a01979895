package lodebook.ui.cli;

import java.util.List;
import lodebook.db.builds.Batch;
import lodebook.db.builds.Batches;
import lodebook.ui.words.Amounts;
import picocli.CommandLine.Command;

/// Lists the batches.
@Command(
    name = "list",
    description = "List the batches and how far they are.",
    footer = {"", "Example:", "  lodebook batch list"})
final class BatchList extends Verb {

  BatchList(Session session) {
    super(session);
  }

  @Override
  int run() {
    List<Batch> all = session.read(book -> new Batches(book).list());
    Table table = new Table("BATCH", "GEAR", ">GEARS", ">ROTORS", ">FULL", "OPENED");
    all.forEach(
        b ->
            table.row(
                b.code(),
                b.gear(),
                b.gears(),
                b.rotors().size(),
                b.rotors().stream().filter(r -> r.filled() == r.slots()).count(),
                Amounts.minute(b.openedAt(), session.zone())));
    session.list(Json.list(all.stream().map(BatchShow::json).toList()), table, "batch.none");
    return 0;
  }
}
