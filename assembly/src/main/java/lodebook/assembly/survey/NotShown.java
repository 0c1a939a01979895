package lodebook.assembly.survey;

import java.util.Set;
import java.util.TreeSet;

/// Which magnets the readings say nothing about.
final class NotShown {
  /// Square of the separation in standard deviations at which a right magnet speaks, on the middle
  /// of its readings, 20 to 1 against being reversed.
  private static final double LEAST_SEPARATION = 2 * Math.log(20);

  private NotShown() {}

  /// Slots, from 1, whose magnet could be reversed without these readings telling at 20 to 1.
  static Set<Integer> in(RowModel rows) {
    RingModel ring = rows.ring();
    Cholesky factor = new Cholesky(rows.covariance(Explanation.NONE));
    double[] right = ring.rightPolarisation();
    Set<Integer> slots = new TreeSet<>();
    for (int slot = 0; slot < ring.slots(); slot++) {
      if (ring.filled(slot)) {
        double[] change =
            factor.whiten(rows.answer(slot, -2 * right[2 * slot], -2 * right[2 * slot + 1]));
        if (Judge.dot(change, change) < LEAST_SEPARATION) {
          slots.add(slot + 1);
        }
      }
    }
    return slots;
  }
}
