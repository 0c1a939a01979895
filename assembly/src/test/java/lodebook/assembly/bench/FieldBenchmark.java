package lodebook.assembly.bench;

import java.util.Random;
import java.util.concurrent.TimeUnit;
import lodebook.assembly.field.Block;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/// The field of 48 blocks at 48 points, and the transcendental functions of the closed form alone.
///
/// The closed form of the two components in the ring's plane has, for each block and point, 16
/// arctangents and 8 logarithms, one for each corner; this program sums the arctangents as
/// arguments of complex products and the logarithms as one of a quotient, so that it evaluates
/// fewer.
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(1)
public class FieldBenchmark {
  private static final int BLOCKS = 48;
  private static final int POINTS = 48;
  private static final double RING_RADIUS = 0.050;
  private static final double PROBE_RADIUS = 0.0535;
  private static final double ABOVE = 0.002;

  private final Block block = new Block(0.005, 0.005, 0.010);
  private final double[] tensor = new double[3];
  private final double[] numbers = new double[BLOCKS * POINTS * 24];

  private final double[] cosine = new double[POINTS];
  private final double[] sine = new double[POINTS];

  /// Fills the arguments of the bare functions with numbers of the usual size.
  public FieldBenchmark() {
    for (int n = 0; n < POINTS; n++) {
      cosine[n] = Math.cos(2 * Math.PI * (n + 0.25) / POINTS);
      sine[n] = Math.sin(2 * Math.PI * (n + 0.25) / POINTS);
    }
    Random random = new Random(1);
    for (int n = 0; n < numbers.length; n++) {
      numbers[n] = random.nextDouble(0.05, 5);
    }
  }

  /// In the ring's middle plane.
  @Benchmark
  public double fieldAtMidHeight() {
    return field(0);
  }

  /// Away from the middle plane, where all eight corners count.
  @Benchmark
  public double fieldAboveMidHeight() {
    return field(ABOVE);
  }

  private double field(double height) {
    double sum = 0;
    for (int i = 0; i < BLOCKS; i++) {
      for (int m = 0; m < POINTS; m++) {
        double c = cosine[Math.floorMod(m - i, POINTS)];
        double s = sine[Math.floorMod(m - i, POINTS)];
        block.planarTensor(PROBE_RADIUS * c - RING_RADIUS, PROBE_RADIUS * s, height, tensor, 0);
        sum += c * tensor[0] + s * tensor[2];
      }
    }
    return sum;
  }

  /// Sixteen arctangents and eight logarithms for each block and point.
  @Benchmark
  public double functionsOfTheClosedForm() {
    double sum = 0;
    for (int n = 0; n < BLOCKS * POINTS; n++) {
      int at = 24 * n;
      for (int a = 0; a < 16; a++) {
        sum += Math.atan(numbers[at + a]);
      }
      for (int a = 16; a < 24; a++) {
        sum += Math.log(numbers[at + a]);
      }
    }
    return sum;
  }

  /// What is left of them at mid-height: two arctangents (of two arguments) and one logarithm.
  @Benchmark
  public double functionsLeftAtMidHeight() {
    return left(2);
  }

  /// What is left of them elsewhere: four arctangents (of two arguments) and one logarithm.
  @Benchmark
  public double functionsLeftAboveMidHeight() {
    return left(4);
  }

  private double left(int angles) {
    double sum = 0;
    for (int n = 0; n < BLOCKS * POINTS; n++) {
      int at = 24 * n;
      for (int a = 0; a < angles; a++) {
        sum += Math.atan2(numbers[at + 2 * a], numbers[at + 2 * a + 1]);
      }
      sum += Math.log(numbers[at + 16]);
    }
    return sum;
  }
}
