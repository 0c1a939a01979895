package lodebook.ui.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;

/// Files that the program writes: wholly or not at all.
final class OutputFile {
  private OutputFile() {}

  /// Writes a text.
  static void write(Path path, String text) {
    write(path, text.getBytes(StandardCharsets.UTF_8));
  }

  /// Writes bytes: beside the place first, then renamed. Folders that are missing are made.
  static void write(Path path, byte[] bytes) {
    Path whole = path.toAbsolutePath();
    Path part = whole.resolveSibling(whole.getFileName() + ".part");
    try {
      Files.createDirectories(whole.getParent() == null ? whole : whole.getParent());
      Files.write(part, bytes);
      Files.move(part, whole, StandardCopyOption.REPLACE_EXISTING);
    } catch (IOException failed) {
      throw new Failures.CannotWrite(path, failed);
    }
  }
}
