package lodebook.assembly.survey;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import java.util.function.BiFunction;
import lodebook.assembly.layout.RingDesign;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;

/// Surveys with a known truth, made without linearisation by [RingTruth]; the large tables with the
/// same lines are made by [SurveyTruthStudy].
class SurveyTrialsTest {
  private static final long SEED = 20_000;
  private static final int TRIALS = 6;

  @TestFactory
  List<DynamicTest> twelveSlots() {
    return tests(Rings.blocks12(Rings.BOTH));
  }

  @TestFactory
  List<DynamicTest> eighteenSlotsThreePerPair() {
    return tests(Rings.blocks18(Rings.BOTH));
  }

  private static List<DynamicTest> tests(RingDesign design) {
    return TrialLines.of(design).entrySet().stream()
        .filter(line -> !line.getKey().startsWith("weak") && !line.getKey().startsWith("60 % read"))
        .map(line -> DynamicTest.dynamicTest(line.getKey(), () -> check(line)))
        .toList();
  }

  private static void check(
      Map.Entry<String, BiFunction<SplittableRandom, Integer, Trials.Trial>> line) {
    Trials.Count count = Trials.run(TRIALS, SEED, line.getValue());
    assertTrue(count.wrongOnes().isEmpty(), () -> count + " " + count.wrongOnes());
    assertTrue(
        count.right() >= TRIALS - 1,
        () -> count + " of " + TRIALS + " from seed " + SEED + " " + count.unsureOnes());
  }
}
