package lodebook.ui.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/// A shop with a folder of its own in which tests run commands.
final class Shop {
  private final Path folder;
  private final Map<String, String> env = new HashMap<>();
  private Clock clock = Clock.fixed(Instant.parse("2026-11-02T08:00:00Z"), ZoneOffset.UTC);

  Shop(Path folder) {
    this.folder = folder;
    env.put("XDG_DATA_HOME", folder.toString());
    env.put("LODEBOOK_STATION", "BENCH-1");
  }

  /// A shop whose book has a lead AB, who signs.
  static Shop open(Path folder) {
    Shop shop = new Shop(folder);
    shop.does("book", "create");
    shop.does("person", "add", "AB", "--name", "A. Baker");
    shop.with("LODEBOOK_BY", "AB");
    return shop;
  }

  Shop with(String variable, String content) {
    env.put(variable, content);
    return this;
  }

  Shop at(Clock other) {
    clock = other;
    return this;
  }

  Path folder() {
    return folder;
  }

  /// Writes a file into the shop's folder and returns its path.
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

  /// Runs a command.
  Said run(String... args) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    int code =
        Lodebook.run(
            List.of(args),
            env,
            new PrintStream(out, true, StandardCharsets.UTF_8),
            new PrintStream(err, true, StandardCharsets.UTF_8),
            clock);
    return new Said(code, text(out), text(err));
  }

  private String text(ByteArrayOutputStream stream) {
    return stream.toString(StandardCharsets.UTF_8).replace(folder + "/", "");
  }

  /// Runs a command that must succeed and returns what it prints.
  String does(String... args) {
    Said said = run(args);
    assertEquals(0, said.code(), () -> String.join(" ", args) + "\n" + said);
    return said.out();
  }

  /// What the book holds, as far as its history and numbers tell.
  String state() {
    return does("book", "info", "--json") + does("history", "--json");
  }

  /// What a command said.
  ///
  /// @param code exit code
  /// @param out standard output
  /// @param err standard error
  record Said(int code, String out, String err) {}
}
