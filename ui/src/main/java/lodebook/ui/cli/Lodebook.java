package lodebook.ui.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.time.Clock;
import java.time.ZoneId;
import java.util.List;
import java.util.Map;
import picocli.CommandLine;
import picocli.CommandLine.ParameterException;

/// The command line as one function: words and surroundings in, exit code out.
public final class Lodebook {
  private Lodebook() {}

  /// Runs one command with the process's own streams, in UTF-8.
  ///
  /// @return the exit code
  public static int run(String[] args) {
    PrintStream out = stream(FileDescriptor.out);
    PrintStream err = stream(FileDescriptor.err);
    int code = run(List.of(args), System.getenv(), out, err, Clock.system(ZoneId.systemDefault()));
    out.flush();
    err.flush();
    return code;
  }

  private static PrintStream stream(FileDescriptor descriptor) {
    return new PrintStream(new FileOutputStream(descriptor), true, StandardCharsets.UTF_8);
  }

  /// Runs one command.
  ///
  /// @param args the words after `lodebook`
  /// @param env environment variables
  /// @param out where answers go
  /// @param err where people's text goes that is no answer
  /// @param clock the one clock, with the station's zone
  /// @return the exit code
  public static int run(
      List<String> args, Map<String, String> env, PrintStream out, PrintStream err, Clock clock) {
    Session session = new Session(new Surroundings(env, out, err, clock));
    Failures failures = new Failures(session);
    CommandLine tree = Commands.tree(session, args);
    tree.setParameterExceptionHandler((wrong, _) -> wrongLine(wrong, session));
    tree.setExecutionExceptionHandler((failure, _, _) -> failures.handle(failure));
    tree.setOut(Commands.writer(out));
    tree.setErr(Commands.writer(err));
    try {
      return tree.execute(args.toArray(String[]::new));
    } catch (RuntimeException | Error failure) {
      return failures.handle(failure);
    } finally {
      out.flush();
      err.flush();
    }
  }

  private static int wrongLine(ParameterException wrong, Session session) {
    CommandLine command = wrong.getCommandLine();
    PrintStream err = session.around().err();
    err.println(session.words().say("line.wrong", Commands.sentence(wrong, session.words())));
    List<String> similar = Commands.similar(wrong);
    if (!similar.isEmpty()) {
      err.println(session.words().say("line.did-you-mean", String.join(", ", similar)));
    }
    String name = command.getCommandSpec().qualifiedName();
    err.println(
        session
            .words()
            .say("line.help", name.replaceFirst("^lodebook ?", "lodebook help ").strip()));
    return Failures.WRONG_LINE;
  }
}
