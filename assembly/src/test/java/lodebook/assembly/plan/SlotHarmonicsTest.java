package lodebook.assembly.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.InsertFrom;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Numbering;
import lodebook.assembly.layout.Probe;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.layout.Spread;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Shape;
import org.junit.jupiter.api.Test;

class SlotHarmonicsTest {

  /// Source: two independent programs, blocks 4 × 4 × 10 mm of 1.3 T, permeability 1, 12 slots.
  @Test
  void theRingOfTheExampleCases() {
    SlotHarmonics ring = ring(3, 4, Focus.OUT, 10e-3, 13e-3, 4e-3, 10e-3);
    assertEquals(0.4248, amplitude(ring, 3, 1.3), 0.00005);
    assertEquals(0.0515, amplitude(ring, 15, 1.3), 0.00005);
    assertEquals(0.0276, amplitude(ring, 27, 1.3), 0.00005);
  }

  @Test
  void idealOrdersAreThoseOfTheDefinition() {
    for (int k : new int[] {2, 3, 4, 5, 6, 8}) {
      int segments = k;
      double[][] none = new double[200][3 * k];
      SlotHarmonics ring = new SlotHarmonics(3, k, none, none);
      List<Integer> byDefinition =
          IntStream.range(0, 200)
              .filter(
                  h ->
                      IntStream.rangeClosed(-100, 100)
                          .anyMatch(m -> Math.abs(3 * (1 + segments * m)) == h))
              .boxed()
              .toList();
      assertEquals(
          byDefinition, IntStream.range(0, 200).filter(ring::ideal).boxed().toList(), "k = " + k);
    }
  }

  @Test
  void harmonicsThatDoNotReachTheWorkingWaveAreRefused() {
    assertEquals(
        "harmonics up to 3 don't reach the working wave 4",
        assertThrows(
                IllegalArgumentException.class,
                () -> new SlotHarmonics(4, 4, new double[4][16], new double[4][16]))
            .getMessage());
  }

  private static double amplitude(SlotHarmonics ring, int order, double remanence) {
    double re = 0;
    double im = 0;
    for (int i = 0; i < ring.slots(); i++) {
      re += ring.real(order, i);
      im += ring.imaginary(order, i);
    }
    return 2 * remanence * Math.hypot(re, im);
  }

  private static SlotHarmonics ring(
      int p, int k, Focus focus, double radius, double working, double size, double length) {
    Layout layout =
        new Layout(
            "EX",
            "A",
            p,
            k,
            focus,
            Numbering.CLOCKWISE,
            0,
            Facing.OUT,
            radius,
            "MAIN",
            null,
            working,
            new Probe(working, 0, List.of(Spot.CENTRE), Arrays.asList(Component.values())),
            Spread.DEFAULT,
            "",
            null,
            false,
            InsertFrom.FACE,
            0.03);
    MagnetType block =
        new MagnetType(
            "MAIN", Shape.BLOCK, size, size, length, 0, 0, 0, "N42", 0.05e-3, "nickel", 1, 0);
    RingDesign design = new RingDesign(layout, block, null);
    return SlotHarmonics.of(design, design.ruleFacings());
  }
}
