package lodebook.ui.desk.station;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import lodebook.db.book.BookAddress;
import lodebook.db.keep.BookInfo;
import lodebook.db.refusal.Refusal;
import org.jspecify.annotations.Nullable;

/// Sees whether the book was changed since it was last looked at, by this station or another.
///
/// The file of an embedded book is looked at first, from outside; only where it was touched is the
/// book opened and its revision asked for.
public final class Watch {
  private final Station station;
  private @Nullable Stamp stamp;
  private long revision = -1;

  private record Stamp(long size, long modified) {}

  /// @param station the station whose book is watched
  public Watch(Station station) {
    this.station = station;
  }

  /// Looks.
  ///
  /// @return whether the book has another revision than at the last look; false at the first look
  ///   and while the book is busy
  public boolean changed() {
    Stamp now = stamp();
    if (now != null && now.equals(stamp)) {
      return false;
    }
    long seen;
    try {
      seen = station.with(book -> BookInfo.of(book).revision());
    } catch (Refusal busy) {
      return false;
    }
    stamp = stamp();
    boolean first = revision < 0;
    boolean changed = seen != revision;
    revision = seen;
    return changed && !first;
  }

  private @Nullable Stamp stamp() {
    if (!(station.address() instanceof BookAddress.Folder folder)) {
      return null;
    }
    Path file = folder.path().resolve("book.mv.db");
    try {
      return new Stamp(Files.size(file), Files.getLastModifiedTime(file).toMillis());
    } catch (IOException unreadable) {
      return null;
    }
  }
}
