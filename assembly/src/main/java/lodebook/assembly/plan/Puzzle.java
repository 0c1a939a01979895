package lodebook.assembly.plan;

import java.util.Arrays;
import java.util.Comparator;

/// The planner's question in bare numbers: pieces on holders, the first holders being the slots.
///
/// Holder h < slots is slot h + 1, the others hold spare pieces. Piece h is the one that sits on
/// holder h as they come. Holders of one pool exchange their pieces; a holder in no pool is kept.
final class Puzzle {
  final HarmonicForm form;

  /// Strength of each piece, tesla.
  final double[] strength;

  /// Variance of a single piece about that, tesla², for unmeasured ones; 0 for measured ones.
  final double[] variance;

  /// Whether each piece must be in a slot.
  final boolean[] wished;

  /// Holders of each pool; every pool has at least one slot.
  final int[][] pools;

  /// For each holder the index of its pool, −1 where it is kept.
  final int[] poolOf;

  /// Slots (holders) whose piece may change and has an alternative.
  final int[] movable;

  /// Wanted amplitude |w·s|, tesla (half the field's), and its relative tolerance.
  final double target;

  final double tolerance;

  Puzzle(
      HarmonicForm form,
      double[] strength,
      double[] variance,
      boolean[] wished,
      int[][] pools,
      double target,
      double tolerance) {
    this.form = form;
    this.strength = strength;
    this.variance = variance;
    this.wished = wished;
    this.pools = pools;
    this.target = target;
    this.tolerance = tolerance;
    poolOf = new int[strength.length];
    Arrays.fill(poolOf, -1);
    for (int i = 0; i < pools.length; i++) {
      for (int holder : pools[i]) {
        poolOf[holder] = i;
      }
    }
    movable =
        Arrays.stream(pools)
            .filter(pool -> pool.length > 1)
            .flatMapToInt(Arrays::stream)
            .filter(holder -> holder < form.slots)
            .sorted()
            .toArray();
  }

  /// A puzzle in which no piece must be in a slot.
  Puzzle(
      HarmonicForm form,
      double[] strength,
      double[] variance,
      int[][] pools,
      double target,
      double tolerance) {
    this(form, strength, variance, new boolean[strength.length], pools, target, tolerance);
  }

  int holders() {
    return strength.length;
  }

  /// Whether all pieces are measured.
  boolean certain() {
    return Arrays.stream(variance).allMatch(each -> each == 0);
  }

  /// The order in which each piece sits on its own holder.
  int[] asTheyCome() {
    int[] order = new int[holders()];
    Arrays.setAll(order, i -> i);
    return order;
  }

  /// The order in which the strongest piece of each pool sits on its first holder, and so on.
  int[] sorted() {
    int[] order = asTheyCome();
    for (int[] pool : pools) {
      int[] pieces =
          Arrays.stream(pool)
              .boxed()
              .sorted(Comparator.comparingDouble(piece -> -strength[piece]))
              .mapToInt(piece -> piece)
              .toArray();
      for (int i = 0; i < pool.length; i++) {
        order[pool[i]] = pieces[i];
      }
    }
    return bringWishedIn(order);
  }

  /// Puts each wished piece that is spare into a slot, for the piece most like it there.
  int[] bringWishedIn(int[] order) {
    for (int[] pool : pools) {
      for (int holder : pool) {
        if (holder >= form.slots && wished[order[holder]]) {
          int piece = order[holder];
          int slot =
              Arrays.stream(pool)
                  .filter(each -> each < form.slots && !wished[order[each]])
                  .boxed()
                  .min(
                      Comparator.comparingDouble(
                          each -> Math.abs(strength[order[each]] - strength[piece])))
                  .orElseThrow();
          order[holder] = order[slot];
          order[slot] = piece;
        }
      }
    }
    return order;
  }

  /// Strengths slot by slot under an order.
  double[] inSlots(int[] order) {
    double[] inSlots = new double[form.slots];
    Arrays.setAll(inSlots, i -> strength[order[i]]);
    return inSlots;
  }

  /// Unwanted harmonics of an order, a ratio.
  double unwanted(int[] order) {
    double[] variances = new double[form.slots];
    Arrays.setAll(variances, i -> variance[order[i]]);
    return form.unwanted(inSlots(order), variances);
  }

  /// What a search makes small: the square of the unwanted harmonics, and a price that outweighs it
  /// for an amplitude outside the tolerance.
  double cost(int[] order) {
    double unwanted = unwanted(order);
    double amplitude = form.workingAmplitude(inSlots(order)) / 2;
    return unwanted * unwanted + priceOfAmplitude(amplitude);
  }

  /// @param amplitude |w·s|, tesla
  double priceOfAmplitude(double amplitude) {
    double excess = Math.abs(amplitude / target - 1) - tolerance;
    return excess > 0 ? 100 * excess * excess + excess : 0;
  }
}
