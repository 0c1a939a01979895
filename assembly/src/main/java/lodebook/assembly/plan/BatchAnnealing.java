package lodebook.assembly.plan;

import java.util.Arrays;
import java.util.Comparator;
import java.util.SplittableRandom;
import java.util.stream.IntStream;

/// Searches a batch by simulated annealing over all rings at once, from pieces already dealt well.
///
/// Two runs share nothing but the seed, so that a second processor is used and does not change the
/// result.
final class BatchAnnealing {
  private static final int RUNS = 2;
  private static final int BETWEEN_QUESTIONS = 65_536;

  private static final double COOLING = 1e-3;
  private static final int FARTHEST_POWER = 10;

  private final BatchPuzzle puzzle;
  private final long seed;
  private final Effort effort;

  /// For each piece its place among those of its pool by strength.
  private final int[] rank;

  /// For each holder and piece its pool by rising strength; empty where it is kept.
  private final int[][] sorted;

  BatchAnnealing(BatchPuzzle puzzle, long seed, Effort effort) {
    this.puzzle = puzzle;
    this.seed = seed;
    this.effort = effort;
    rank = new int[puzzle.strength.length];
    sorted = new int[puzzle.strength.length][0];
    for (int[] pool : puzzle.pools) {
      int[] rising =
          Arrays.stream(pool)
              .boxed()
              .sorted(Comparator.comparingDouble(piece -> puzzle.strength[piece]))
              .mapToInt(piece -> piece)
              .toArray();
      for (int i = 0; i < rising.length; i++) {
        rank[rising[i]] = i;
        sorted[rising[i]] = rising;
      }
    }
  }

  /// The better of the runs.
  int[] search(int[] dealt) {
    return IntStream.range(0, RUNS)
        .parallel()
        .mapToObj(run -> anneal(run, dealt))
        .min(Comparator.comparingDouble(BatchTrial::cost))
        .orElseThrow()
        .order();
  }

  private BatchTrial anneal(int run, int[] dealt) {
    SplittableRandom random = new SplittableRandom(seed * 1_000_003 + run);
    BatchTrial trial = new BatchTrial(puzzle, dealt);
    int[] slots = movable();
    int[][] poolOf = poolOf();
    if (slots.length == 0) {
      return trial;
    }
    long steps = effort.steps() / RUNS;
    double temperature = trial.cost() / slots.length * (run == 0 ? 1 : 0.05);
    double factor =
        Math.pow(COOLING, (double) BETWEEN_QUESTIONS / Math.max(BETWEEN_QUESTIONS, steps));
    for (long done = 0; done < steps && effort.keepGoing().getAsBoolean(); ) {
      long until = Math.min(steps, done + BETWEEN_QUESTIONS);
      for (; done < until; done++) {
        int slot = slots[random.nextInt(slots.length)];
        int other =
            random.nextBoolean() ? inRing(slot, poolOf[slot], random) : alike(trial, slot, random);
        if (trial.mayExchange(slot, other)) {
          double rise = trial.change(slot, other);
          if (rise <= 0 || rise < -temperature * Math.log(random.nextDouble())) {
            trial.exchange(slot, other);
          }
        }
      }
      temperature *= factor;
      trial.refresh();
      if (run == 0) {
        effort.bestSoFar().accept(Math.sqrt(trial.cost() / puzzle.forms.length));
      }
    }
    return trial;
  }

  /// A slot of the same ring and pool.
  private int inRing(int slot, int[] pool, SplittableRandom random) {
    int ring = puzzle.ringOf[slot];
    int low = lowest(pool, puzzle.first[ring]);
    int high = lowest(pool, puzzle.first[ring + 1]);
    return pool[low + random.nextInt(high - low)];
  }

  /// The holder of a piece alike in strength, mostly of one very much alike.
  private int alike(BatchTrial trial, int slot, SplittableRandom random) {
    int piece = trial.pieceOn(slot);
    int[] rising = sorted[piece];
    int far = 1 + random.nextInt(1 << random.nextInt(FARTHEST_POWER + 1));
    int at = rank[piece] + (random.nextBoolean() ? far : -far);
    return at < 0 || at >= rising.length ? slot : trial.holderOf(rising[at]);
  }

  /// Index of the first holder of a sorted pool that is not below a number.
  private static int lowest(int[] pool, int holder) {
    int at = Arrays.binarySearch(pool, holder);
    return at >= 0 ? at : -at - 1;
  }

  private int[] movable() {
    return IntStream.range(0, puzzle.pools.length)
        .flatMap(pool -> IntStream.of(puzzle.pools[pool]))
        .filter(holder -> holder < puzzle.spares())
        .sorted()
        .toArray();
  }

  private int[][] poolOf() {
    int[][] poolOf = new int[puzzle.spares()][];
    for (int[] pool : puzzle.pools) {
      for (int holder : pool) {
        if (holder < poolOf.length) {
          poolOf[holder] = pool;
        }
      }
    }
    return poolOf;
  }
}
