package lodebook.ui.cli;

import lodebook.db.stock.LotDecisions;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Says that a lot is not to be used.
@Command(
    name = "reject",
    description = "Say that a lot is not to be used.",
    footer = {"", "Example:", "  lodebook lot reject L-2404 --why \"a fifth too weak\""})
final class LotReject extends Verb {
  @Parameters(paramLabel = "LOT", description = "number of the lot")
  private String lot = "";

  @Option(names = "--why", paramLabel = "TEXT", required = true, description = "the reason")
  private String why = "";

  LotReject(Session session) {
    super(session);
  }

  @Override
  int run() {
    session.change(book -> new LotDecisions(book).reject(session.act(), lot, why));
    session.done("lot.reject", lot);
    session.next("lodebook trace " + lot);
    return 0;
  }
}
