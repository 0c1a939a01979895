package lodebook.ui.cli;

import lodebook.db.stock.PieceDecisions;
import lodebook.db.stock.PieceName;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Put a piece aside: it is neither planned nor placed.
@Command(
    name = "hold",
    description = "Put a piece aside: it is neither planned nor placed.",
    footer = {"", "Example:", "  lodebook piece hold L-2404/0017 --why \"chipped corner\""})
final class PieceHold extends Verb {
  @Parameters(paramLabel = "PIECE", description = "the piece, such as L-2404/0017")
  private String piece = "";

  @Option(names = "--why", paramLabel = "TEXT", required = true, description = "the reason")
  private String why = "";

  PieceHold(Session session) {
    super(session);
  }

  @Override
  int run() {
    PieceName name = PieceName.of(piece);
    session.change(book -> new PieceDecisions(book).hold(session.act(), name, why));
    session.done("piece.held", name);
    session.next("lodebook piece show " + name);
    return 0;
  }
}
