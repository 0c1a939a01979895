package lodebook.ui.files;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import lodebook.ui.words.Words;

/// Writes small files and reads them, for tests.
final class FileBench {
  private final Path folder;
  private final List<String> warnings = new ArrayList<>();

  FileBench(Path folder) {
    this.folder = folder;
  }

  Source file(String name, String text) {
    return file(name, text.getBytes(StandardCharsets.UTF_8));
  }

  Source file(String name, byte[] bytes) {
    try {
      Path path = Files.write(folder.resolve(name), bytes);
      return source(path);
    } catch (IOException failed) {
      throw new UncheckedIOException(failed);
    }
  }

  Source source(Path path) {
    return new Source(path, Words.english(), ZoneId.of("Europe/Berlin"), this::warn);
  }

  private void warn(String sentence) {
    warnings.add(sentence.replace(folder + "/", ""));
  }

  List<String> warnings() {
    return List.copyOf(warnings);
  }

  /// What is wrong, each line without the folder, and how many more; fails where nothing is wrong.
  List<String> problems(Source source, Function<Source, ?> reader) {
    try {
      Object read = reader.apply(source);
      throw new AssertionError("nothing was found wrong, but read " + read);
    } catch (BadFile bad) {
      List<String> lines = new ArrayList<>();
      bad.problems().forEach(p -> lines.add(p.toString().replace(folder + "/", "")));
      if (bad.more() > 0) {
        lines.add("and " + bad.more() + " more");
      }
      return lines;
    }
  }
}
