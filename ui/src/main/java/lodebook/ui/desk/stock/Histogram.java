package lodebook.ui.desk.stock;

import java.util.ArrayList;
import java.util.List;

/// Remanences counted in equal steps.
///
/// @param lowTesla lower edge of the first step
/// @param stepTesla width of a step
/// @param counts how many fall into each
record Histogram(double lowTesla, double stepTesla, List<Integer> counts) {
  private static final double[] STEPS = {0.5e-3, 1e-3, 2e-3, 5e-3, 10e-3, 20e-3, 50e-3, 100e-3};
  private static final int MOST_STEPS = 26;

  Histogram {
    counts = List.copyOf(counts);
  }

  /// Counts values over a range that holds them and some more marks, in the smallest round step
  /// that makes no more than 26 of them.
  ///
  /// @param tesla the values; at least one
  /// @param marks further values that the range must hold
  static Histogram of(List<Double> tesla, List<Double> marks) {
    double least = Double.POSITIVE_INFINITY;
    double most = Double.NEGATIVE_INFINITY;
    List<Double> all = new ArrayList<>(tesla);
    all.addAll(marks);
    for (double each : all) {
      least = Math.min(least, each);
      most = Math.max(most, each);
    }
    double step = STEPS[STEPS.length - 1];
    for (int i = STEPS.length - 1; i >= 0; i--) {
      if ((most - least) / STEPS[i] < MOST_STEPS - 2) {
        step = STEPS[i];
      }
    }
    double low = Math.floor(least / step) * step;
    int count = (int) Math.floor((most - low) / step + 1e-9) + 1;
    Integer[] counts = new Integer[count];
    java.util.Arrays.fill(counts, 0);
    for (double each : tesla) {
      int at = (int) Math.min(count - 1, Math.floor((each - low) / step + 1e-9));
      counts[at]++;
    }
    return new Histogram(low, step, List.of(counts));
  }

  /// Upper edge of the last step.
  double highTesla() {
    return lowTesla + stepTesla * counts.size();
  }

  /// The largest count.
  int most() {
    return counts.stream().mapToInt(c -> c).max().orElse(0);
  }
}
