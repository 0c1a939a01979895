package lodebook.db.stock;

import lodebook.db.meters.Meter;
import org.jspecify.annotations.Nullable;

/// A reading of a piece with the instrument it was taken with.
///
/// @param fluxTesla flux density over the north face, tesla
/// @param standoffMetres face to sensing element, metres
/// @param temperatureCelsius temperature of the piece, or null where not taken
/// @param meter the instrument, or null where none is named
public record TakenReading(
    double fluxTesla,
    double standoffMetres,
    @Nullable Double temperatureCelsius,
    @Nullable Meter meter) {}
