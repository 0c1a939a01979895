package lodebook.db.stock;

import java.time.Instant;
import org.jspecify.annotations.Nullable;

/// A reading of a piece as it stands in the book.
///
/// @param fluxTesla flux density over the north face, tesla
/// @param standoffMetres face to sensing element, metres
/// @param temperatureCelsius temperature of the piece, or null where not taken
/// @param meter number of the instrument, or null
/// @param by initials of who read it
/// @param doubted whether it was taken before its tray was declared unsure
/// @param statedAt when, as the person says
/// @param recordedAt when it was recorded
public record PieceReading(
    double fluxTesla,
    double standoffMetres,
    @Nullable Double temperatureCelsius,
    @Nullable String meter,
    String by,
    boolean doubted,
    Instant statedAt,
    Instant recordedAt) {}
