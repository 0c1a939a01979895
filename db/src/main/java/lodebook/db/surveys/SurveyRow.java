package lodebook.db.surveys;

import java.time.Instant;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Spot;
import org.jspecify.annotations.Nullable;

/// One reading round a rotor as somebody states it.
///
/// @param slot slot number as written
/// @param spot over the slot or midway to the next
/// @param component radial or tangential
/// @param amount the number as written
/// @param unit its unit
/// @param temperatureCelsius temperature of the ring, or null
/// @param radiusMetres axis to the sensing element, or null for the layout's
/// @param heightMetres height above the middle plane, or null for the layout's
/// @param at when, or null for the operation's time
/// @param by initials of who read it, or null for who signs the operation
/// @param meter the meter, or null for the one that the operation names
public record SurveyRow(
    int slot,
    Spot spot,
    Component component,
    double amount,
    FluxUnit unit,
    @Nullable Double temperatureCelsius,
    @Nullable Double radiusMetres,
    @Nullable Double heightMetres,
    @Nullable Instant at,
    @Nullable String by,
    @Nullable String meter) {
  /// A row with the required columns only.
  public SurveyRow(int slot, Spot spot, Component component, double amount, FluxUnit unit) {
    this(slot, spot, component, amount, unit, null, null, null, null, null, null);
  }
}
