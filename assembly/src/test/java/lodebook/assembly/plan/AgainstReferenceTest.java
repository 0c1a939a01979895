package lodebook.assembly.plan;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Locale;
import lodebook.assembly.layout.RingDesign;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/// The planner beside a plain annealing on the same instances: at least as good in the median,
/// never more than 5 % worse.
class AgainstReferenceTest {
  private static final int INSTANCES = 20;

  @ParameterizedTest
  @CsvSource({"3,12,3", "3,15,3", "8,32,4", "8,40,4"})
  void atLeastAsGoodAsPlainAnnealing(int polePairs, int pieces, double gap) {
    Instances instances = new Instances(design(polePairs, gap), pieces, 4);
    double[] against = instances.ratios(instances.plans(0.1));
    assertTrue(isAtLeastAsGood(against), "ratios to the reference " + Arrays.toString(against));
  }

  /// Mean of random orders over planned, for circles nearer and farther: the fewer harmonics reach
  /// the working circle, the more a plan gains. Writes target/planning-gains.md.
  @Test
  @Tag("slow")
  void gainsByGeometry() throws IOException {
    StringBuilder table = new StringBuilder();
    for (double gap : new double[] {2.5, 3, 4, 5, 6, 10}) {
      for (int slots : new int[] {12, 32, 48}) {
        gains(table, "%d, %.1f mm".formatted(slots, gap), design(slots / 4, gap));
      }
    }
    gains(table, "workshop's outer ring, 16", Examples.workshopOuterRing());
    Files.writeString(Path.of("target", "planning-gains.md"), table.toString());
  }

  private static void gains(StringBuilder table, String name, RingDesign design) {
    table.append("| ").append(name);
    for (int pieces : new int[] {design.slots(), design.slots() * 5 / 4}) {
      Instances instances = new Instances(design, pieces, INSTANCES);
      RotorPlan[] plans = instances.plans(1);
      double[] against = instances.ratios(plans);
      table.append(
          String.format(
              Locale.ROOT,
              " | %.2f | %.2f | %.3f | %.3f",
              instances.referenceGain(),
              instances.gain(plans),
              Instances.median(against),
              against[against.length - 1]));
      assertTrue(isAtLeastAsGood(against), table.toString());
    }
    table.append(" |\n");
  }

  /// Writes target/planning.md.
  @Test
  @Tag("slow")
  void twentyInstancesOfEachSizeAgainstTime() throws IOException {
    StringBuilder table = new StringBuilder();
    for (int slots : new int[] {12, 32, 48}) {
      for (int pieces : new int[] {slots, slots * 5 / 4}) {
        Instances instances = new Instances(design(slots / 4, slots == 12 ? 3 : 4), pieces, 20);
        double[] means = new double[3];
        double[] efforts = {0.1, 1, 10};
        for (int i = 0; i < efforts.length; i++) {
          long began = System.nanoTime();
          RotorPlan[] plans = instances.plans(efforts[i]);
          double took = (System.nanoTime() - began) / 1e9 / INSTANCES;
          double[] against = instances.ratios(plans);
          means[i] =
              Arrays.stream(plans).mapToDouble(RotorPlan::unwantedHarmonics).average().orElse(0);
          table.append(
              String.format(
                  Locale.ROOT,
                  "| %d of %d | %.1f | %.2f | %.2f | %.3f | %.3f | %.4f |%n",
                  slots,
                  pieces,
                  efforts[i],
                  took,
                  instances.gain(plans),
                  Instances.median(against),
                  against[against.length - 1],
                  overBound(plans)));
          assertTrue(isAtLeastAsGood(against), table.toString());
        }
        assertTrue(means[1] <= 1.02 * means[2], "after 1 s and 10 s " + Arrays.toString(means));
      }
    }
    Files.writeString(Path.of("target", "planning.md"), table.toString());
  }

  /// Median of the plans over what is proven to be the least.
  private static double overBound(RotorPlan[] plans) {
    return Instances.median(
        Arrays.stream(plans)
            .mapToDouble(
                plan -> {
                  Double bound = plan.lowerBound();
                  return bound == null ? Double.NaN : plan.unwantedHarmonics() / bound;
                })
            .toArray());
  }

  /// @param against ratios to the reference, sorted
  private static boolean isAtLeastAsGood(double[] against) {
    return Instances.median(against) <= 1.0005 && against[against.length - 1] <= 1.05;
  }

  private static RingDesign design(int polePairs, double gapMillimetres) {
    return Examples.design(Examples.layoutWithGap(polePairs, gapMillimetres * 1e-3));
  }
}
