package lodebook.ui.cli;

import picocli.AutoComplete;
import picocli.CommandLine.Command;

/// Prints what a shell needs to complete the words of a command line.
@Command(
    name = "completion",
    description = "Print a script that lets bash or zsh complete commands.",
    footer = {"", "Example:", "  source <(lodebook completion)"})
final class CompletionCommand extends Verb {
  CompletionCommand(Session session) {
    super(session);
  }

  @Override
  int run() {
    session.around().out().print(AutoComplete.bash("lodebook", Commands.whole(session)));
    return 0;
  }
}
