package lodebook.ui.cli;

import lodebook.db.stock.PieceDecisions;
import lodebook.db.stock.PieceName;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// End the hold of a piece.
@Command(
    name = "free",
    description = "End the hold of a piece.",
    footer = {"", "Example:", "  lodebook piece free L-2404/0017 --why \"only a scratch\""})
final class PieceFree extends Verb {
  @Parameters(paramLabel = "PIECE", description = "the piece, such as L-2404/0017")
  private String piece = "";

  @Option(names = "--why", paramLabel = "TEXT", required = true, description = "the reason")
  private String why = "";

  PieceFree(Session session) {
    super(session);
  }

  @Override
  int run() {
    PieceName name = PieceName.of(piece);
    session.change(book -> new PieceDecisions(book).free(session.act(), name, why));
    session.done("piece.freed", name);
    session.next("lodebook piece show " + name);
    return 0;
  }
}
