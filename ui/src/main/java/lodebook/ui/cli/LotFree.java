package lodebook.ui.cli;

import lodebook.db.stock.LotDecisions;
import lodebook.db.stock.LotState;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Ends a hold.
@Command(
    name = "free",
    description = "End a hold: the lot is again what it was before.",
    footer = {"", "Example:", "  lodebook lot free L-2404 --why \"the supplier explained it\""})
final class LotFree extends Verb {
  @Parameters(paramLabel = "LOT", description = "number of the lot")
  private String lot = "";

  @Option(names = "--why", paramLabel = "TEXT", required = true, description = "the reason")
  private String why = "";

  LotFree(Session session) {
    super(session);
  }

  @Override
  int run() {
    LotState now = session.write(book -> new LotDecisions(book).free(session.act(), lot, why));
    session.done("lot.free", lot, now.words());
    session.next("lodebook lot show " + lot);
    return 0;
  }
}
