package lodebook.reports.ring;

import lodebook.assembly.layout.Facing;
import org.jspecify.annotations.Nullable;

/// What a picture shows of one slot.
///
/// @param slot slot number, from 1
/// @param facing the way its magnet's north points, or null for an empty slot
/// @param lot the lot its magnet comes from, or null where lots are not shown
/// @param mark a word that calls attention to the slot, such as a finding, or null
public record DrawnSlot(
    int slot, @Nullable Facing facing, @Nullable String lot, @Nullable String mark) {}
