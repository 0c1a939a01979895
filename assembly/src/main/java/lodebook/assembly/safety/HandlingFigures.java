package lodebook.assembly.safety;

import lodebook.assembly.magnet.Grade;
import lodebook.assembly.magnet.MagnetType;

/// The figures that a notice for handling one type of magnet needs.
///
/// @param pinchNewton upper bound of the pull of two touching pole faces, newtons
/// @param implantsMetres distance from the centre of one magnet at which its field is 0.5 mT
/// @param implantsTogetherMetres the same for all magnets of a rotor together, pointing the same
///   way: an upper bound
/// @param looseIronMetres distance from the centre of one magnet at which its field is 3 mT
/// @param highestTemperatureCelsius highest working temperature of the grade, °C
public record HandlingFigures(
    double pinchNewton,
    double implantsMetres,
    double implantsTogetherMetres,
    double looseIronMetres,
    double highestTemperatureCelsius) {
  /// Figures of a type, with the highest remanence of its grade.
  ///
  /// @param magnets how many are handled together
  public static HandlingFigures of(MagnetType type, Grade grade, int magnets) {
    double remanence = grade.remanenceHighTesla();
    double implants = FieldLimit.IMPLANTS.tesla();
    return new HandlingFigures(
        PinchForce.upperBoundNewton(type, remanence),
        KeepOut.metres(type, remanence, implants),
        KeepOut.metresTogether(type, remanence, implants, magnets),
        KeepOut.metres(type, remanence, FieldLimit.LOOSE_IRON.tesla()),
        grade.highestTemperatureCelsius());
  }
}
