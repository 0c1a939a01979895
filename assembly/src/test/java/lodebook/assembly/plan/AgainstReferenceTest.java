package lodebook.assembly.plan;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.Layout;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/// The planner beside a plain annealing on the same instances: at least as good in the median,
/// never more than 5 % worse.
class AgainstReferenceTest {

  @ParameterizedTest
  @CsvSource({"3,12", "3,15", "8,32", "8,40"})
  void atLeastAsGoodAsPlainAnnealing(int polePairs, int pieces) {
    Comparison comparison = new Comparison(polePairs, pieces, 4);
    double[] against = comparison.ratios(0.1);
    assertTrue(median(against) <= 1.0005, "ratios to the reference " + Arrays.toString(against));
    assertTrue(against[3] <= 1.05, "ratios to the reference " + Arrays.toString(against));
  }

  /// Writes the table of docs/performance.md to target/planning.md.
  @Test
  @Tag("slow")
  void twentyInstancesOfEachSizeAgainstTime() throws IOException {
    StringBuilder table = new StringBuilder();
    for (int[] size : new int[][] {{3, 12}, {3, 15}, {8, 32}, {8, 40}, {12, 48}, {12, 60}}) {
      Comparison comparison = new Comparison(size[0], size[1], 20);
      double one = 0;
      for (double seconds : new double[] {0.1, 1, 10}) {
        long began = System.nanoTime();
        double[] against = comparison.ratios(seconds);
        double took = (System.nanoTime() - began) / 20e9;
        table.append(
            String.format(
                Locale.ROOT,
                "| %d | %d | %.1f | %.2f | %.2f | %.2f | %.4f | %.4f |%n",
                4 * size[0],
                size[1],
                seconds,
                took,
                median(comparison.gain(true)),
                median(comparison.gain(false)),
                median(against),
                against[against.length - 1]));
        assertTrue(median(against) <= 1.0005, table.toString());
        assertTrue(against[against.length - 1] <= 1.05, table.toString());
        if (seconds == 1) {
          one = Arrays.stream(comparison.planned).sum();
        }
      }
      double ten = Arrays.stream(comparison.planned).sum();
      assertTrue(one <= 1.02 * ten, "after 1 s " + one + ", after 10 s " + ten);
    }
    Files.writeString(Path.of("target", "planning.md"), table.toString());
  }

  private static double median(double[] values) {
    double[] sorted = Arrays.stream(values).sorted().toArray();
    int n = sorted.length;
    return (sorted[(n - 1) / 2] + sorted[n / 2]) / 2;
  }

  /// Instances of one size: blocks of 1.3 T spread by 1.5 %, four per pole pair.
  private static final class Comparison {
    private final Layout layout;
    private final SlotHarmonics ring;
    private final int pieces;
    private final int instances;
    private final double[] reference;
    private final double[] random;
    final double[] planned;

    Comparison(int polePairs, int pieces, int instances) {
      layout = Examples.layout(polePairs, 4, Focus.OUT, null);
      DipoleRing dipoles = Examples.ring(layout);
      ring = dipoles.harmonics(dipoles.ruleFacings());
      this.pieces = pieces;
      this.instances = instances;
      HarmonicForm form = HarmonicForm.of(ring, ring, new int[layout.slots()]);
      reference = new double[instances];
      random = new double[instances];
      planned = new double[instances];
      for (int i = 0; i < instances; i++) {
        double[] strength =
            stock(i).stream().mapToDouble(each -> each.strength().remanenceTesla()).toArray();
        reference[i] = ReferenceAnnealing.search(form, strength, i);
        random[i] = ReferenceAnnealing.meanOfRandomOrders(form, strength, i);
      }
    }

    private List<Candidate> stock(int instance) {
      return Examples.lot("L", "MAIN", pieces, 1.3, 100 + instance);
    }

    /// Planned over reference, sorted.
    double[] ratios(double seconds) {
      double[] ratios = new double[instances];
      for (int i = 0; i < instances; i++) {
        RotorPlan plan =
            new RotorPlanner(RotorTask.of(layout, stock(i)), ring, ring)
                .plan(1, Effort.seconds(layout.slots(), seconds));
        planned[i] = plan.unwantedHarmonics();
        ratios[i] = planned[i] / reference[i];
      }
      Arrays.sort(ratios);
      return ratios;
    }

    /// Mean of random orders over what the planner, or the reference, comes to.
    double[] gain(boolean ofPlanner) {
      double[] gain = new double[instances];
      Arrays.setAll(gain, i -> random[i] / (ofPlanner ? planned[i] : reference[i]));
      return gain;
    }
  }
}
