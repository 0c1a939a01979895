package lodebook.assembly.plan;

import java.util.Comparator;
import java.util.SplittableRandom;
import java.util.concurrent.atomic.AtomicLong;
import java.util.stream.IntStream;

/// Searches a puzzle by simulated annealing, half of the runs from random orders and half, less
/// hot, from neighbours in strength; each is ended by exchanging until no single exchange helps.
///
/// Source of the method: Kirkpatrick, Gelatt and Vecchi 1983, Science 220, 671. The runs share
/// nothing but the seed, so their number of processors does not change the result.
final class Annealing {
  private static final int BETWEEN_QUESTIONS = 4096;
  private static final int LOGARITHMS = 4096;

  /// First temperature as a share of what an exchange changes in a random order on average, last as
  /// a share of the first.
  private static final double HOT = 0.3;

  private static final double COOLING = 1e-3;

  /// A longer search has more runs and longer ones: tried exchanges of a run for each slot are so
  /// many times the square root of those of the whole search for each slot.
  private static final double LENGTH_OF_RUNS = 10;

  private static final int MOST_RUNS = 1000;

  private final Puzzle puzzle;
  private final Start start;
  private final long seed;
  private final Effort effort;
  private final double[] logarithms = new double[LOGARITHMS];
  private final AtomicLong best = new AtomicLong(Double.doubleToLongBits(Double.MAX_VALUE));

  /// @param classes classes of slots that should be alike, for runs that begin with neighbours
  Annealing(Puzzle puzzle, HarmlessClasses classes, long seed, Effort effort) {
    this.puzzle = puzzle;
    this.start = new Start(puzzle, classes);
    this.seed = seed;
    this.effort = effort;
    for (int i = 0; i < LOGARITHMS; i++) {
      logarithms[i] = -Math.log((i + 0.5) / LOGARITHMS);
    }
  }

  /// The best order of one run.
  private static final class Found {
    final int[] order;
    final double cost;

    Found(Trial trial) {
      order = trial.order();
      cost = trial.cost();
    }
  }

  /// The best order found; as they come where nothing can move.
  int[] search() {
    if (puzzle.movable.length == 0) {
      return puzzle.asTheyCome();
    }
    int runs = runs();
    return IntStream.range(0, runs)
        .parallel()
        .mapToObj(run -> anneal(run, effort.steps() / runs))
        .min(Comparator.comparingDouble(found -> found.cost))
        .orElseThrow()
        .order;
  }

  private int runs() {
    double stepsASlot = (double) effort.steps() / puzzle.movable.length;
    return (int) Math.clamp(Math.sqrt(stepsASlot) / LENGTH_OF_RUNS, 2, MOST_RUNS);
  }

  private Found anneal(int run, long steps) {
    SplittableRandom random = new SplittableRandom(seed * 1_000_003 + run);
    boolean neighbours = run % 2 == 1;
    Trial trial = new Trial(puzzle, neighbours ? start.neighbours(random) : start.any(random));
    double hot = HOT * typicalChange(trial, random);
    double factor =
        Math.pow(COOLING, (double) BETWEEN_QUESTIONS / Math.max(BETWEEN_QUESTIONS, steps));
    double temperature = hot;
    Found kept = new Found(trial);
    for (long done = 0; done < steps && effort.keepGoing().getAsBoolean(); ) {
      long until = Math.min(steps, done + BETWEEN_QUESTIONS);
      for (; done < until; done++) {
        tryOne(trial, random, temperature);
      }
      temperature *= factor;
      trial.refresh();
      if (trial.cost() < kept.cost) {
        kept = new Found(trial);
      }
    }
    trial.restart(kept.order);
    descend(trial);
    tell(trial.cost());
    return new Found(trial);
  }

  private void tryOne(Trial trial, SplittableRandom random, double temperature) {
    int slot = puzzle.movable[random.nextInt(puzzle.movable.length)];
    int[] pool = puzzle.pools[puzzle.poolOf[slot]];
    int other = pool[random.nextInt(pool.length)];
    if (trial.mayExchange(slot, other)) {
      double rise = trial.costWith(slot, other) - trial.cost();
      if (rise <= 0 || rise < temperature * logarithms[random.nextInt(LOGARITHMS)]) {
        trial.exchange(slot, other);
      }
    }
  }

  private double typicalChange(Trial trial, SplittableRandom random) {
    double sum = 0;
    int tries = 200;
    for (int i = 0; i < tries; i++) {
      int slot = puzzle.movable[random.nextInt(puzzle.movable.length)];
      int[] pool = puzzle.pools[puzzle.poolOf[slot]];
      int other = pool[random.nextInt(pool.length)];
      if (other != slot) {
        sum += Math.abs(trial.costWith(slot, other) - trial.cost());
      }
    }
    return Math.max(sum / tries, Double.MIN_NORMAL);
  }

  /// Makes the best single exchange until none helps.
  private void descend(Trial trial) {
    boolean better = true;
    while (better) {
      better = false;
      for (int slot : puzzle.movable) {
        int bestOther = -1;
        double bestCost = trial.cost() * (1 - 1e-12);
        for (int other : puzzle.pools[puzzle.poolOf[slot]]) {
          double cost =
              trial.mayExchange(slot, other) ? trial.costWith(slot, other) : Double.MAX_VALUE;
          if (cost < bestCost) {
            bestCost = cost;
            bestOther = other;
          }
        }
        if (bestOther >= 0) {
          trial.exchange(slot, bestOther);
          better = true;
        }
      }
    }
  }

  private void tell(double cost) {
    long bits = Double.doubleToLongBits(Math.max(0, cost));
    if (best.accumulateAndGet(bits, Math::min) == bits) {
      effort.bestSoFar().accept(Math.sqrt(Math.max(0, cost)));
    }
  }
}
