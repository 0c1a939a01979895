package lodebook.ui.files;

import java.time.Instant;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Spot;
import org.jspecify.annotations.Nullable;

/// One reading of a ring as a file states it.
///
/// @param slot slot number
/// @param spot over the slot or midway to the next
/// @param component radial or tangential
/// @param value the value as written
/// @param unit its unit
/// @param temperatureCelsius temperature of the ring, or null
/// @param radiusMetres axis to the sensing element, or null for the layout's
/// @param heightMetres height of the sensing element, or null for the layout's
/// @param at when, or null
/// @param by initials, or null
/// @param meter the shop's number of the meter, or null
public record SurveyRow(
    int slot,
    Spot spot,
    Component component,
    double value,
    Flux unit,
    @Nullable Double temperatureCelsius,
    @Nullable Double radiusMetres,
    @Nullable Double heightMetres,
    @Nullable Instant at,
    @Nullable String by,
    @Nullable String meter) {
  /// The flux density, tesla.
  public double fluxTesla() {
    return unit.tesla(value);
  }
}
