package lodebook.assembly.survey;

import java.util.Set;
import lodebook.assembly.layout.ProbePoint;
import org.jspecify.annotations.Nullable;

/// A reading with the place at which it is taken to have been made.
///
/// @param point where
/// @param radiusMetres axis to the sensing element
/// @param heightMetres above the middle plane
/// @param fluxTesla value, freed of the slips that are assumed
/// @param kelvinAboveReference temperature above 20 °C, kelvin; 0 where unknown
/// @param temperatureKnown whether somebody wrote the temperature down
/// @param meter the instrument
/// @param filled slots, from 1, that held a magnet then, or null for all of the ring's
record Row(
    ProbePoint point,
    double radiusMetres,
    double heightMetres,
    double fluxTesla,
    double kelvinAboveReference,
    boolean temperatureKnown,
    Meter meter,
    @Nullable Set<Integer> filled) {
  /// The same reading with the probe taken to have been further from the axis.
  Row movedBy(double metres) {
    return new Row(
        point,
        radiusMetres + metres,
        heightMetres,
        fluxTesla,
        kelvinAboveReference,
        temperatureKnown,
        meter,
        filled);
  }
}
