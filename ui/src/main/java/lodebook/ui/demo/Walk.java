package lodebook.ui.demo;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import tools.jackson.databind.JsonNode;
import tools.jackson.databind.json.JsonMapper;

/// Runs the demo's commands and tells of them, step by step.
final class Walk {
  private final Runner runner;
  private final Consumer<String> tell;
  private final Path folder;
  private final List<String> done = new ArrayList<>();
  private int step;

  Walk(Runner runner, Consumer<String> tell, Path folder) {
    this.runner = runner;
    this.tell = tell;
    this.folder = folder;
  }

  /// Runs a command that must succeed.
  ///
  /// @return its standard output
  String run(String... words) {
    done.add(shown(words));
    Runner.Answer answer = runner.run(inFolder(words));
    if (answer.code() != 0) {
      throw new IllegalStateException(
          "the demo's command failed with "
              + answer.code()
              + ": "
              + shown(words)
              + "\n"
              + answer.out()
              + answer.err());
    }
    return answer.out();
  }

  /// Runs a command for its JSON, which may also find something; a person would leave `--json` out.
  JsonNode json(String... words) {
    done.add(shown(words));
    List<String> all = new ArrayList<>(inFolder(words));
    all.add("--json");
    Runner.Answer answer = runner.run(all);
    if (answer.code() > 1) {
      throw new IllegalStateException(
          "the demo's command failed with " + answer.code() + ": " + all + "\n" + answer.err());
    }
    return JsonMapper.shared().readTree(answer.out());
  }

  /// Tells what the commands since the last step did.
  void told(String sentence) {
    step++;
    tell.accept(String.format("%2d. %s", step, sentence));
    done.forEach(command -> tell.accept("      " + command));
    done.clear();
  }

  /// Writes a file of the demo.
  void write(String name, String text) {
    try {
      Path file = folder.resolve(name);
      Files.createDirectories(file.getParent());
      Files.write(file, text.getBytes(StandardCharsets.UTF_8));
    } catch (IOException unwritable) {
      throw new UncheckedIOException(unwritable);
    }
  }

  /// Words that name a file of the demo are run with its whole path and told without.
  private List<String> inFolder(String... words) {
    List<String> run = new ArrayList<>();
    for (String word : words) {
      run.add(
          word.startsWith("files/") || word.startsWith("papers/") || word.startsWith("pictures/")
              ? folder.resolve(word).toString()
              : word);
    }
    return run;
  }

  private static String shown(String... words) {
    StringBuilder line = new StringBuilder("lodebook");
    for (String word : words) {
      line.append(' ').append(word.contains(" ") ? '"' + word + '"' : word);
    }
    return line.toString();
  }
}
