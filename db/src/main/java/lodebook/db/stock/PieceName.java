package lodebook.db.stock;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import lodebook.db.refusal.Refusal;

/// The name of a piece: its lot and its number in it.
///
/// @param lot number of the lot
/// @param number from 1
public record PieceName(String lot, long number) {
  private static final Pattern NAME = Pattern.compile("(.+)/([0-9]{1,9})");

  /// Reads `LOT/NUMBER`, leading zeros or not; anything else is wrong input.
  public static PieceName of(String text) {
    Matcher name = NAME.matcher(text.strip());
    if (!name.matches() || Long.parseLong(name.group(2)) == 0) {
      throw Refusal.wrongInput("piece.malformed", text).remedy("lodebook piece list LOT");
    }
    return new PieceName(name.group(1), Long.parseLong(name.group(2)));
  }

  /// As people see it, with four digits or more: `L-2404/0017`.
  @Override
  public String toString() {
    return String.format(Locale.ROOT, "%s/%04d", lot, number);
  }
}
