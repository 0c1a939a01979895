package lodebook.ui.cli;

import lodebook.db.layouts.GearRevision;
import lodebook.db.layouts.Gears;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Releases a gear model.
@Command(
    name = "release",
    description = "Release a draft: it never changes and gears can be built to it.",
    footer = {"", "Example:", "  lodebook gear release STIR"})
final class GearRelease extends Verb {
  @Parameters(paramLabel = "GEAR", description = "CODE or CODE@REVISION")
  private String name = "";

  GearRelease(Session session) {
    super(session);
  }

  @Override
  int run() {
    GearRevision gear = session.write(book -> new Gears(book).release(session.act(), name));
    session.done("gear.released", gear.model().spoken());
    session.next("lodebook batch open BATCH --gear " + gear.model().code() + " --count N");
    return 0;
  }
}
