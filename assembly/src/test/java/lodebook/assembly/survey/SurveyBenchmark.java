package lodebook.assembly.survey;

import java.util.List;
import java.util.SplittableRandom;
import java.util.concurrent.TimeUnit;
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
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/// Time of explaining a survey, both components at every slot. Run with the tests' class path:
/// `java org.openjdk.jmh.Main SurveyBenchmark`.
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 2, time = 2)
@Measurement(iterations = 3, time = 2)
@Fork(1)
@SuppressWarnings("NullAway.Init") // the setup fills the fields
public class SurveyBenchmark {
  /// Slots of the ring, a multiple of four.
  @Param({"12", "24", "48", "96", "192"})
  public int slots;

  /// Magnets reversed.
  @Param({"0", "1", "3"})
  public int reversed;

  private SurveyExplainer explainer;
  private List<Reading> readings;

  /// Makes a survey and lets the explainer keep the field at its points.
  @Setup
  public void read() {
    RingDesign design =
        Rings.ring(
            slots / 4,
            4,
            Focus.IN,
            slots * 0.94,
            slots * 0.94 - 3.5,
            Rings.block(5, 5, 10),
            Rings.BOTH);
    List<Fault> faults =
        List.of(1, 5, 10).subList(0, reversed).stream()
            .map(slot -> Fault.of(slot, FaultKind.REVERSED))
            .toList();
    RingTruth truth = new RingTruth(design, slots, faults, new SplittableRandom(1));
    explainer = new SurveyExplainer(truth.recorded(), Priors.DEFAULT);
    readings = truth.read(slots, Trials.METER, 0, 0);
    explainer.explain(readings);
  }

  /// One survey after the field's response is prepared.
  @Benchmark
  public Diagnosis explained() {
    return explainer.explain(readings);
  }
}
