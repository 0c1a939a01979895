package lodebook.ui.files;

import java.time.Instant;
import org.jspecify.annotations.Nullable;

/// One reading of one piece as a file states it.
///
/// @param piece number of the piece in its lot
/// @param tray tray, empty where none is stated
/// @param cell cell of the tray, empty where none is stated
/// @param value the value as written
/// @param unit its unit
/// @param standoffMetres face to the probe's sensing element
/// @param temperatureCelsius temperature of the piece, or null
/// @param meter the shop's number of the meter, or null
/// @param by initials of who read it, or null
/// @param at when it was read, or null
public record PieceReadingRow(
    int piece,
    String tray,
    String cell,
    double value,
    Flux unit,
    double standoffMetres,
    @Nullable Double temperatureCelsius,
    @Nullable String meter,
    @Nullable String by,
    @Nullable Instant at) {
  /// The flux density, tesla.
  public double fluxTesla() {
    return unit.tesla(value);
  }
}
