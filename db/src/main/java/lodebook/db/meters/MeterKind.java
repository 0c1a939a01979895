package lodebook.db.meters;

import java.util.Locale;

/// What an instrument measures.
public enum MeterKind {
  /// Flux density.
  FIELD,
  /// Length.
  LENGTH,
  /// Torque.
  TORQUE;

  /// The word in files and on screens, such as `field`.
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }

  /// The kind of a word as [#word()] gives it.
  public static MeterKind of(String word) {
    return valueOf(word.toUpperCase(Locale.ROOT));
  }
}
