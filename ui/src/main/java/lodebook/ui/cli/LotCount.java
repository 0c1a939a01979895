package lodebook.ui.cli;

import lodebook.db.stock.LotDecisions;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Says how many pieces a lot really has.
@Command(
    name = "count",
    description = "Say how many pieces a lot really has.",
    footer = {"", "Example:", "  lodebook lot count L-2404 39 --why \"one chipped in its box\""})
final class LotCount extends Verb {
  @Parameters(index = "0", paramLabel = "LOT", description = "number of the lot")
  private String lot = "";

  @Parameters(index = "1", paramLabel = "N", description = "how many there are")
  private int count;

  @Option(names = "--why", paramLabel = "TEXT", required = true, description = "the reason")
  private String why = "";

  LotCount(Session session) {
    super(session);
  }

  @Override
  int run() {
    session.change(book -> new LotDecisions(book).count(session.act(), lot, count, why));
    session.done("lot.count", lot, count);
    session.next("lodebook lot show " + lot);
    return 0;
  }
}
