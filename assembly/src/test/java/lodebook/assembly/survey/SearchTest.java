package lodebook.assembly.survey;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.RingDesign;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/// The search against weighing every explanation of up to three magnets one by one.
class SearchTest {
  private static final List<FaultKind> KINDS =
      List.of(
          FaultKind.REVERSED,
          FaultKind.MISSING,
          FaultKind.QUARTER_TURN_FORWARD,
          FaultKind.QUARTER_TURN_BACK);

  private static final RingDesign EIGHT =
      Rings.ring(2, 4, Focus.OUT, 8, 11, Rings.block(4, 4, 10), Rings.RADIAL);

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6})
  void findsTheLikeliestOfAll(long seed) {
    SplittableRandom random = new SplittableRandom(seed);
    List<Fault> faults = new ArrayList<>();
    for (int slot : List.of(1, 2, 6).subList(0, (int) (seed % 4))) {
      faults.add(Fault.of(slot, KINDS.get(random.nextInt(KINDS.size()))));
    }
    RingTruth truth = new RingTruth(EIGHT, 8, faults, random);
    RingModel ring = new RingModel(truth.recorded(), new ProbeResponses(EIGHT));
    RowModel rows =
        new RowModel(ring, Slip.NONE.rows(truth.read(8, Trials.METER, 0, 0), EIGHT.layout()));
    Judged best = bestOfAll(rows);
    List<Judged> found = Search.explain(rows, Priors.DEFAULT);
    Judged likeliest =
        found.stream()
            .filter(j -> j.explanation().faults().size() <= 3)
            .filter(j -> j.explanation().faults().stream().allMatch(f -> KINDS.contains(f.kind())))
            .findFirst()
            .orElseThrow();
    assertEquals(best.explanation(), likeliest.explanation(), () -> "seed " + seed);
    assertTrue(found.getFirst().logWeight() >= best.logWeight(), () -> "seed " + seed);
  }

  private static Judged bestOfAll(RowModel rows) {
    Judge judge = new Judge(rows, Priors.DEFAULT);
    List<Explanation> level = List.of(Explanation.NONE);
    Judged best = judge.judge(Explanation.NONE);
    for (int size = 1; size <= 3; size++) {
      List<Explanation> next = new ArrayList<>();
      for (Explanation smaller : level) {
        int from = smaller.faults().isEmpty() ? 0 : smaller.faults().getLast().place() + 1;
        for (int slot = from; slot < 8; slot++) {
          for (FaultKind kind : KINDS) {
            Explanation larger = smaller.with(Fault.of(slot, kind));
            next.add(larger);
            Judged judged = judge.judge(larger);
            best = judged.logWeight() > best.logWeight() ? judged : best;
          }
        }
      }
      level = next;
    }
    return best;
  }
}
