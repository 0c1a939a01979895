package lodebook.ui.demo;

import java.util.List;

/// Runs one command of the program on the demo's book.
@FunctionalInterface
public interface Runner {
  /// What a command answered.
  ///
  /// @param code its exit code
  /// @param out its standard output
  /// @param err its standard error
  record Answer(int code, String out, String err) {}

  /// Runs a command.
  ///
  /// @param words the words after `lodebook`
  Answer run(List<String> words);
}
