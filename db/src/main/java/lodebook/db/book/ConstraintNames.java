package lodebook.db.book;

import java.util.Locale;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import java.util.stream.Stream;

/// The constraints that a database names when it refuses a row.
///
/// PostgreSQL names the constraint. H2 names a primary key by its table, and a unique constraint by
/// its index, which is the constraint's name with `_INDEX_` and a letter or two behind it.
public final class ConstraintNames {
  private static final Pattern NAME =
      Pattern.compile(
          "\\b(?<named>(?:pk|uq|fk|ck)_[a-z_]+?)(?:_index_[0-9a-f]*)?\\b"
              + "|\\bprimary[ _]key\\w* on (?:public\\.)?(?<table>[a-z_]+)");

  private ConstraintNames() {}

  /// The names in a message, in its order.
  public static Stream<String> in(String message) {
    return NAME.matcher(message.toLowerCase(Locale.ROOT)).results().map(ConstraintNames::name);
  }

  private static String name(MatchResult found) {
    String named = found.group("named");
    return named == null ? "pk_" + found.group("table") : named;
  }
}
