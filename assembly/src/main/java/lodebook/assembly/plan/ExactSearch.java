package lodebook.assembly.plan;

import java.util.Arrays;
import java.util.Comparator;
import java.util.function.BooleanSupplier;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;

/// Proves the best order of a small puzzle, by filling slot after slot and giving up every
/// beginning that cannot end better than the best known order.
///
/// With Q = RᵀR, R lower triangular, sᵀQs is a sum of squares of which the first t contain only the
/// first t strengths: their sum is what a beginning costs at least, whatever follows.
///
/// Source of the method: Fincke and Pohst 1985, Math. Comp. 44, 463, with the nearest piece tried
/// first as in Schnorr and Euchner 1994, Math. Programming 66, 181 (both from memory).
final class ExactSearch {
  private static final int BETWEEN_QUESTIONS = 4096;

  private final Puzzle puzzle;
  private final int n;
  private final double[][] root;

  /// Slots in the order of filling: kept ones first.
  private final int[] sequence;

  /// For each pool its pieces by rising strength.
  private final int[][] sorted;

  private final boolean[] used;

  /// For each pool the slots still to be filled and the wished pieces still to be placed.
  private final int[] slotsLeft;

  private final int[] wishedLeft;
  private final double[] s;
  private final int[] chosen;
  private final double largestWorkingSquare;
  private final BooleanSupplier keepGoing;
  private long nodesLeft;
  private double bestCost;
  private int[] best;

  /// @param puzzle pieces that are all measured
  /// @param known an order to beat
  /// @param mostNodes beginnings looked at before the search is given up
  /// @param keepGoing asked now and then; false gives the search up
  ExactSearch(Puzzle puzzle, int[] known, long mostNodes, BooleanSupplier keepGoing) {
    this.puzzle = puzzle;
    this.keepGoing = keepGoing;
    n = puzzle.form.slots;
    sequence =
        IntStream.range(0, n)
            .boxed()
            .sorted(Comparator.comparing(slot -> puzzle.poolOf[slot] >= 0))
            .mapToInt(slot -> slot)
            .toArray();
    root = root();
    sorted = new int[puzzle.pools.length][];
    for (int i = 0; i < sorted.length; i++) {
      sorted[i] =
          Arrays.stream(puzzle.pools[i])
              .boxed()
              .sorted(Comparator.comparingDouble(piece -> puzzle.strength[piece]))
              .mapToInt(piece -> piece)
              .toArray();
    }
    used = new boolean[puzzle.holders()];
    slotsLeft = new int[sorted.length];
    wishedLeft = new int[sorted.length];
    for (int i = 0; i < sorted.length; i++) {
      slotsLeft[i] = (int) IntStream.of(puzzle.pools[i]).filter(holder -> holder < n).count();
      wishedLeft[i] = (int) IntStream.of(puzzle.pools[i]).filter(p -> puzzle.wished[p]).count();
    }
    s = new double[n];
    chosen = new int[n];
    largestWorkingSquare = Math.pow(LowerBound.largestAmplitude(puzzle), 2);
    nodesLeft = mostNodes;
    best = known.clone();
    bestCost = puzzle.cost(known);
  }

  /// The best order, or null where the nodes ran out before it was proven.
  int @Nullable [] search() {
    fill(0, 0);
    return nodesLeft < 0 ? null : best.clone();
  }

  private void fill(int depth, double soFar) {
    if (depth == n) {
      judge();
      return;
    }
    int slot = sequence[depth];
    int pool = puzzle.poolOf[slot];
    double known = 0;
    for (int j = 0; j < depth; j++) {
      known += root[depth][j] * s[j];
    }
    double pivot = root[depth][depth];
    if (pool < 0) {
      place(depth, slot, soFar, known + pivot * puzzle.strength[slot]);
      return;
    }
    int[] pieces = sorted[pool];
    double wanted = pivot > 0 ? -known / pivot : puzzle.strength[pieces[pieces.length / 2]];
    int above = 0;
    while (above < pieces.length && puzzle.strength[pieces[above]] < wanted) {
      above++;
    }
    int below = above - 1;
    while (nodesLeft >= 0 && (below >= 0 || above < pieces.length)) {
      boolean up =
          below < 0
              || (above < pieces.length
                  && puzzle.strength[pieces[above]] - wanted
                      < wanted - puzzle.strength[pieces[below]]);
      int piece = up ? pieces[above++] : pieces[below--];
      boolean roomForIt = puzzle.wished[piece] || wishedLeft[pool] < slotsLeft[pool];
      if (!used[piece] && roomForIt) {
        double residual = known + pivot * puzzle.strength[piece];
        if (soFar + residual * residual >= limit()) {
          return;
        }
        int wished = puzzle.wished[piece] ? 1 : 0;
        used[piece] = true;
        slotsLeft[pool]--;
        wishedLeft[pool] -= wished;
        place(depth, piece, soFar, residual);
        used[piece] = false;
        slotsLeft[pool]++;
        wishedLeft[pool] += wished;
      }
    }
  }

  private void place(int depth, int piece, double soFar, double residual) {
    nodesLeft--;
    if (nodesLeft % BETWEEN_QUESTIONS == 0 && !keepGoing.getAsBoolean()) {
      nodesLeft = -1;
    }
    s[depth] = puzzle.strength[piece];
    chosen[depth] = piece;
    fill(depth + 1, soFar + residual * residual);
  }

  private double limit() {
    return bestCost * largestWorkingSquare * (1 + 1e-9);
  }

  private void judge() {
    int[] order = new int[puzzle.holders()];
    boolean[] taken = new boolean[puzzle.holders()];
    for (int depth = 0; depth < n; depth++) {
      order[sequence[depth]] = chosen[depth];
      taken[chosen[depth]] = true;
    }
    int[] spare = IntStream.range(0, puzzle.holders()).filter(piece -> !taken[piece]).toArray();
    System.arraycopy(spare, 0, order, n, spare.length);
    double cost = puzzle.cost(order);
    if (cost < bestCost) {
      bestCost = cost;
      best = order;
    }
  }

  /// R with Q = RᵀR for the slots in filling order, from the last row up.
  private double[][] root() {
    double[][] rest = new double[n][n];
    double largest = 0;
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        rest[i][j] = puzzle.form.q[sequence[i] * n + sequence[j]];
      }
      largest = Math.max(largest, rest[i][i]);
    }
    double[][] lower = new double[n][n];
    for (int t = n - 1; t >= 0; t--) {
      if (rest[t][t] > 1e-12 * largest) {
        double pivot = Math.sqrt(rest[t][t]);
        for (int j = 0; j <= t; j++) {
          lower[t][j] = rest[t][j] / pivot;
        }
        for (int i = 0; i < t; i++) {
          for (int j = 0; j < t; j++) {
            rest[i][j] -= lower[t][i] * lower[t][j];
          }
        }
      }
    }
    return lower;
  }
}
