package lodebook.ui.files;

import org.jspecify.annotations.Nullable;

/// A gear model as a file states it.
///
/// @param gear the shop's number for the model
/// @param revision letter or number of the revision
/// @param inner layout of the inner rotor, `CODE@REVISION`
/// @param outer layout of the outer ring, `CODE@REVISION`
/// @param modulatorPieces soft-iron pieces of the modulator
/// @param held which member stands still: `outer`, `modulator` or `inner`
/// @param modulatorInnerRadiusMetres inner radius of the modulator, or null
/// @param modulatorOuterRadiusMetres outer radius of the modulator, or null
/// @param stackMetres length of the rings along the axis
/// @param requiredPullOutNewtonMetres torque beyond which it may slip, or null
public record GearRow(
    String gear,
    String revision,
    String inner,
    String outer,
    int modulatorPieces,
    String held,
    @Nullable Double modulatorInnerRadiusMetres,
    @Nullable Double modulatorOuterRadiusMetres,
    double stackMetres,
    @Nullable Double requiredPullOutNewtonMetres) {}
