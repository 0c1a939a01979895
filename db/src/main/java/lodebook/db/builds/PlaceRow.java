package lodebook.db.builds;

import java.time.Instant;
import org.jspecify.annotations.Nullable;

/// One row of what was put where.
///
/// @param slot slot number, from 1
/// @param magnet `LOT/NUMBER`, or `LOT` for an unmeasured magnet of it
/// @param facingDegrees the way its north points, degrees in the slot's frame
/// @param at when, or null for the operation's time
/// @param by initials of who put it there, or null for who signs the operation
public record PlaceRow(
    int slot, String magnet, double facingDegrees, @Nullable Instant at, @Nullable String by) {
  /// A row with nothing but the magnet and its facing.
  public PlaceRow(int slot, String magnet, double facingDegrees) {
    this(slot, magnet, facingDegrees, null, null);
  }
}
