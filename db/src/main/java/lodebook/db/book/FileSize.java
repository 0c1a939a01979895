package lodebook.db.book;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;

/// How large the embedded file is, against how large it was when it was last compacted.
///
/// A file that is opened for each operation grows by about 26 kB each time, whatever it holds,
/// until the engine uses space again that is older than 45 s. So whoever leaves it after writing
/// compacts it when it has grown to two and a half times its compacted size. Large files are left
/// alone: there that growth is a small part, and compacting would keep others waiting.
final class FileSize {
  /// The file beside the book that keeps its compacted size.
  static final String NOTE = "compacted.size";

  private static final double FACTOR = 2.5;
  private static final long LEAST_BYTES = 200_000;
  private static final long MOST_BYTES = 128_000_000;

  private final Path file;
  private final Path note;

  private FileSize(Path file, Path note) {
    this.file = file;
    this.note = note;
  }

  static FileSize of(BookAddress.Folder folder, Path file) {
    return new FileSize(file, folder.path().resolve(NOTE));
  }

  /// Whether compacting is due.
  boolean grownTooFar() {
    try {
      long now = Files.size(file);
      return now <= MOST_BYTES && now > FACTOR * Math.max(noted(now), LEAST_BYTES);
    } catch (IOException unreadable) {
      return false;
    }
  }

  /// Notes the size after compacting.
  void note() {
    try {
      Files.writeString(note, Long.toString(Files.size(file)));
    } catch (IOException unwritable) {
      forget();
    }
  }

  /// Forgets the size, so that the next visit that grows the file compacts it.
  void forget() {
    try {
      Files.deleteIfExists(note);
    } catch (IOException unwritable) {
      // a folder where nothing can be deleted takes no writing either
      return;
    }
  }

  /// The compacted size; nothing where the note is missing, damaged, or of another and larger book.
  private long noted(long now) throws IOException {
    if (!Files.exists(note)) {
      return 0;
    }
    try {
      long noted = Long.parseLong(Files.readString(note).strip());
      return noted <= now ? noted : 0;
    } catch (NumberFormatException damaged) {
      return 0;
    }
  }
}
