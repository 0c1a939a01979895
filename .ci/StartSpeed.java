import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

/// How long `./lodebook lot list` takes on a small book, against a bare virtual machine of the same
/// JDK that opens the same file and reads one row: whole processes, by turns, medians.
///
/// From the top of a clone: `java .ci/StartSpeed.java [RUNS]`.
final class StartSpeed {
  private static final String ONE_ROW =
      """
      public class OneRow {
        public static void main(String[] args) throws Exception {
          try (var connection = java.sql.DriverManager.getConnection(args[0], "sa", "");
              var statement = connection.createStatement();
              var rows = statement.executeQuery("select id from lot fetch first row only")) {
            rows.next();
            System.out.println(rows.getInt(1));
          }
        }
      }
      """;

  public static void main(String[] args) throws Exception {
    int runs = args.length == 0 ? 15 : Integer.parseInt(args[0]);
    Path folder = Files.createTempDirectory("start-speed");
    Path bin = Path.of(System.getProperty("java.home"), "bin");
    Map<String, String> env =
        Map.of(
            "LODEBOOK_BOOK", folder.resolve("book").toString(),
            "LODEBOOK_BY", "AB",
            "JAVA_HOME", System.getProperty("java.home"));
    for (List<String> command : preparing(folder)) {
      seconds(command, env);
    }
    Path source = Files.writeString(folder.resolve("OneRow.java"), ONE_ROW);
    seconds(List.of(bin.resolve("javac").toString(), source.toString()), env);
    String url = "jdbc:h2:" + folder.resolve("book/book") + ";IFEXISTS=TRUE;MAX_COMPACT_TIME=0";
    List<String> bare =
        List.of(bin.resolve("java").toString(), "-cp", engine() + ":" + folder, "OneRow", url);
    List<String> list = List.of("./lodebook", "lot", "list");
    double[] ours = new double[runs];
    double[] theirs = new double[runs];
    for (int run = -2; run < runs; run++) {
      double one = seconds(list, env);
      double other = seconds(bare, env);
      if (run >= 0) {
        ours[run] = one;
        theirs[run] = other;
      }
    }
    System.out.printf(
        "lodebook lot list %.3f s, bare %.3f s, ratio %.2f (medians of %d)%n",
        median(ours), median(theirs), median(ours) / median(theirs), runs);
  }

  private static List<List<String>> preparing(Path folder) {
    List<List<String>> commands = new ArrayList<>();
    commands.add(List.of("./lodebook", "book", "create"));
    commands.add(List.of("./lodebook", "person", "add", "AB", "--name", "A. Baker"));
    for (String noun : List.of("type", "lot")) {
      String file = folder.resolve(noun + ".csv").toString();
      commands.add(List.of("./lodebook", noun, "import", "--example", file));
      commands.add(List.of("./lodebook", noun, "import", file));
    }
    return commands;
  }

  private static Path engine() throws IOException {
    try (Stream<Path> jars = Files.list(Path.of("ui/target/lib"))) {
      return jars.filter(jar -> jar.getFileName().toString().startsWith("h2-"))
          .findFirst()
          .orElseThrow();
    }
  }

  private static double seconds(List<String> command, Map<String, String> env) throws Exception {
    ProcessBuilder builder = new ProcessBuilder(command).redirectErrorStream(true);
    builder.environment().putAll(env);
    long start = System.nanoTime();
    Process process = builder.start();
    String said = new String(process.getInputStream().readAllBytes());
    if (process.waitFor() != 0) {
      throw new IllegalStateException(command + "\n" + said);
    }
    return (System.nanoTime() - start) / 1e9;
  }

  private static double median(double[] values) {
    double[] sorted = values.clone();
    Arrays.sort(sorted);
    return sorted[sorted.length / 2];
  }
}
