package lodebook.db.layouts;

import java.time.Instant;
import lodebook.assembly.layout.Layout;
import org.jspecify.annotations.Nullable;

/// A revision of a layout in the book.
///
/// @param id the book's own number of the revision, never shown
/// @param layout what it says
/// @param recordedAt when it was last imported
/// @param released who released it and when, or null for a draft
public record LayoutRevision(
    long id, Layout layout, Instant recordedAt, @Nullable Released released) {
  /// Whether it still may be replaced.
  public boolean draft() {
    return released == null;
  }
}
