package lodebook.ui.cli;

import java.time.LocalDate;
import java.util.List;
import java.util.stream.Collectors;
import lodebook.ui.words.Words;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.MissingParameterException;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.OverwrittenOptionException;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.UnmatchedArgumentException;

/// What is wrong with a command line, in a sentence.
final class LineWords {
  private final Words words;

  LineWords(Words words) {
    this.words = words;
  }

  String sentence(ParameterException wrong) {
    ArgSpec arg = wrong.getArgSpec();
    return switch (wrong) {
      case MissingParameterException missing when !missing.getMissing().isEmpty() ->
          words.say(
              missing.getMissing().size() == 1 ? "line.missing" : "line.missing-several",
              labels(missing.getMissing()));
      case UnmatchedArgumentException unmatched ->
          words.say(
              unmatched.isUnknownOption() ? "line.no-option" : "line.one-too-many",
              unmatched.getUnmatched().getFirst());
      case OverwrittenOptionException twice ->
          words.say("line.twice", name(twice.getOverwritten()));
      default -> notRead(wrong, arg);
    };
  }

  private String notRead(ParameterException wrong, @Nullable ArgSpec arg) {
    String expected = arg == null ? null : expected(arg.type());
    return arg == null || expected == null || wrong.getValue() == null
        ? String.valueOf(wrong.getMessage())
        : words.say("line.not-read", name(arg), wrong.getValue(), words.say(expected));
  }

  private static @Nullable String expected(Class<?> type) {
    if (type == LocalDate.class) {
      return "line.day";
    }
    if (type == double.class || type == Double.class) {
      return "line.number";
    }
    return type == int.class || type == long.class || type == Integer.class || type == Long.class
        ? "line.whole-number"
        : null;
  }

  private static String labels(List<ArgSpec> args) {
    return args.stream()
        .map(arg -> arg.isOption() ? name(arg) + " " + arg.paramLabel() : arg.paramLabel())
        .collect(Collectors.joining(", "));
  }

  private static String name(ArgSpec arg) {
    return arg instanceof OptionSpec option ? option.longestName() : arg.paramLabel();
  }
}
