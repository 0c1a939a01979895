package lodebook.assembly.magnet;

/// A magnet material as its makers sell it.
///
/// @param name the trade's name of the grade, such as N42
/// @param remanenceLowTesla lowest remanence at 20 °C, tesla
/// @param remanenceHighTesla highest remanence at 20 °C, tesla
/// @param remanencePerKelvin relative change of the remanence per kelvin, negative (−0.0012 for
///   NdFeB)
/// @param recoilPermeability relative permeability of the recoil line, 1 or more
/// @param highestTemperatureCelsius highest working temperature, °C, the lower of makers' figures
/// @param densityKilogramPerCubicMetre density, kg/m³
/// @param source where the figures come from
public record Grade(
    String name,
    double remanenceLowTesla,
    double remanenceHighTesla,
    double remanencePerKelvin,
    double recoilPermeability,
    double highestTemperatureCelsius,
    double densityKilogramPerCubicMetre,
    String source) {

  /// Temperature to which remanences refer, °C.
  public static final double REFERENCE_CELSIUS = 20;

  /// Remanence at a temperature over that at 20 °C: 1 + α·(T − 20).
  public double remanenceFactorAt(double celsius) {
    return 1 + remanencePerKelvin * (celsius - REFERENCE_CELSIUS);
  }
}
