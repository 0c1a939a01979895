package lodebook.ui.cli;

import java.util.List;

/// All nouns and their verbs, in the order of the day.
final class Nouns {
  private Nouns() {}

  /// The nouns.
  static List<Noun> all() {
    return List.of(
        new Noun("person", s -> List.of(new PersonAdd(s), new PersonRole(s), new PersonRetire(s), new PersonList(s))));
  }

  /// The commands that are one word.
  static List<Verb> alone(Session session) {
    return List.of(new CompletionCommand(session), new HelpCommand(session));
  }
}
