package lodebook.ui.cli;

import lodebook.db.stock.LotDecisions;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Puts a lot aside.
@Command(
    name = "hold",
    description = "Put a lot aside: nothing of it is planned or placed.",
    footer = {"", "Example:", "  lodebook lot hold L-2404 --why \"two boxes look different\""})
final class LotHold extends Verb {
  @Parameters(paramLabel = "LOT", description = "number of the lot")
  private String lot = "";

  @Option(names = "--why", paramLabel = "TEXT", required = true, description = "the reason")
  private String why = "";

  LotHold(Session session) {
    super(session);
  }

  @Override
  int run() {
    session.change(book -> new LotDecisions(book).hold(session.act(), lot, why));
    session.done("lot.hold", lot);
    session.next("lodebook trace " + lot);
    return 0;
  }
}
