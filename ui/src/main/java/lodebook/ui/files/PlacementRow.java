package lodebook.ui.files;

import java.time.Instant;
import org.jspecify.annotations.Nullable;

/// What a file says was put into a slot.
///
/// @param slot slot number
/// @param lot the shop's number of the lot
/// @param piece number of the piece in its lot, or null for an unmeasured magnet
/// @param facingDegrees facing, degrees in [0, 360)
/// @param at when, or null
/// @param by initials, or null
public record PlacementRow(
    int slot,
    String lot,
    @Nullable Long piece,
    double facingDegrees,
    @Nullable Instant at,
    @Nullable String by) {}
