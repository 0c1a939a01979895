package lodebook.assembly.magnet;

import org.jspecify.annotations.Nullable;

/// One gaussmeter reading of a single piece.
///
/// @param fluxTesla flux density on the axis over the north face, tesla, above 0
/// @param standoffMetres face to the probe's sensing element, metres
/// @param temperatureCelsius the piece's temperature, or null where nobody noted it
/// @param meter the instrument
public record Gauging(
    double fluxTesla,
    double standoffMetres,
    @Nullable Double temperatureCelsius,
    Instrument meter) {

  /// Refuses a reading that no north face gives.
  public Gauging {
    if (!(fluxTesla > 0)) {
      throw new IllegalArgumentException(
          "a reading over a north face is above 0 T, not " + fluxTesla);
    }
    if (!(standoffMetres >= 0)) {
      throw new IllegalArgumentException("a standoff is 0 m or more, not " + standoffMetres);
    }
  }
}
