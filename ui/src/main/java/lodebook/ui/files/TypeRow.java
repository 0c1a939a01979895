package lodebook.ui.files;

import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Shape;
import org.jspecify.annotations.Nullable;

/// A magnet type as a file states it; lengths in metres, those that the shape does not have are 0.
///
/// @param code the shop's number for the type
/// @param shape which of the dimensions count
/// @param thicknessMetres along the magnetisation (block, disc)
/// @param widthMetres across the magnetisation (block)
/// @param lengthMetres along the rotor's axis (block, rod, arc)
/// @param diameterMetres diameter (disc, rod), outer diameter (arc)
/// @param innerDiameterMetres inner diameter (arc)
/// @param arcDegrees angle the segment spans (arc)
/// @param grade name of the grade
/// @param toleranceMetres tolerance of the dimensions, ±
/// @param coating coating in words, may be empty
/// @param recoilPermeability relative recoil permeability, or null for the grade's
/// @param magnetisationDegrees angle of the magnetisation from the thickness direction
public record TypeRow(
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
    @Nullable Double recoilPermeability,
    double magnetisationDegrees) {

  /// The type with a recoil permeability.
  ///
  /// @param gradesRecoilPermeability the grade's, for a row that states none
  public MagnetType type(double gradesRecoilPermeability) {
    return new MagnetType(
        code,
        shape,
        thicknessMetres,
        widthMetres,
        lengthMetres,
        diameterMetres,
        innerDiameterMetres,
        arcDegrees,
        grade,
        toleranceMetres,
        coating,
        recoilPermeability == null ? gradesRecoilPermeability : recoilPermeability,
        magnetisationDegrees);
  }
}
