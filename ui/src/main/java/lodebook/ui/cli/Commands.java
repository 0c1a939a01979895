package lodebook.ui.cli;

import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.function.Predicate;
import lodebook.ui.words.Nearest;
import lodebook.ui.words.Words;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine;
import picocli.CommandLine.Help.Ansi;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.UnmatchedArgumentException;

/// The tree of commands: a noun, then a verb.
///
/// Only the noun that is spoken of gets its verbs, so that a command starts fast; help and
/// completion see them all.
final class Commands {
  private static final int WIDTH = 80;

  private Commands() {}

  /// The command line for some words: with the verbs of the nouns that they name.
  static CommandLine tree(Session session, List<String> words) {
    return tree(session, words::contains);
  }

  /// The whole command line.
  static CommandLine whole(Session session) {
    return tree(session, _ -> true);
  }

  private static CommandLine tree(Session session, Predicate<String> spoken) {
    CommandLine top = new CommandLine(new Top(session));
    for (Noun noun : Nouns.all()) {
      CommandSpec spec = CommandSpec.wrapWithoutInspection(new BareNoun(noun.name(), session));
      spec.name(noun.name()).usageMessage().description(session.words().say("noun." + noun.name()));
      CommandLine line = new CommandLine(spec);
      if (spoken.test(noun.name())) {
        noun.verbs().apply(session).forEach(line::addSubcommand);
      }
      top.addSubcommand(line);
    }
    Nouns.alone(session).forEach(top::addSubcommand);
    top.setUsageHelpWidth(WIDTH);
    top.setColorScheme(CommandLine.Help.defaultColorScheme(Ansi.OFF));
    return top;
  }

  /// The command that some words name, as far as they name one.
  static CommandLine find(CommandLine top, List<String> words) {
    CommandLine found = top;
    for (String word : words) {
      CommandLine inner = found.getSubcommands().get(word);
      if (inner == null) {
        throw new UnmatchedArgumentException(found, word);
      }
      found = inner;
    }
    return found;
  }

  /// What is wrong with a command line, in a sentence.
  static String sentence(ParameterException wrong, Words words) {
    String unknown = unknownCommand(wrong);
    return unknown == null
        ? new LineWords(words).sentence(wrong)
        : words.say("line.no-command", unknown);
  }

  /// Commands or options that may have been meant.
  static List<String> similar(ParameterException wrong) {
    String unknown = unknownCommand(wrong);
    if (unknown != null) {
      CommandLine at = wrong.getCommandLine();
      String near = Nearest.to(unknown, at.getSubcommands().keySet());
      return near == null ? List.of() : List.of(at.getCommandSpec().qualifiedName() + " " + near);
    }
    return wrong instanceof UnmatchedArgumentException unmatched
        ? unmatched.getSuggestions()
        : List.of();
  }

  private static @Nullable String unknownCommand(ParameterException wrong) {
    if (wrong instanceof UnmatchedArgumentException unmatched
        && !unmatched.isUnknownOption()
        && !unmatched.getCommandLine().getSubcommands().isEmpty()) {
      return unmatched.getUnmatched().getFirst();
    }
    return null;
  }

  static PrintWriter writer(PrintStream stream) {
    return new PrintWriter(stream, true, StandardCharsets.UTF_8);
  }
}
