package lodebook.assembly.plan;

import java.util.Arrays;
import java.util.Comparator;

/// Pieces of a pool for its classes of slots such that the pieces of a class differ least: the
/// least sum of squares about the class means.
///
/// By rising strength each class takes a run of neighbours, since exchanging an end of a class for
/// a piece between its ends never raises its sum. For classes of one size the choice is the best
/// there is; for others it is the best in the order given.
final class NeighbourRuns {
  private final int[] sorted;
  private final double[] strength;
  private final int[] sizes;
  private final double[][] least;

  /// @param puzzle whose pieces are chosen
  /// @param pool index of the pool
  /// @param sizes slots of each class of the pool
  NeighbourRuns(Puzzle puzzle, int pool, int[] sizes) {
    sorted =
        Arrays.stream(puzzle.pools[pool])
            .boxed()
            .sorted(Comparator.comparingDouble(piece -> puzzle.strength[piece]))
            .mapToInt(piece -> piece)
            .toArray();
    strength = Arrays.stream(sorted).mapToDouble(piece -> puzzle.strength[piece]).toArray();
    this.sizes = sizes.clone();
    least = new double[sizes.length + 1][strength.length + 1];
    for (int taken = 1; taken <= sizes.length; taken++) {
      int size = sizes[taken - 1];
      Arrays.fill(least[taken], Double.POSITIVE_INFINITY);
      for (int end = size; end <= strength.length; end++) {
        double with = least[taken - 1][end - size] + squares(end - size, end);
        least[taken][end] = Math.min(least[taken][end - 1], with);
      }
    }
  }

  /// The least sum of squares, tesla².
  double leastSquares() {
    return least[sizes.length][strength.length];
  }

  /// The pieces of each class, in the order of the sizes.
  int[][] pieces() {
    int[][] pieces = new int[sizes.length][];
    int end = strength.length;
    for (int taken = sizes.length; taken > 0; taken--) {
      while (end > sizes[taken - 1] && least[taken][end] == least[taken][end - 1]) {
        end--;
      }
      pieces[taken - 1] = Arrays.copyOfRange(sorted, end - sizes[taken - 1], end);
      end -= sizes[taken - 1];
    }
    return pieces;
  }

  private double squares(int from, int to) {
    double sum = 0;
    for (int i = from; i < to; i++) {
      sum += strength[i];
    }
    double mean = sum / (to - from);
    double squares = 0;
    for (int i = from; i < to; i++) {
      squares += (strength[i] - mean) * (strength[i] - mean);
    }
    return squares;
  }
}
