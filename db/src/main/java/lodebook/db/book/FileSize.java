package lodebook.db.book;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

/// How large the embedded file is, against how large it was when it was last compacted.
///
/// A file that is opened for each operation grows by about 26 kB each time, whatever it holds. So
/// whoever leaves it after writing compacts it (0.2 s) when it has grown to two and a half times
/// its compacted size. Large files are left alone: there the engine uses its own space again, and
/// compacting would keep others waiting.
final class FileSize {
  private static final double FACTOR = 2.5;
  private static final long LEAST_BYTES = 200_000;
  private static final long MOST_BYTES = 256_000_000;

  private final Path file;
  private final Path note;

  FileSize(BookAddress.Folder folder) {
    file = folder.file();
    note = folder.path().resolve("compacted.size");
  }

  /// Whether compacting is due.
  boolean grownTooFar() {
    try {
      long now = Files.size(file);
      return now <= MOST_BYTES && now > FACTOR * Math.max(noted(), LEAST_BYTES);
    } catch (IOException unreadable) {
      return false;
    }
  }

  /// Notes the size after compacting.
  ///
  /// @return whether it could; without a note the next visit compacts once more
  boolean note() {
    try {
      Files.writeString(note, Long.toString(Files.size(file)));
      return true;
    } catch (IOException unwritable) {
      return false;
    }
  }

  private long noted() throws IOException {
    if (!Files.exists(note)) {
      return 0;
    }
    try {
      return Long.parseLong(Files.readString(note).strip());
    } catch (NumberFormatException damaged) {
      return 0;
    }
  }
}
