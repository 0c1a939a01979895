package lodebook.ui.cli;

import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Shows all commands, or how one is used.
@Command(
    name = "help",
    description = "List all commands, or show how one is used.",
    footer = {"", "Example:", "  lodebook help lot import"})
final class HelpCommand extends Verb {
  @Parameters(paramLabel = "WORD", arity = "0..*", description = "a noun, or a noun and a verb")
  private List<String> command = new ArrayList<>();

  HelpCommand(Session session) {
    super(session);
  }

  @Override
  int run() {
    if (command.isEmpty()) {
      overview(session);
    } else {
      Commands.find(Commands.whole(session), command).usage(session.around().out());
    }
    return 0;
  }

  /// All commands, a line each.
  static void overview(Session session) {
    CommandLine whole = Commands.whole(session);
    Table table = new Table("", "");
    for (CommandLine noun : whole.getSubcommands().values()) {
      if (noun.getSubcommands().isEmpty()) {
        table.row(noun.getCommandName(), summary(noun));
      }
      for (CommandLine verb : noun.getSubcommands().values()) {
        table.row(noun.getCommandName() + " " + verb.getCommandName(), summary(verb));
      }
    }
    session.around().out().println(session.words().say("help.head"));
    session.around().out().println(table.text());
    session.around().out().println();
    session.around().out().println(session.words().say("help.foot"));
  }

  private static String summary(CommandLine command) {
    String[] description = command.getCommandSpec().usageMessage().description();
    return description.length == 0 ? "" : description[0];
  }
}
