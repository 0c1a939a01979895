package lodebook.ui.cli;

import lodebook.db.stock.PieceDecisions;
import lodebook.db.stock.PieceName;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Say that a piece is gone.
@Command(
    name = "scrap",
    description = "Say that a piece is gone.",
    footer = {
      "",
      "Example:",
      "  lodebook piece scrap L-2404/0017 --why \"broke while being placed\""
    })
final class PieceScrap extends Verb {
  @Parameters(paramLabel = "PIECE", description = "the piece, such as L-2404/0017")
  private String piece = "";

  @Option(names = "--why", paramLabel = "TEXT", required = true, description = "the reason")
  private String why = "";

  PieceScrap(Session session) {
    super(session);
  }

  @Override
  int run() {
    PieceName name = PieceName.of(piece);
    session.change(book -> new PieceDecisions(book).scrap(session.act(), name, why));
    session.done("piece.scrapped", name);
    session.next("lodebook piece show " + name);
    return 0;
  }
}
