import com.google.googlejavaformat.java.Formatter;
import com.google.googlejavaformat.java.ImportOrderer;
import com.google.googlejavaformat.java.JavaFormatterOptions;
import com.google.googlejavaformat.java.RemoveUnusedImports;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/// Formats every Java source of the repository, or checks that it is formatted.
///
/// Called by the build: `--check FOLDER` fails and names the files, `--write FOLDER` rewrites them.
final class Format {
  public static void main(String[] args) throws Exception {
    boolean write = args[0].equals("--write");
    Path top = Path.of(args[1]);
    List<Path> sources = new ArrayList<>();
    for (String module : List.of("assembly", "db", "reports", "ui", ".ci")) {
      Path folder = top.resolve(module);
      if (!Files.isDirectory(folder)) {
        continue;
      }
      try (var walk = Files.walk(folder)) {
        walk.filter(p -> p.toString().endsWith(".java"))
            .filter(p -> !p.toString().contains("/target/"))
            .forEach(sources::add);
      }
    }
    if (sources.isEmpty()) {
      throw new IllegalStateException("no Java source below " + top + ": nothing was checked");
    }
    var options = JavaFormatterOptions.builder().style(JavaFormatterOptions.Style.GOOGLE).build();
    var formatter = new Formatter(options);
    int wrong = 0;
    for (Path source : sources) {
      String text = Files.readString(source);
      String formatted;
      try {
        formatted =
            formatter.formatSource(
                RemoveUnusedImports.removeUnusedImports(
                    ImportOrderer.reorderImports(text, JavaFormatterOptions.Style.GOOGLE)));
      } catch (Exception unparsable) {
        System.out.println("cannot be parsed: " + top.relativize(source) + ": " + unparsable);
        wrong++;
        continue;
      }
      if (!formatted.equals(text)) {
        if (write) {
          Files.writeString(source, formatted);
        } else {
          System.out.println("not formatted: " + top.relativize(source));
          wrong++;
        }
      }
    }
    if (wrong > 0) {
      System.out.println(wrong + " files; 'mvn -N -Pformat process-test-classes' formats them");
      System.exit(1);
    }
  }

  private Format() {}
}
