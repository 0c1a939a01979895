package lodebook.assembly.plan;

import java.util.SplittableRandom;

/// Orders from which a search begins.
final class Start {
  private final Puzzle puzzle;
  private final int[][][] slots;
  private final int[][][] runs;

  Start(Puzzle puzzle, HarmlessClasses classes) {
    this.puzzle = puzzle;
    slots = new int[puzzle.pools.length][][];
    runs = new int[puzzle.pools.length][][];
    for (int pool = 0; pool < slots.length; pool++) {
      slots[pool] = classes.slotsOf(pool);
      int[] sizes = new int[slots[pool].length];
      for (int i = 0; i < sizes.length; i++) {
        sizes[i] = slots[pool][i].length;
      }
      runs[pool] = new NeighbourRuns(puzzle, pool, sizes).pieces();
    }
  }

  /// Any order.
  int[] any(SplittableRandom random) {
    int[] order = puzzle.asTheyCome();
    for (int[] pool : puzzle.pools) {
      int[] pieces = pool.clone();
      shuffle(pieces, random);
      for (int i = 0; i < pool.length; i++) {
        order[pool[i]] = pieces[i];
      }
    }
    return puzzle.bringWishedIn(order);
  }

  /// Neighbours in strength in each class of slots, in any order within it.
  int[] neighbours(SplittableRandom random) {
    int[] order = puzzle.asTheyCome();
    int[] holderOf = order.clone();
    for (int pool = 0; pool < slots.length; pool++) {
      for (int i = 0; i < slots[pool].length; i++) {
        int[] pieces = runs[pool][i].clone();
        shuffle(pieces, random);
        for (int j = 0; j < pieces.length; j++) {
          put(pieces[j], slots[pool][i][j], order, holderOf);
        }
      }
    }
    return puzzle.bringWishedIn(order);
  }

  private static void put(int piece, int holder, int[] order, int[] holderOf) {
    int from = holderOf[piece];
    int other = order[holder];
    order[from] = other;
    holderOf[other] = from;
    order[holder] = piece;
    holderOf[piece] = holder;
  }

  private static void shuffle(int[] values, SplittableRandom random) {
    for (int i = values.length - 1; i > 0; i--) {
      int j = random.nextInt(i + 1);
      int value = values[i];
      values[i] = values[j];
      values[j] = value;
    }
  }
}
