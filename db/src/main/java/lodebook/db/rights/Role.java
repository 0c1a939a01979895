package lodebook.db.rights;

import java.util.Locale;

/// What a person is in the shop.
public enum Role {
  /// Builds and measures rotors.
  BENCH,
  /// Inspects what comes in, and the instruments.
  INSPECTOR,
  /// Designs, plans and assembles.
  PLANNER,
  /// May do everything.
  LEAD;

  /// The word in files and on screens, such as `bench`.
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }

  /// The role of a word as [#word()] gives it.
  public static Role of(String word) {
    return valueOf(word.toUpperCase(Locale.ROOT));
  }
}
