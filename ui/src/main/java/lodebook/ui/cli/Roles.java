package lodebook.ui.cli;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import lodebook.db.rights.Role;

/// Roles as they are written on a command line.
final class Roles {
  private Roles() {}

  /// The role of a word; another word is a wrong command line.
  static Role of(Verb verb, String word) {
    List<String> known = Arrays.stream(Role.values()).map(Role::word).toList();
    if (!known.contains(word.toLowerCase(Locale.ROOT))) {
      throw verb.wrongLine("line.not-one-of", "--role", word, String.join(", ", known));
    }
    return Role.of(word);
  }
}
