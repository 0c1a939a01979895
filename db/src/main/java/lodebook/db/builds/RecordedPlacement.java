package lodebook.db.builds;

import java.time.Instant;
import lodebook.assembly.layout.Facing;
import org.jspecify.annotations.Nullable;

/// A magnet that stands or stood in a slot, as somebody recorded it.
///
/// @param id the book's own number, never shown
/// @param rotor serial number of the rotor
/// @param slot slot number, from 1
/// @param magnet `LOT/NUMBER`, or `LOT` for an unmeasured magnet
/// @param lot the lot's number
/// @param facing the way its north points
/// @param deviation whether it is off the layout on purpose
/// @param why reason of the deviation or change, empty where there is none
/// @param by initials of who put it there
/// @param at when they say they did
/// @param sequence line of history that recorded it
/// @param ended how it ended, or null while it stands
public record RecordedPlacement(
    long id,
    String rotor,
    int slot,
    String magnet,
    String lot,
    Facing facing,
    boolean deviation,
    String why,
    String by,
    Instant at,
    long sequence,
    @Nullable Ended ended) {

  /// How a placement ended.
  ///
  /// @param kind `corrected` (the record was wrong from the start), `reworked` (changed from then
  ///   on), `scrapped` or `removed`
  /// @param supersededBy the placement that took its place, or null
  /// @param why the reason
  /// @param at when, as stated
  /// @param sequence line of history that recorded it
  public record Ended(
      String kind, @Nullable Long supersededBy, String why, Instant at, long sequence) {}
}
