package lodebook.db.keep;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collections;
import java.util.function.UnaryOperator;
import java.util.zip.ZipEntry;
import java.util.zip.ZipFile;
import java.util.zip.ZipOutputStream;

/// Zips that somebody has changed.
final class Zips {
  private Zips() {}

  /// Copies a zip with the text of one entry changed.
  static void replace(Path from, Path to, String name, UnaryOperator<String> change)
      throws IOException {
    try (ZipFile zip = new ZipFile(from.toFile());
        ZipOutputStream out = new ZipOutputStream(Files.newOutputStream(to))) {
      for (ZipEntry entry : Collections.list(zip.entries())) {
        String text = new String(zip.getInputStream(entry).readAllBytes(), StandardCharsets.UTF_8);
        String written = entry.getName().equals(name) ? change.apply(text) : text;
        out.putNextEntry(new ZipEntry(entry.getName()));
        out.write(written.getBytes(StandardCharsets.UTF_8));
        out.closeEntry();
      }
    }
  }
}
