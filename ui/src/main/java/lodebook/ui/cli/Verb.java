package lodebook.ui.cli;

import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/// One command.
abstract class Verb implements Callable<Integer> {
  final Session session;

  @Spec @Nullable CommandSpec spec;

  Verb(Session session) {
    this.session = session;
  }

  /// Does it.
  ///
  /// @return the exit code
  abstract int run();

  @Override
  public final Integer call() {
    session.doing(spec().qualifiedName().replaceFirst("^lodebook ", ""));
    refuseBlankReason();
    return run();
  }

  private void refuseBlankReason() {
    for (OptionSpec option : spec().options()) {
      boolean reason = option.paramLabel().equals("TEXT");
      if (reason && option.getValue() instanceof String text && given(option) && text.isBlank()) {
        throw wrongLine("line.blank", option.longestName());
      }
    }
  }

  private boolean given(OptionSpec option) {
    return spec().commandLine().getParseResult().hasMatchedOption(option);
  }

  private CommandSpec spec() {
    if (spec == null) {
      throw new IllegalStateException("the command line was not parsed");
    }
    return spec;
  }

  /// The refusal of the command line.
  ParameterException wrongLine(String key, Object... arguments) {
    return new ParameterException(spec().commandLine(), session.words().say(key, arguments));
  }
}
