package lodebook.assembly.plan;

import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.IntStream;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.RingDesign;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/// Time of planning. Run with the tests' class path: `java org.openjdk.jmh.Main PlanningBenchmark`.
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 2, time = 2)
@Measurement(iterations = 3, time = 2)
@Fork(1)
public class PlanningBenchmark {
  /// Slots of the ring, a multiple of four.
  @Param({"12", "48", "96", "192"})
  public int slots;

  /// A plan of one rotor from a quarter more pieces than slots, with the usual effort.
  @Benchmark
  public RotorPlan rotor() {
    RingDesign design = Examples.design(Examples.layout(slots / 4, 4, Focus.OUT, null));
    RotorTask task =
        RotorTask.of(design.layout(), Examples.lot("L", "MAIN", slots * 5 / 4, 1.3, 1));
    return RotorPlanner.of(design, task).plan(1, Effort.usual(slots));
  }

  /// Ten rotors from a quarter more pieces than they need, with the usual effort.
  @Benchmark
  public BatchPlan tenRotors() {
    RingDesign design = Examples.design(Examples.layout(slots / 4, 4, Focus.OUT, null));
    List<BatchTask.Ring> rings =
        IntStream.range(0, 10)
            .mapToObj(i -> new BatchTask.Ring("R-" + i, design, List.of()))
            .toList();
    BatchTask task =
        new BatchTask(
            rings, Examples.lot("L", "MAIN", 10 * slots * 5 / 4, 1.3, 1), List.of(), MixPolicy.FEW);
    return new BatchPlanner(task).plan(1, BatchPlanner.usualEffort(task));
  }
}
