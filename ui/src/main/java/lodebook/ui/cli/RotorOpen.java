package lodebook.ui.cli;

import lodebook.db.builds.Rotor;
import lodebook.db.builds.Rotors;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Opens a rotor.
@Command(
    name = "open",
    description = "Open a rotor to be built to a released layout.",
    footer = {"", "Example:", "  lodebook rotor open STIR-IN --serial R-0001"})
final class RotorOpen extends Verb {
  @Parameters(paramLabel = "LAYOUT", description = "CODE or CODE@REVISION")
  private String layout = "";

  @Option(names = "--serial", paramLabel = "ROTOR", required = true, description = "its number")
  private String serial = "";

  @Option(names = "--batch", paramLabel = "BATCH", description = "one more rotor of this batch")
  private @Nullable String batch;

  RotorOpen(Session session) {
    super(session);
  }

  @Override
  int run() {
    Rotor rotor =
        session.write(book -> new Rotors(book).open(session.act(), layout, serial, batch));
    session.done("rotor.opened", rotor.code(), rotor.layout(), rotor.slots());
    session.next("lodebook plan " + rotor.code() + " --from LOT");
    return 0;
  }
}
