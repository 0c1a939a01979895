package lodebook.ui.files;

import java.util.regex.Pattern;

/// How the shop's numbers look.
final class Numbers {
  /// Letters, digits, `.`, `_`, `-`, not digits alone, 40 at most.
  private static final Pattern CODE = Pattern.compile("(?!\\d+$)[\\p{L}\\p{Nd}._-]{1,40}");

  private static final Pattern REVISION = Pattern.compile("[\\p{L}\\p{Nd}._-]{1,20}");

  private Numbers() {}

  /// Whether a text can be the revision of a layout or gear model.
  static boolean isRevision(String text) {
    return REVISION.matcher(text).matches();
  }

  /// Whether a text is a layout with its revision, `CODE@REVISION`.
  static boolean isLayoutName(String text) {
    int at = text.indexOf('@');
    return at > 0 && isCode(text.substring(0, at)) && isRevision(text.substring(at + 1));
  }

  /// Whether a text can be a number of the shop.
  static boolean isCode(String text) {
    return CODE.matcher(text).matches();
  }

  /// Reads a number of the shop that must be there and stand in one row only.
  static String check(Cells cells, String column, Once numbers) {
    String code = numbers.check(cells, column);
    if (!code.isEmpty() && !isCode(code)) {
      cells.problem(column, "cell.not-code", column, code);
    }
    return code;
  }
}
