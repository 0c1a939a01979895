package lodebook.ui.files;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;

/// A piece by its lot and its number in it: `L-2404/0017`.
///
/// @param lot the shop's number of the lot
/// @param number number of the piece, from 1
public record PieceName(String lot, int number) {
  private static final Pattern NAME = Pattern.compile("([^/]+)/(\\d{1,9})");
  private static final Pattern NUMBER = Pattern.compile("\\d{1,9}");

  /// The piece of a text `LOT/NUMBER`, or null where it is none.
  public static @Nullable PieceName parse(String text) {
    Matcher name = NAME.matcher(text.strip());
    if (!name.matches() || !Numbers.isCode(name.group(1)) || Integer.parseInt(name.group(2)) < 1) {
      return null;
    }
    return new PieceName(name.group(1), Integer.parseInt(name.group(2)));
  }

  /// Reads a piece that must be there.
  static PieceName of(Cells cells, String column) {
    String text = cells.text(column);
    PieceName piece = parse(text);
    if (piece == null && !text.isEmpty()) {
      cells.problem(column, "cell.not-piece", column, text);
    }
    return piece == null ? new PieceName("", 1) : piece;
  }

  /// Reads the number of a piece of one lot, written alone or as `LOT/NUMBER`.
  static int numberIn(Cells cells, String column, String lot) {
    String text = cells.text(column);
    if (text.isEmpty()) {
      return 1;
    }
    if (NUMBER.matcher(text).matches() && Integer.parseInt(text) > 0) {
      return Integer.parseInt(text);
    }
    PieceName piece = parse(text);
    if (piece == null) {
      cells.problem(column, "cell.not-piece-of", column, text, lot);
      return 1;
    }
    if (!piece.lot().equalsIgnoreCase(lot)) {
      cells.problem(column, "cell.other-lot", text, lot);
    }
    return piece.number();
  }

  /// The same key for every way of writing the piece.
  String key() {
    return lot.toLowerCase(Locale.ROOT) + "/" + number;
  }

  /// The piece as people see it, four digits or more.
  @Override
  public String toString() {
    return lot + "/" + String.format(Locale.ROOT, "%04d", number);
  }
}
