package lodebook.db.layouts;

import lodebook.assembly.layout.Member;
import org.jspecify.annotations.Nullable;

/// A revision of a gear model as somebody states it.
///
/// @param code the shop's number
/// @param revision letter or number of the revision
/// @param inner the inner ring's layout, `CODE@REVISION`
/// @param outer the outer ring's layout, `CODE@REVISION`
/// @param modulatorPieces number of iron pieces
/// @param held the member that stands still
/// @param modulatorInnerRadiusMetres inner radius of the iron pieces, or null where not stated
/// @param modulatorOuterRadiusMetres their outer radius, or null where not stated
/// @param stackMetres length of the active parts along the axis
/// @param requiredPullOutNewtonMetres torque it must carry without slipping, or null
public record GearDraft(
    String code,
    String revision,
    String inner,
    String outer,
    int modulatorPieces,
    Member held,
    @Nullable Double modulatorInnerRadiusMetres,
    @Nullable Double modulatorOuterRadiusMetres,
    double stackMetres,
    @Nullable Double requiredPullOutNewtonMetres) {}
