package lodebook.ui.craft;

import java.util.concurrent.atomic.AtomicBoolean;
import org.jspecify.annotations.Nullable;

/// The end of a search by the clock, so that a slow computer keeps its user waiting no longer than
/// was said.
final class Deadline {
  private final long end;
  private final boolean none;
  private final AtomicBoolean hit = new AtomicBoolean();

  /// @param seconds from now, or null for no end
  Deadline(@Nullable Double seconds) {
    none = seconds == null;
    end = System.nanoTime() + (seconds == null ? 0 : Math.round(1e9 * seconds));
  }

  /// Whether the search may go on.
  boolean goesOn() {
    if (none || System.nanoTime() - end < 0) {
      return true;
    }
    hit.set(true);
    return false;
  }

  /// Whether a search was told to stop.
  boolean wasHit() {
    return hit.get();
  }
}
