package lodebook.db.builds;

import java.util.Locale;
import lodebook.db.refusal.Refusal;
import org.jspecify.annotations.Nullable;

/// How a person names a magnet: `LOT/NUMBER` for a piece, `LOT` for an unmeasured one of the lot.
///
/// @param lot number of the lot
/// @param number the piece's number in its lot, or null
public record MagnetName(String lot, @Nullable Long number) {
  /// Reads a name; `L-2404/17` and `L-2404/0017` are the same. Anything else is wrong input.
  public static MagnetName of(String text) {
    int slash = text.indexOf('/');
    String lot = (slash < 0 ? text : text.substring(0, slash)).strip();
    if (slash < 0) {
      return new MagnetName(checked(lot, text), null);
    }
    String number = text.substring(slash + 1).strip();
    if (!number.matches("[0-9]{1,9}") || Long.parseLong(number) == 0) {
      throw Refusal.wrongInput("magnet.malformed", text).remedy("lodebook lot list");
    }
    return new MagnetName(checked(lot, text), Long.valueOf(number));
  }

  private static String checked(String lot, String text) {
    if (lot.isEmpty()) {
      throw Refusal.wrongInput("magnet.malformed", text).remedy("lodebook lot list");
    }
    return lot;
  }

  /// The name as people see it, the number with four digits or more.
  public static String shown(String lot, @Nullable Long number) {
    return number == null ? lot : String.format(Locale.ROOT, "%s/%04d", lot, number);
  }

  @Override
  public String toString() {
    return shown(lot, number);
  }
}
