package lodebook.ui.desk.bench;

import lodebook.assembly.survey.Diagnosis;
import org.jspecify.annotations.Nullable;

/// What a reading came to.
///
/// @param kind how it is judged
/// @param after the step with what is still to be read at its slot
/// @param diagnosis what the readings at this state of the ring show; null where the reading is as
///   expected and tells by itself
public record Outcome(Kind kind, BenchStep after, @Nullable Diagnosis diagnosis) {
  /// How a reading is judged.
  public enum Kind {
    /// As expected, and it shows the magnet right.
    RIGHT,
    /// As expected, but it cannot show the magnet right.
    CANNOT_TELL,
    /// A fault is shown.
    FAULT,
    /// Not as expected, and no single fault explains it.
    UNEXPLAINED
  }
}
