package lodebook.ui.cli;

import lodebook.db.builds.Rotor;
import lodebook.db.builds.Rotors;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Scraps a rotor.
@Command(
    name = "scrap",
    description = "Scrap a rotor with everything in it.",
    footer = {"", "Example:", "  lodebook rotor scrap R-0001 --why \"cured with slot 3 reversed\""})
final class RotorScrap extends Verb {
  @Parameters(paramLabel = "ROTOR", description = "its number")
  private String rotor = "";

  @Option(names = "--why", paramLabel = "TEXT", required = true, description = "the reason")
  private String why = "";

  RotorScrap(Session session) {
    super(session);
  }

  @Override
  int run() {
    Rotor scrapped = session.write(book -> new Rotors(book).scrap(session.act(), rotor, why));
    session.done("rotor.scrapped", scrapped.code());
    session.next("lodebook rotor list");
    return 0;
  }
}
