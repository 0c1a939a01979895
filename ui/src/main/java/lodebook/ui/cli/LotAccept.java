package lodebook.ui.cli;

import lodebook.db.stock.LotDecisions;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Lets a lot be planned and placed.
@Command(
    name = "accept",
    description = "Let a lot be planned and placed.",
    footer = {
      "",
      "Example:",
      "  lodebook lot accept L-2404 --why \"certificate and readings agree\""
    })
final class LotAccept extends Verb {
  @Parameters(paramLabel = "LOT", description = "number of the lot")
  private String lot = "";

  @Option(names = "--why", paramLabel = "TEXT", required = true, description = "the reason")
  private String why = "";

  LotAccept(Session session) {
    super(session);
  }

  @Override
  int run() {
    session.change(book -> new LotDecisions(book).accept(session.act(), lot, why));
    session.done("lot.accept", lot);
    session.next("lodebook layout import layout.json");
    return 0;
  }
}
