package lodebook.assembly.survey;

import java.util.Set;
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
/// @param filled slots, from 1, that held a magnet when it was taken, or null for all that the ring
///   has: a ring can be read while it is being filled
public record Reading(
    int slot,
    Spot spot,
    Component component,
    double fluxTesla,
    StatedUnit unit,
    @Nullable Double temperatureCelsius,
    @Nullable Double radiusMetres,
    @Nullable Double heightMetres,
    Meter meter,
    @Nullable Set<Integer> filled) {
  public Reading {
    filled = filled == null ? null : Set.copyOf(filled);
    if (!Double.isFinite(fluxTesla)) {
      throw new IllegalArgumentException("a reading is a number of tesla, not " + fluxTesla);
    }
  }

  /// A reading of the ring with all its magnets.
  public Reading(
      int slot,
      Spot spot,
      Component component,
      double fluxTesla,
      StatedUnit unit,
      @Nullable Double temperatureCelsius,
      @Nullable Double radiusMetres,
      @Nullable Double heightMetres,
      Meter meter) {
    this(
        slot,
        spot,
        component,
        fluxTesla,
        unit,
        temperatureCelsius,
        radiusMetres,
        heightMetres,
        meter,
        null);
  }

  /// The same taken when only some slots held a magnet.
  ///
  /// @param slots their numbers, from 1
  public Reading whenFilled(Set<Integer> slots) {
    return new Reading(
        slot,
        spot,
        component,
        fluxTesla,
        unit,
        temperatureCelsius,
        radiusMetres,
        heightMetres,
        meter,
        slots);
  }

  /// Where the reading was taken if everything was done as set.
  public ProbePoint point() {
    return new ProbePoint(slot, spot, component);
  }
}
