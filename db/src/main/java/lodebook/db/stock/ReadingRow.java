package lodebook.db.stock;

import java.time.Instant;
import org.jspecify.annotations.Nullable;

/// One row of a file of piece readings.
///
/// @param number the piece's number in the lot
/// @param tray its tray, or null
/// @param cell its cell in the tray, or null
/// @param fluxTesla flux density over the north face, tesla, above 0
/// @param standoffMetres face to sensing element, metres
/// @param temperatureCelsius temperature of the piece, or null where not taken
/// @param meter the instrument, or null
/// @param by initials of who read it, or null for who imports
/// @param at when it was read, or null for when it is said to be imported
public record ReadingRow(
    long number,
    @Nullable String tray,
    @Nullable String cell,
    double fluxTesla,
    double standoffMetres,
    @Nullable Double temperatureCelsius,
    @Nullable String meter,
    @Nullable String by,
    @Nullable Instant at) {

  /// The row as text, from which it is known again.
  String canonical() {
    return String.join(
        "\u001f",
        Long.toString(number),
        text(tray),
        text(cell),
        Double.toString(fluxTesla),
        Double.toString(standoffMetres),
        text(temperatureCelsius),
        text(meter),
        text(by),
        text(at));
  }

  private static String text(@Nullable Object part) {
    return part == null ? "" : part.toString();
  }
}
