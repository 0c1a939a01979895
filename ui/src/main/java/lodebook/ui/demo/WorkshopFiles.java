package lodebook.ui.demo;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/// The invented workshop's files, laid into a folder where a person can open them.
final class WorkshopFiles {
  static final List<String> NAMES =
      List.of(
          "types.csv",
          "lots.csv",
          "pieces-L-2404.csv",
          "pieces-L-2407.csv",
          "layout-inner.json",
          "layout-outer.json",
          "gear.json");

  private WorkshopFiles() {}

  /// Copies all of them.
  static void into(Path folder) {
    try {
      Files.createDirectories(folder);
      for (String name : NAMES) {
        try (InputStream file =
            WorkshopFiles.class.getResourceAsStream("/lodebook/seed/workshop/" + name)) {
          if (file == null) {
            throw new IllegalStateException("the program was built without " + name);
          }
          Files.write(folder.resolve(name), file.readAllBytes());
        }
      }
    } catch (IOException unwritable) {
      throw new UncheckedIOException(unwritable);
    }
  }
}
