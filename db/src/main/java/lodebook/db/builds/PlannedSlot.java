package lodebook.db.builds;

import lodebook.assembly.layout.Facing;
import lodebook.assembly.magnet.Strength;
import org.jspecify.annotations.Nullable;

/// What a plan puts into a slot, and what has become of it.
///
/// @param slot slot number
/// @param magnet `LOT/NUMBER`, or `LOT` for an unmeasured magnet
/// @param lot the lot's number
/// @param facing the way its north points
/// @param fillStep when the slot is filled, from 1
/// @param remark what the builder is told, empty for nothing
/// @param strength the piece's strength, or its lot's mean and spread
/// @param tray the tray in which the piece lies, or null
/// @param cell its cell there, or null
/// @param state `planned`; `placed` where the slot is filled; `on hold` where the piece or its lot
///   may not be used any more; `gone` where the piece stands elsewhere or is scrapped
public record PlannedSlot(
    int slot,
    String magnet,
    String lot,
    Facing facing,
    int fillStep,
    String remark,
    Strength strength,
    @Nullable String tray,
    @Nullable String cell,
    String state) {}
