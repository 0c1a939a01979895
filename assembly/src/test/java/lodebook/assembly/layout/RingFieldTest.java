package lodebook.assembly.layout;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/// The stirrer ring's readings, as two independent programs computed them.
class RingFieldTest {
  private final RingDesign ring = Rings.stirrer();
  private final RingField field = new RingField(ring);

  private double read(List<Facing> facings, int slot, Component component) {
    ReadingPlace place =
        ReadingPlace.of(ring.layout(), new ProbePoint(slot, Spot.CENTRE, component));
    return 1e3 * field.at(List.of(place)).apply(Rings.equal(facings, 1.3))[0];
  }

  private List<Facing> reversed(int slot) {
    List<Facing> facings = new ArrayList<>(ring.ruleFacings());
    facings.set(slot - 1, facings.get(slot - 1).reversed());
    return facings;
  }

  @Test
  void magnetFacingInReversed() {
    List<Facing> right = ring.ruleFacings();
    List<Facing> wrong = reversed(3);
    assertEquals(-453.5, read(right, 3, Component.RADIAL), 0.05);
    assertEquals(211.9, read(wrong, 3, Component.RADIAL), 0.05);
    assertEquals(0, read(right, 2, Component.RADIAL), 1e-9);
    assertEquals(-49.9, read(wrong, 2, Component.RADIAL), 0.05);
    assertEquals(357.8, read(right, 2, Component.TANGENTIAL), 0.05);
    assertEquals(277.8, read(wrong, 2, Component.TANGENTIAL), 0.05);
  }

  @Test
  void magnetAlongTheRingReversed() {
    List<Facing> wrong = reversed(2);
    assertEquals(-148, read(wrong, 2, Component.TANGENTIAL), 0.5);
    assertEquals(344, read(wrong, 1, Component.RADIAL), 0.5);
    assertEquals(-344, read(wrong, 3, Component.RADIAL), 0.5);
  }
}
