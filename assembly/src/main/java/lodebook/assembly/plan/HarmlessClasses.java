package lodebook.assembly.plan;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.EigenDecompositionSymmetric;
import org.hipparchus.linear.RealMatrix;

/// Slots that may differ from one another at no cost, as classes.
///
/// Some patterns of strengths are no assembly error: all pieces of a type alike, and with four
/// magnets per pole pair also one strength for those across and another for those along. A class is
/// a set of slots that must be alike; classes may differ.
final class HarmlessClasses {
  private final Puzzle puzzle;
  private final int n;
  private final int[] classes;

  /// @param puzzle whose slots are divided
  /// @param segmentsPerPolePair magnets k per pole pair
  HarmlessClasses(Puzzle puzzle, int segmentsPerPolePair) {
    this.puzzle = puzzle;
    n = puzzle.form.slots;
    classes = finest(segmentsPerPolePair);
  }

  /// Slots (from 0) of the classes of a pool, kept slots left out; none is empty.
  int[][] slotsOf(int pool) {
    return Arrays.stream(classes)
        .distinct()
        .mapToObj(
            each ->
                Arrays.stream(puzzle.pools[pool])
                    .filter(holder -> holder < n && classes[holder] == each)
                    .toArray())
        .filter(slots -> slots.length > 0)
        .toArray(int[][]::new);
  }

  private int[] finest(int segments) {
    double scale = 0;
    for (int i = 0; i < n; i++) {
      scale = Math.max(scale, puzzle.form.q[i * n + i]);
    }
    for (int divisor = segments; divisor > 1; divisor--) {
      if (segments % divisor == 0) {
        int[] divided = divided(divisor);
        if (harmless(divided, scale)) {
          return divided;
        }
      }
    }
    return divided(1);
  }

  private int[] divided(int divisor) {
    Map<Integer, Integer> numbers = new HashMap<>();
    int[] divided = new int[n];
    for (int i = 0; i < n; i++) {
      int next = numbers.size();
      divided[i] = numbers.computeIfAbsent(puzzle.poolOf[i] * divisor + i % divisor, key -> next);
    }
    return divided;
  }

  private boolean harmless(int[] divided, double scale) {
    for (int each : Arrays.stream(divided).distinct().toArray()) {
      double[] pattern = Arrays.stream(divided).mapToDouble(c -> c == each ? 1 : 0).toArray();
      if (puzzle.form.square(pattern) > 1e-9 * n * scale) {
        return false;
      }
    }
    return true;
  }

  /// Smallest eigenvalue of Q among patterns without a mean in any class, rounded down.
  double smallestEigenvalueBeyond() {
    int[] members = new int[n];
    for (int each : classes) {
      members[each]++;
    }
    RealMatrix q = new Array2DRowRealMatrix(n, n);
    double scale = 0;
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        q.setEntry(i, j, puzzle.form.q[i * n + j]);
      }
      scale += puzzle.form.q[i * n + i];
    }
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        if (classes[i] == classes[j]) {
          q.addToEntry(i, j, scale / members[classes[i]]);
        }
      }
    }
    double[] values = new EigenDecompositionSymmetric(q).getEigenvalues();
    return Math.max(0, Arrays.stream(values).min().orElse(0) - 1e-10 * scale / n);
  }
}
