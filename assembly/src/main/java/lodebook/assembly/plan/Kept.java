package lodebook.assembly.plan;

import lodebook.assembly.layout.Facing;
import lodebook.assembly.magnet.Strength;
import org.jspecify.annotations.Nullable;

/// A slot that is filled already and stays as it is.
///
/// @param slot slot number, from 1
/// @param piece the piece's name, or null for an unmeasured magnet of the lot
/// @param lot code of the lot
/// @param facing the way it faces as built
/// @param strength its strength, or its lot's mean and spread
public record Kept(
    int slot, @Nullable String piece, String lot, Facing facing, Strength strength) {}
