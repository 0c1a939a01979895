package lodebook.db.stock;

import java.util.Locale;

/// What may be done with a lot.
public enum LotState {
  /// Received and not yet judged: measured, but not planned or placed.
  AWAITING("awaits inspection"),
  /// May be planned and placed.
  ACCEPTED("accepted"),
  /// Put aside for a reason; freed, it is what it was before.
  HELD("on hold"),
  /// Not to be used.
  REJECTED("rejected");

  private final String words;

  LotState(String words) {
    this.words = words;
  }

  /// The word in the table and in JSON, such as `held`.
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }

  /// What people read, such as `on hold`.
  public String words() {
    return words;
  }

  /// The state of a word as [#word()] gives it.
  public static LotState of(String word) {
    return valueOf(word.toUpperCase(Locale.ROOT));
  }
}
