package lodebook.db.book;

import java.time.Instant;
import org.jspecify.annotations.Nullable;

/// Who does a thing, and when they say they did it.
///
/// @param by initials, or null where nobody has signed
/// @param at the time stated, or null for now
public record Act(@Nullable String by, @Nullable Instant at) {
  /// Done now by a person.
  public static Act by(@Nullable String initials) {
    return new Act(initials, null);
  }
}
