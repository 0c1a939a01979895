package lodebook.assembly.plan;

import java.util.Arrays;
import org.jspecify.annotations.Nullable;

/// What the unwanted harmonics of a puzzle are at least, whatever the order.
///
/// sᵀQs ≥ λ · Σ of squares about the means of the harmless classes, λ the smallest eigenvalue of Q
/// among patterns without such a mean. The sum is least for runs of neighbours in strength, and the
/// working wave is largest for the strongest pieces.
final class LowerBound {
  private LowerBound() {}

  /// A proven bound, a ratio, or null where there is none: pieces unmeasured or slots kept.
  static @Nullable Double of(Puzzle puzzle, HarmlessClasses classes) {
    int n = puzzle.form.slots;
    if (!puzzle.certain() || Arrays.stream(puzzle.poolOf, 0, n).anyMatch(pool -> pool < 0)) {
      return null;
    }
    double within = 0;
    for (int pool = 0; pool < puzzle.pools.length; pool++) {
      int[] sizes = Arrays.stream(classes.slotsOf(pool)).mapToInt(slots -> slots.length).toArray();
      within += new NeighbourRuns(puzzle, pool, sizes).leastSquares();
    }
    return Math.sqrt(classes.smallestEigenvalueBeyond() * within) / largestAmplitude(puzzle);
  }

  /// Upper bound of |w·s|: the strongest pieces of each pool, the strongest where they count most.
  static double largestAmplitude(Puzzle puzzle) {
    int n = puzzle.form.slots;
    double sum = 0;
    for (int i = 0; i < n; i++) {
      if (puzzle.poolOf[i] < 0) {
        sum += weight(puzzle, i) * Math.abs(puzzle.strength[i]);
      }
    }
    for (int[] pool : puzzle.pools) {
      double[] weights =
          Arrays.stream(pool).filter(i -> i < n).mapToDouble(i -> weight(puzzle, i)).toArray();
      double[] strengths = Arrays.stream(pool).mapToDouble(i -> puzzle.strength[i]).toArray();
      Arrays.sort(weights);
      Arrays.sort(strengths);
      for (int i = 1; i <= weights.length; i++) {
        sum += weights[weights.length - i] * strengths[strengths.length - i];
      }
    }
    return sum;
  }

  private static double weight(Puzzle puzzle, int slot) {
    return Math.hypot(puzzle.form.workingReal[slot], puzzle.form.workingImaginary[slot]);
  }
}
