package lodebook.ui.cli;

import java.nio.file.Path;
import lodebook.db.stock.CellMove;
import lodebook.db.stock.TrayMoves;
import lodebook.ui.files.Example;
import lodebook.ui.files.MoveFile;
import lodebook.ui.files.Rows;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Lays pieces into other cells.
@Command(
    name = "move",
    description = "Lay pieces into other cells, all at once.",
    footer = {"", "Example:", "  lodebook tray move moves.csv"})
final class TrayMove extends FileVerb {
  @Parameters(arity = "0..1", paramLabel = "FILE", description = "a CSV file")
  private @Nullable Path file;

  TrayMove(Session session) {
    super(session, Example.MOVES);
  }

  @Override
  int takeIn() {
    Rows<CellMove> rows = MoveFile.read(session.source(need(file, "FILE")));
    importing(
        rows, () -> session.change(book -> new TrayMoves(book).move(session.act(), rows.all())));
    session.done("tray.moved", rows.count());
    session.next("lodebook tray show " + rows.all().getFirst().tray());
    return 0;
  }
}
