package lodebook.ui.process;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.time.Clock;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import lodebook.ui.cli.Lodebook;

/// A process that adds many meters to the book, one command after the other, once it has tried that
/// on a book aside. It stops at the first that fails and says what that said.
public final class ManyMeters {
  private ManyMeters() {}

  /// @param args the folder of the book aside, how the meters' numbers begin, how many to add
  public static void main(String[] args) {
    add(args[1] + "aside", List.of("--book", args[0]));
    int count = Integer.parseInt(args[2]);
    for (int i = 1; i <= count; i++) {
      add(args[1] + i, List.of());
    }
  }

  private static void add(String meter, List<String> options) {
    List<String> command = new ArrayList<>(List.of("meter", "add", meter, "--quiet"));
    command.addAll(List.of("--accuracy-percent", "1", "--calibration-due", "2099-12-31"));
    command.addAll(options);
    ByteArrayOutputStream said = new ByteArrayOutputStream();
    PrintStream stream = new PrintStream(said, true, StandardCharsets.UTF_8);
    Clock clock = Clock.system(ZoneOffset.UTC);
    int code = Lodebook.run(command, System.getenv(), stream, stream, clock);
    if (code != 0) {
      System.out.printf(
          "%s ended with %d%n%s", command, code, said.toString(StandardCharsets.UTF_8));
      System.exit(code);
    }
  }
}
