package lodebook.assembly.plan;

import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.RingDesign;

/// Random instances of one ring and one number of pieces: blocks of 1.3 T spread by 1.5 %, each
/// with what a plain annealing of 60 000 exchanges comes to and what random orders come to on
/// average.
final class Instances {
  private final Layout layout;
  private final SlotHarmonics ring;
  private final int pieces;
  private final double[] reference;
  private final double[] random;

  Instances(RingDesign design, int pieces, int instances) {
    layout = design.layout();
    ring = SlotHarmonics.of(design, design.ruleFacings());
    this.pieces = pieces;
    HarmonicForm form = HarmonicForm.of(ring, ring, new int[layout.slots()]);
    reference = new double[instances];
    random = new double[instances];
    IntStream.range(0, instances)
        .parallel()
        .forEach(
            i -> {
              double[] strength =
                  stock(i).stream().mapToDouble(each -> each.strength().remanenceTesla()).toArray();
              reference[i] = ReferenceAnnealing.search(form, strength, i);
              random[i] = ReferenceAnnealing.meanOfRandomOrders(form, strength, i);
            });
  }

  private List<Candidate> stock(int instance) {
    return Examples.lot("L", layout.magnetType(), pieces, 1.3, 100 + instance);
  }

  /// What the planner comes to, instance by instance.
  RotorPlan[] plans(double seconds) {
    return IntStream.range(0, reference.length)
        .mapToObj(
            i ->
                new RotorPlanner(RotorTask.of(layout, stock(i)), ring, ring)
                    .plan(1, Effort.seconds(layout.slots(), seconds)))
        .toArray(RotorPlan[]::new);
  }

  /// Planned over reference, sorted.
  double[] ratios(RotorPlan[] plans) {
    return IntStream.range(0, plans.length)
        .mapToDouble(i -> plans[i].unwantedHarmonics() / reference[i])
        .sorted()
        .toArray();
  }

  /// Median of mean random over planned.
  double gain(RotorPlan[] plans) {
    return median(
        IntStream.range(0, plans.length)
            .mapToDouble(i -> random[i] / plans[i].unwantedHarmonics())
            .toArray());
  }

  /// Median of mean random over reference.
  double referenceGain() {
    return median(
        IntStream.range(0, reference.length).mapToDouble(i -> random[i] / reference[i]).toArray());
  }

  static double median(double[] values) {
    double[] sorted = Arrays.stream(values).sorted().toArray();
    int n = sorted.length;
    return (sorted[(n - 1) / 2] + sorted[n / 2]) / 2;
  }
}
