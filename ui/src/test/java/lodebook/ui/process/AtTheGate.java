package lodebook.ui.process;

import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.time.Clock;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import lodebook.ui.cli.Lodebook;

/// A process that gets ready by doing its command on a book aside, says so, and does it on the real
/// book once its input says go. So several that are started one by one do it at once.
public final class AtTheGate {
  static final String READY = "ready";

  private AtTheGate() {}

  /// @param args the folder of the book aside, and the command
  public static void main(String[] args) throws Exception {
    List<String> command = List.of(args).subList(1, args.length);
    List<String> trial = new ArrayList<>(command);
    trial.addAll(List.of("--book", args[0]));
    PrintStream nowhere =
        new PrintStream(OutputStream.nullOutputStream(), true, StandardCharsets.UTF_8);
    Clock clock = Clock.system(ZoneOffset.UTC);
    int code = Lodebook.run(trial, System.getenv(), nowhere, nowhere, clock);
    System.out.println(code == 0 ? READY : "the trial ended with " + code);
    if (System.in.read() < 0) {
      throw new IllegalStateException("the gate never opened");
    }
    System.exit(Lodebook.run(command.toArray(String[]::new)));
  }
}
