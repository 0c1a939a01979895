package lodebook.db.layouts;

import lodebook.db.refusal.Refusal;
import org.jspecify.annotations.Nullable;

/// How a person names a layout or a gear model: `CODE`, or `CODE@REVISION`.
///
/// @param code the shop's number
/// @param revision the revision, or null where the latest released one is meant
public record RevisionName(String code, @Nullable String revision) {
  /// The longest name of a revision.
  static final int LONGEST = 20;

  /// Reads a name; an empty code or revision is wrong input.
  public static RevisionName of(String text) {
    int at = text.indexOf('@');
    String code = (at < 0 ? text : text.substring(0, at)).strip();
    String revision = at < 0 ? null : text.substring(at + 1).strip();
    if (code.isEmpty() || (revision != null && revision.isEmpty())) {
      throw Refusal.wrongInput("revision.malformed", text).remedy("lodebook layout list");
    }
    return new RevisionName(code, revision);
  }

  /// Refuses, as wrong input, what cannot be a revision: 1 to 20 letters, digits, `.`, `_`, `-`.
  static void checkRevision(String code, String revision) {
    boolean signs =
        revision
            .codePoints()
            .allMatch(c -> Character.isLetterOrDigit(c) || c == '.' || c == '_' || c == '-');
    if (revision.isEmpty() || revision.length() > LONGEST || !signs) {
      throw Refusal.wrongInput("revision.not-a-revision", code, revision, LONGEST);
    }
  }
}
