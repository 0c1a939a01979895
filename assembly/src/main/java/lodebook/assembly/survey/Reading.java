package lodebook.assembly.survey;

import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.Spot;
import org.jspecify.annotations.Nullable;

/// One value as a person stated it.
///
/// @param slot slot number as written, from 1
/// @param spot over the slot or midway to the next
/// @param component radial or tangential
/// @param fluxTesla the value as written, in tesla by the unit stated
/// @param unit family of the unit stated
/// @param temperatureCelsius temperature of the ring, or null where nobody wrote it down (then 20
///   °C ± 3 K)
/// @param radiusMetres axis to the sensing element, or null for the layout's
/// @param heightMetres height of the sensing element above the middle plane, or null for the
///   layout's
/// @param meter the instrument
public record Reading(
    int slot,
    Spot spot,
    Component component,
    double fluxTesla,
    StatedUnit unit,
    @Nullable Double temperatureCelsius,
    @Nullable Double radiusMetres,
    @Nullable Double heightMetres,
    Meter meter) {
  public Reading {
    if (!Double.isFinite(fluxTesla)) {
      throw new IllegalArgumentException("a reading is a number of tesla, not " + fluxTesla);
    }
  }

  /// Where the reading was taken if everything was done as set.
  public ProbePoint point() {
    return new ProbePoint(slot, spot, component);
  }
}
