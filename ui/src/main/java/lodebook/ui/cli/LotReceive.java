package lodebook.ui.cli;

import java.nio.file.Path;
import lodebook.db.stock.LotImport;
import lodebook.db.stock.NewLot;
import lodebook.ui.files.Example;
import lodebook.ui.files.LotFile;
import lodebook.ui.files.Rows;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Receives lots.
@Command(
    name = "import",
    description = "Receive lots of magnets; they await inspection.",
    footer = {"", "Example:", "  lodebook lot import lots.csv"})
final class LotReceive extends FileVerb {
  @Parameters(arity = "0..1", paramLabel = "FILE", description = "a CSV file")
  private @Nullable Path file;

  LotReceive(Session session) {
    super(session, Example.LOTS);
  }

  @Override
  int takeIn() {
    Rows<NewLot> rows = LotFile.read(session.source(need(file, "FILE")));
    importing(
        rows,
        () -> session.change(book -> new LotImport(book).importLots(session.act(), rows.all())));
    session.done("lot.imported", rows.count());
    session.next("lodebook piece import LOT readings.csv");
    return 0;
  }
}
