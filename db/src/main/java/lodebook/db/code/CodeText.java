package lodebook.db.code;

import java.text.Normalizer;
import java.util.Locale;
import lodebook.db.refusal.Refusal;

/// How numbers of the shop are written and compared.
public final class CodeText {
  /// The longest number.
  public static final int LONGEST = 40;

  private CodeText() {}

  /// The form in which numbers are compared: without regard to case, in Unicode's composed form.
  public static String fold(String shown) {
    return Normalizer.normalize(shown.strip(), Normalizer.Form.NFC)
        .toUpperCase(Locale.ROOT)
        .toLowerCase(Locale.ROOT);
  }

  /// Whether a text can be a number: 1 to 40 letters, digits, `.`, `_`, `-`, not digits alone.
  public static boolean isCode(String shown) {
    boolean signs =
        shown
            .codePoints()
            .allMatch(c -> Character.isLetterOrDigit(c) || c == '.' || c == '_' || c == '-');
    boolean digitsAlone = shown.codePoints().allMatch(Character::isDigit);
    return !shown.isEmpty() && shown.length() <= LONGEST && signs && !digitsAlone;
  }

  /// Refuses, as wrong input, what cannot be a number.
  public static void check(String shown) {
    if (!isCode(shown)) {
      throw Refusal.wrongInput("code.malformed", shown, LONGEST);
    }
  }
}
