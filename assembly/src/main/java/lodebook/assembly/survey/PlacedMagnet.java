package lodebook.assembly.survey;

import lodebook.assembly.magnet.Strength;
import org.jspecify.annotations.Nullable;

/// A magnet as the record says it stands in a slot.
///
/// @param strength remanence at 20 °C with the uncertainty that is this magnet's own
/// @param remanencePerKelvin relative change of the remanence per kelvin, from the grade
/// @param shared uncertainty shared with other magnets, or null
public record PlacedMagnet(
    Strength strength, double remanencePerKelvin, @Nullable SharedDoubt shared) {
  /// A magnet whose uncertainty is its own.
  public PlacedMagnet(Strength strength, double remanencePerKelvin) {
    this(strength, remanencePerKelvin, null);
  }
}
