package lodebook.ui.desk.room;

import java.util.List;
import lodebook.ui.desk.run.Trouble;

/// A sentence beneath the ring, with its weight; the weight never speaks by colour alone.
///
/// @param tone how it is meant
/// @param sentence the words
/// @param rows further words, a line each
public record Said(Tone tone, String sentence, List<String> rows) {
  /// Nothing is said.
  public static final Said NOTHING = new Said(Tone.PLAIN, "", List.of());

  /// How a sentence is meant.
  public enum Tone {
    /// As it is.
    PLAIN,
    /// Something is right.
    RIGHT,
    /// It cannot be told yet.
    OPEN,
    /// Something is wrong.
    WRONG
  }

  public Said {
    rows = List.copyOf(rows);
  }

  /// A sentence without further words.
  public static Said of(Tone tone, String sentence) {
    return new Said(tone, sentence, List.of());
  }

  /// What went wrong.
  public static Said of(Trouble trouble) {
    return new Said(Tone.WRONG, trouble.sentence(), trouble.rows());
  }

  /// Whether nothing is said.
  public boolean silent() {
    return sentence.isEmpty();
  }
}
