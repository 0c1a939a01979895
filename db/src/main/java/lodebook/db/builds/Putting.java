package lodebook.db.builds;

import java.time.Instant;
import lodebook.assembly.layout.Facing;
import org.jspecify.annotations.Nullable;

/// One magnet that goes into one slot, checked.
///
/// @param slot slot number
/// @param magnet the magnet's name
/// @param lotId its lot
/// @param pieceId the piece, or null for an unmeasured magnet
/// @param facing the way its north points
/// @param deviation whether it is off the layout
/// @param personId who put it there
/// @param by that person's initials
/// @param at when, as stated
/// @param replaces the placement that stood in the slot, or null
record Putting(
    int slot,
    String magnet,
    long lotId,
    @Nullable Long pieceId,
    Facing facing,
    boolean deviation,
    long personId,
    String by,
    Instant at,
    @Nullable Standing replaces) {

  /// What stands in a slot before.
  ///
  /// @param placementId the placement
  /// @param lotId its lot
  /// @param pieceId its piece, or null
  /// @param magnet its name
  /// @param personId who recorded it
  /// @param by that person's initials
  record Standing(
      long placementId,
      long lotId,
      @Nullable Long pieceId,
      String magnet,
      long personId,
      String by) {}
}
