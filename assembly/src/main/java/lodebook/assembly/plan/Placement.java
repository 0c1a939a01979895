package lodebook.assembly.plan;

import lodebook.assembly.layout.Facing;
import lodebook.assembly.magnet.Strength;
import org.jspecify.annotations.Nullable;

/// What a plan puts into one slot.
///
/// @param slot slot number, from 1
/// @param piece the piece's name, or null for any magnet of the lot
/// @param lot code of the lot
/// @param facing the way its north points
/// @param strength the strength the plan reckoned with
/// @param kept whether it was in place before the plan was made
public record Placement(
    int slot, @Nullable String piece, String lot, Facing facing, Strength strength, boolean kept) {}
