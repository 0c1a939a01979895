package lodebook.db.stock;

import java.util.Locale;

/// What may be done with a piece.
public enum PieceState {
  /// May be planned and placed, if its lot may.
  USABLE,
  /// Put aside for a reason.
  HELD,
  /// Gone.
  SCRAPPED;

  /// The word in the table and in JSON, such as `held`.
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }

  /// The state of a word as [#word()] gives it.
  public static PieceState of(String word) {
    return valueOf(word.toUpperCase(Locale.ROOT));
  }
}
