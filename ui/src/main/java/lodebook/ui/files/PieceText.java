package lodebook.ui.files;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import lodebook.db.stock.PieceName;
import org.jspecify.annotations.Nullable;

/// Names of pieces as files write them: `L-2404/0017`, or the number alone.
final class PieceText {
  private static final Pattern NAME = Pattern.compile("([^/]+)/(\\d{1,9})");
  private static final Pattern NUMBER = Pattern.compile("\\d{1,9}");
  private static final PieceName STAND_IN = new PieceName("", 1);

  private PieceText() {}

  /// The piece of a text `LOT/NUMBER`, or null where it is none.
  static @Nullable PieceName parse(String text) {
    Matcher name = NAME.matcher(text);
    if (!name.matches() || !Numbers.isCode(name.group(1)) || Integer.parseInt(name.group(2)) < 1) {
      return null;
    }
    return new PieceName(name.group(1), Integer.parseInt(name.group(2)));
  }

  /// Reads a piece that must be there; the stand-in has no lot.
  static PieceName of(Cells cells, String column) {
    String text = cells.text(column);
    PieceName piece = parse(text);
    if (piece == null && !text.isEmpty()) {
      cells.problem(column, "cell.not-piece", column, text);
    }
    return piece == null ? STAND_IN : piece;
  }

  /// Reads the number of a piece of one lot, written alone or as `LOT/NUMBER`; 0 as stand-in.
  static long numberIn(Cells cells, String column, String lot) {
    String text = cells.text(column);
    if (text.isEmpty()) {
      return 0;
    }
    if (NUMBER.matcher(text).matches() && Integer.parseInt(text) > 0) {
      return Integer.parseInt(text);
    }
    PieceName piece = parse(text);
    if (piece == null) {
      cells.problem(column, "cell.not-piece-of", column, text, lot);
      return 0;
    }
    if (!piece.lot().equalsIgnoreCase(lot)) {
      cells.problem(column, "cell.other-lot", text, lot);
    }
    return piece.number();
  }

  /// The same key for every way of writing a piece.
  static String key(PieceName piece) {
    return piece.lot().toLowerCase(Locale.ROOT) + "/" + piece.number();
  }
}
