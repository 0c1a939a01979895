package lodebook.assembly.magnet;

/// Shape, nominal dimensions, grade and coating that all magnets of one type share.
///
/// Dimensions in metres; those that a shape does not have are 0. For a block the thickness lies
/// along the magnetisation, the width across it and the length along the rotor's axis.
///
/// @param code the shop's number for the type
/// @param shape which of the dimensions below count
/// @param thicknessMetres along the magnetisation (block, disc)
/// @param widthMetres across the magnetisation, in the ring's plane (block)
/// @param lengthMetres along the rotor's axis (block, rod, arc)
/// @param diameterMetres diameter (disc, rod), outer diameter (arc)
/// @param innerDiameterMetres inner diameter (arc)
/// @param arcDegrees angle the segment spans (arc)
/// @param grade name of the grade
/// @param toleranceMetres tolerance of the dimensions, ±
/// @param coating coating in words
/// @param recoilPermeability relative recoil permeability; 1 switches mutual magnetisation off
/// @param magnetisationDegrees angle of the magnetisation from the thickness direction, towards the
///   next slot when the piece stands with its thickness along the radius; 0 for most types
public record MagnetType(
    String code,
    Shape shape,
    double thicknessMetres,
    double widthMetres,
    double lengthMetres,
    double diameterMetres,
    double innerDiameterMetres,
    double arcDegrees,
    String grade,
    double toleranceMetres,
    String coating,
    double recoilPermeability,
    double magnetisationDegrees) {}
