package lodebook.db.layouts;

import java.time.Instant;
import lodebook.assembly.layout.GearModel;
import org.jspecify.annotations.Nullable;

/// A revision of a gear model in the book.
///
/// @param id the book's own number of the revision, never shown
/// @param model what it says
/// @param innerLayoutId revision of the inner ring's layout
/// @param outerLayoutId revision of the outer ring's layout
/// @param recordedAt when it was last imported
/// @param released who released it and when, or null for a draft
public record GearRevision(
    long id,
    GearModel model,
    long innerLayoutId,
    long outerLayoutId,
    Instant recordedAt,
    @Nullable Released released) {
  /// Whether it still may be replaced.
  public boolean draft() {
    return released == null;
  }

  /// `CODE@REVISION`.
  public String name() {
    return model.code() + "@" + model.revision();
  }
}
