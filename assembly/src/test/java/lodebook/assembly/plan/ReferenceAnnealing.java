package lodebook.assembly.plan;

import java.util.Random;

/// A plain simulated annealing to measure the planner by: 60 000 exchanges, each reckoned from the
/// whole form.
final class ReferenceAnnealing {
  static final int STEPS = 60_000;

  /// The least unwanted harmonics it comes to.
  ///
  /// @param strength of the pieces; the first as many as there are slots are in the ring
  static double search(HarmonicForm form, double[] strength, long seed) {
    Random random = new Random(seed);
    double[] pieces = strength.clone();
    double cost = form.unwanted(pieces);
    double best = cost;
    double hot = 0.3 * cost;
    for (int step = 0; step < STEPS; step++) {
      double temperature = hot * Math.pow(1e-3, (double) step / STEPS);
      int slot = random.nextInt(form.slots);
      int other = random.nextInt(pieces.length);
      exchange(pieces, slot, other);
      double with = form.unwanted(pieces);
      if (with <= cost || random.nextDouble() < Math.exp((cost - with) / temperature)) {
        cost = with;
        best = Math.min(best, cost);
      } else {
        exchange(pieces, slot, other);
      }
    }
    return best;
  }

  /// Mean unwanted harmonics of random orders.
  static double meanOfRandomOrders(HarmonicForm form, double[] strength, long seed) {
    Random random = new Random(seed);
    double[] pieces = strength.clone();
    double sum = 0;
    int orders = 200;
    for (int order = 0; order < orders; order++) {
      for (int i = pieces.length - 1; i > 0; i--) {
        exchange(pieces, i, random.nextInt(i + 1));
      }
      sum += form.unwanted(pieces);
    }
    return sum / orders;
  }

  private static void exchange(double[] values, int i, int j) {
    double value = values[i];
    values[i] = values[j];
    values[j] = value;
  }

  private ReferenceAnnealing() {}
}
