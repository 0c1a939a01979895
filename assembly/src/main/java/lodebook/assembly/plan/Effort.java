package lodebook.assembly.plan;

import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;

/// How long a search may go on, and whom it tells.
///
/// The number of steps makes a plan repeatable; the supplier only cuts it short. Both callbacks may
/// be called from several threads.
///
/// @param steps tried exchanges in all
/// @param keepGoing asked now and then; false ends the search with the best so far
/// @param bestSoFar told the unwanted harmonics (a ratio) whenever they fell
public record Effort(long steps, BooleanSupplier keepGoing, DoubleConsumer bestSoFar) {
  /// Tried exchanges for each slot that take about a second of one processor in a ring of 48 slots.
  private static final long STEPS_A_SLOT = 600_000;

  /// The usual effort for a ring, about a second for 48 slots, never cut short.
  ///
  /// @param slots slots of the ring
  public static Effort usual(int slots) {
    return seconds(slots, 1);
  }

  /// An effort of about so many seconds.
  ///
  /// @param slots slots of the ring
  /// @param seconds seconds of one processor, by experience and not by a clock
  public static Effort seconds(int slots, double seconds) {
    return new Effort(
        Math.max(1, Math.round(STEPS_A_SLOT * seconds * slots)), () -> true, ratio -> {});
  }

  /// The same effort, cut short when the supplier says false.
  public Effort whilst(BooleanSupplier goOn) {
    return new Effort(steps, goOn, bestSoFar);
  }

  /// The same effort, told to somebody.
  public Effort telling(DoubleConsumer listener) {
    return new Effort(steps, keepGoing, listener);
  }
}
