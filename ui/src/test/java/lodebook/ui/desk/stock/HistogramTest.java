package lodebook.ui.desk.stock;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/// Counting remanences in steps.
class HistogramTest {
  @Test
  void valuesOnAnEdgeBelongToTheStepAboveIt() {
    Histogram histogram = Histogram.of(List.of(1.300, 1.302, 1.3049, 1.310), List.of());
    assertEquals(1.300, histogram.lowTesla(), 1e-9);
    assertEquals(4, histogram.counts().stream().mapToInt(c -> c).sum());
    assertEquals(1, histogram.counts().getFirst());
    assertEquals(1, histogram.counts().getLast());
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
  void nothingIsLostAndTheMarksAreInSight(long seed) {
    Random random = new Random(seed);
    List<Double> values = new ArrayList<>();
    for (int i = 0; i < 1 + random.nextInt(500); i++) {
      values.add(1.3 + 0.001 * random.nextInt(1 + random.nextInt(300)) * random.nextGaussian());
    }
    List<Double> marks = List.of(1.28, 1.32);
    Histogram histogram = Histogram.of(values, marks);
    assertEquals(values.size(), histogram.counts().stream().mapToInt(c -> c).sum(), "seed " + seed);
    assertTrue(histogram.lowTesla() <= 1.28 + 1e-9, "seed " + seed);
    assertTrue(histogram.highTesla() >= 1.32 - 1e-9, "seed " + seed);
  }
}
