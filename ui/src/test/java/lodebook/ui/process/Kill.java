package lodebook.ui.process;

import java.util.Random;

/// When a process is killed.
enum Kill {
  /// At any moment from its start to its usual end.
  ANY("at any moment"),
  /// At any moment from when it has opened the book to its usual end.
  OPEN("with the book open"),
  /// As soon as its answer is there.
  ANSWERED("once it had answered");

  /// Times of an undisturbed run, seconds after the start of the process.
  ///
  /// @param open when it had the book
  /// @param end when it ended
  record Course(double open, double end) {}

  private final String words;

  Kill(String words) {
    this.words = words;
  }

  String words() {
    return words;
  }

  /// How long to wait, in seconds, after the start, the opening or the answer.
  double delay(Course usual, Random random) {
    return switch (this) {
      case ANY -> random.nextDouble() * usual.end;
      case OPEN -> random.nextDouble() * (usual.end - usual.open);
      case ANSWERED -> 0;
    };
  }
}
