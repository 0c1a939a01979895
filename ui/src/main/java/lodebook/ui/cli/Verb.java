package lodebook.ui.cli;

import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Model.CommandSpec;
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
    return run();
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
