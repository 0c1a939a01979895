package lodebook.ui.cli;

import lodebook.db.layouts.LayoutRevision;
import lodebook.db.layouts.Layouts;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Releases a layout.
@Command(
    name = "release",
    description = "Release a draft: from then on it never changes and rotors can be built to it.",
    footer = {"", "Example:", "  lodebook layout release STIR-IN"})
final class LayoutRelease extends Verb {
  @Parameters(paramLabel = "LAYOUT", description = "CODE or CODE@REVISION")
  private String name = "";

  LayoutRelease(Session session) {
    super(session);
  }

  @Override
  int run() {
    LayoutRevision released = session.write(book -> new Layouts(book).release(session.act(), name));
    session.done("layout.released", LayoutShow.shown(released.layout()));
    session.next("lodebook rotor open " + released.layout().code() + " --serial R-0001");
    return 0;
  }
}
