package lodebook.ui.cli;

import lodebook.db.stock.Trays;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Declares a tray unsure.
@Command(
    name = "unsure",
    description = "Say that nobody knows which piece lies where: its pieces count as unmeasured.",
    footer = {"", "Example:", "  lodebook tray unsure T-11 --why \"dropped\""})
final class TrayUnsure extends Verb {
  @Parameters(paramLabel = "TRAY", description = "number of the tray")
  private String tray = "";

  @Option(names = "--why", paramLabel = "TEXT", required = true, description = "the reason")
  private String why = "";

  TrayUnsure(Session session) {
    super(session);
  }

  @Override
  int run() {
    int pieces = session.write(book -> new Trays(book).unsure(session.act(), tray, why));
    session.done("tray.unsure", tray, pieces);
    session.next("lodebook piece import LOT readings.csv");
    return 0;
  }
}
