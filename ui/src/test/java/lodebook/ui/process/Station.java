package lodebook.ui.process;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import lodebook.ui.cli.Lodebook;

/// A station in a folder of its own: its files, its book, and commands given in this process or in
/// others.
final class Station {
  private static final List<String> FLAGS =
      List.of(
          "-XX:+UseSerialGC",
          "-XX:TieredStopAtLevel=1",
          "-Xlog:disable",
          "-Xlog:all=off",
          "--enable-native-access=ALL-UNNAMED");

  private final Path folder;
  private final Map<String, String> env;

  Station(Path folder) {
    this.folder = folder;
    this.env =
        Map.of(
            "XDG_DATA_HOME", folder.toString(),
            "LODEBOOK_BY", "AB",
            "LODEBOOK_STATION", "BENCH-1",
            "LC_ALL", "C");
  }

  /// A station with a new book, whose lead AB signs.
  static Station open(Path folder) {
    Station station = new Station(folder);
    station.does("book", "create");
    station.does("person", "add", "AB", "--name", "A. Baker");
    return station;
  }

  /// The folder of the book.
  Path book() {
    return folder.resolve("lodebook/book");
  }

  Path folder() {
    return folder;
  }

  /// A station whose book is a copy of this one's; both read the same files.
  Station copy(Path other) {
    Station copy = new Station(other);
    try {
      Files.createDirectories(copy.book());
      Files.copy(book().resolve("book.mv.db"), copy.book().resolve("book.mv.db"));
    } catch (IOException failed) {
      throw new UncheckedIOException(failed);
    }
    return copy;
  }

  /// Writes a file and returns its path.
  String file(String name, String text) {
    return file(name, text.getBytes(StandardCharsets.UTF_8));
  }

  String file(String name, byte[] bytes) {
    try {
      return Files.write(folder.resolve(name), bytes).toString();
    } catch (IOException failed) {
      throw new UncheckedIOException(failed);
    }
  }

  /// Runs a command in this process.
  Said run(List<String> command) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    int code =
        Lodebook.run(
            command,
            env,
            new PrintStream(out, true, StandardCharsets.UTF_8),
            new PrintStream(err, true, StandardCharsets.UTF_8),
            Clock.system(ZoneOffset.UTC));
    return new Said(code, text(out.toByteArray()), text(err.toByteArray()));
  }

  Said run(String... command) {
    return run(List.of(command));
  }

  /// Runs a command that must succeed and returns what it prints.
  String does(String... command) {
    Said said = run(command);
    assertEquals(0, said.code(), () -> String.join(" ", command) + "\n" + said);
    return said.out();
  }

  private String text(byte[] bytes) {
    return new String(bytes, StandardCharsets.UTF_8).replace(folder + "/", "");
  }

  /// Another process with this station's surroundings, in which a main class runs as the start
  /// script runs the program.
  ProcessBuilder process(Class<?> main, List<String> arguments) {
    List<String> line = new ArrayList<>();
    line.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
    line.addAll(FLAGS);
    line.add("-cp");
    line.add(System.getProperty("java.class.path"));
    line.add(main.getName());
    line.addAll(arguments);
    ProcessBuilder builder = new ProcessBuilder(line);
    builder.environment().putAll(env);
    return builder;
  }

  /// Waits for a process whose input and output nobody has read, and reads them.
  Said end(Process process) throws IOException, InterruptedException {
    byte[] out = process.getInputStream().readAllBytes();
    byte[] err = process.getErrorStream().readAllBytes();
    return new Said(process.waitFor(), text(out), text(err));
  }

  /// Everything that the book holds: the text of every table.
  Map<String, String> content() {
    try {
      Path tables = Files.createTempDirectory(folder, "content").resolve("tables");
      does("book", "export", tables.toString());
      Map<String, String> content = new java.util.TreeMap<>();
      try (Stream<Path> files = Files.list(tables)) {
        for (Path file : files.toList()) {
          content.put(String.valueOf(file.getFileName()), Files.readString(file));
        }
      }
      return content;
    } catch (IOException failed) {
      throw new UncheckedIOException(failed);
    }
  }

  /// Flags that the program's processes are started with.
  static String flags() {
    return String.join(" ", FLAGS);
  }
}
