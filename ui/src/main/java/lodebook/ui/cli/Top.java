package lodebook.ui.cli;

import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/// `lodebook` alone: shows the help; the command line is wrong until there is a desktop to open.
@Command(
    name = "lodebook",
    description = "The shop's book of magnets, rotors and gears.",
    synopsisSubcommandLabel = "NOUN VERB",
    footer = {"", "For one command: lodebook help NOUN VERB", "Example: lodebook help lot import"})
final class Top implements Callable<Integer> {
  private final Session session;

  @Mixin private final Common common;

  Top(Session session) {
    this.session = session;
    this.common = session.common();
  }

  @Override
  public Integer call() {
    HelpCommand.overview(session);
    return common.help ? 0 : Failures.WRONG_LINE;
  }
}
