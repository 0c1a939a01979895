package lodebook.assembly.survey;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.util.List;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.TreeSet;
import java.util.stream.Collectors;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.RingDesign;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/// The bound by which slips are passed over, against every slip with every single fault.
class SlipCandidatesTest {
  private static final double SHARE = 0.1;
  private static final RingDesign EIGHT =
      Rings.ring(2, 4, Focus.OUT, 8, 11, Rings.block(4, 4, 10), Rings.BOTH);

  @ParameterizedTest
  @ValueSource(ints = {5, 8})
  void nothingThatFitsIsPassedOver(int read) {
    RingTruth truth =
        new RingTruth(
            EIGHT, 8, List.of(Fault.of(2, FaultKind.REVERSED)), new SplittableRandom(read));
    RingModel ring = new RingModel(truth.recorded(), new ProbeResponses(EIGHT));
    List<Reading> readings = truth.read(read, Trials.METER, 0, 0);
    Set<String> every = new TreeSet<>();
    for (Slip slip : Slip.all(8)) {
      if (slip.equals(Slip.NONE)) {
        continue;
      }
      RowModel rows = new RowModel(ring, slip.rows(readings, EIGHT.layout()));
      for (int slot = 0; slot < 8; slot++) {
        for (Fault fault : Possible.of(ring, slot)) {
          Explanation one = Explanation.NONE.with(fault);
          double[] mean = rows.mean(one);
          double[] rest = rows.residual(one);
          if (Judge.dot(rest, rest) < SHARE * Judge.dot(mean, mean)) {
            every.add(slip + " " + one);
          }
        }
      }
    }
    assertFalse(every.isEmpty());
    assertEquals(
        every,
        new SlipCandidates(ring, readings)
            .withOneFault(SHARE).stream()
                .map(candidate -> candidate.slip() + " " + candidate.explanation())
                .collect(Collectors.toCollection(TreeSet::new)));
  }
}
