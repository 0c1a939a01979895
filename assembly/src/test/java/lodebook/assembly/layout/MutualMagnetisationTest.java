package lodebook.assembly.layout;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import lodebook.assembly.field.Block;
import lodebook.assembly.field.Pose;
import lodebook.assembly.field.PosedBody;
import lodebook.assembly.field.Vector3;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.LUDecomposition;
import org.junit.jupiter.api.Test;

class MutualMagnetisationTest {

  /// Boundary-value solution for ideal rotation: (1−θ)θRo²/(Ri² − θ²Ro²), θ = (µ+1)/(µ−1); Ri 20,
  /// Ro 30, µ 1.05, p = 1 → 0.975868. Here 16 sectors of a very long ring, each uniformly
  /// polarised, at the axis.
  @Test
  void longRingOfSectors() {
    double rigid = atTheAxis(1.0);
    double soft = atTheAxis(1.05);
    // Halbach 1980, Nucl. Instr. Meth. 169, 1: ln(Ro/Ri)·sin(2π/M)/(2π/M), M = 16
    assertEquals(Math.log(1.5) * Math.sin(Math.PI / 8) / (Math.PI / 8), rigid, 1e-5);
    assertEquals(0.975868, soft / rigid, 1e-3);
  }

  private static double atTheAxis(double recoilPermeability) {
    RingDesign ring =
        new RingDesign(
            Rings.layout(2, 8, Focus.IN, 25, 15),
            Rings.arc(20, 30, 22.5, 20000, recoilPermeability),
            null);
    List<Facing> facings = new ArrayList<>();
    for (int i = 0; i < 16; i++) {
      facings.add(new Facing(i * 22.5));
    }
    RingPolarisation answer = MutualMagnetisation.of(ring).answerTo(Rings.equal(facings, 1));
    ReadingPlace axis = new ReadingPlace(0, 0, 0, Component.RADIAL);
    return Math.abs(new RingField(ring).at(List.of(axis)).apply(answer)[0]);
  }

  @Test
  void permeabilityOneChangesNothing() {
    RingDesign ring = Rings.stirrer();
    RingPolarisation given = Rings.equal(ring.ruleFacings(), 1.3);
    RingPolarisation answer = MutualMagnetisation.of(ring).answerTo(given);
    for (int slot = 1; slot <= 12; slot++) {
      assertEquals(given.out(slot), answer.out(slot), 0);
      assertEquals(given.next(slot), answer.next(slot), 0);
    }
  }

  @Test
  void emptySlotsTakeNoPart() {
    RingDesign ring = soft();
    RingPolarisation given = Rings.equal(ring.ruleFacings(), 1.3);
    RingPolarisation one = MutualMagnetisation.of(ring).withOnly(List.of(5)).answerTo(given);
    assertEquals(0, one.out(4), 0);
    assertEquals(0, one.next(4), 0);
    // a bar 4 × 4 × 10 alone, N = 0.4 across its length: 1.3 / (1 + 0.05·N)
    assertEquals(1.3 / (1 + 0.05 * 0.4), one.out(5), 3e-3);
  }

  @Test
  void readingsPerRemanenceAreThoseOfTheAnswer() {
    RingDesign ring = soft();
    MutualMagnetisation mutual = MutualMagnetisation.of(ring);
    RingPolarisation given = Rings.equal(ring.ruleFacings(), 1.3);
    List<ReadingPlace> places =
        List.of(
            new ReadingPlace(0.013, 0.1, 0, Component.RADIAL),
            new ReadingPlace(0.013, 2, 0.001, Component.TANGENTIAL));
    FieldMatrix matrix = new RingField(ring).at(places);
    double[] expected = matrix.apply(mutual.answerTo(given));
    double[] direct = mutual.perRemanence(matrix).apply(given);
    assertEquals(expected[0], direct[0], 1e-12);
    assertEquals(expected[1], direct[1], 1e-12);
  }

  /// Uniform polarisation per magnet against magnets cut into 4 × 4 × 4 cells, each with its own
  /// polarisation: the readings over the stirrer ring differ by less than 0.6 % of the greatest
  /// (0.47 % here; the mutual magnetisation itself is worth 2 %).
  @Test
  void uniformPolarisationIsGoodEnough() {
    RingDesign ring = soft();
    RingPolarisation uniform =
        MutualMagnetisation.of(ring).answerTo(Rings.equal(ring.ruleFacings(), 1.3));
    CutRing cut = new CutRing(ring, 1.3, 4);
    RingField field = new RingField(ring);
    double worst = 0;
    double greatest = 0;
    double effect = 0;
    for (int n = 0; n < 5; n++) {
      double angle = n * Math.PI / 24;
      for (Component component : Component.values()) {
        ReadingPlace place = new ReadingPlace(0.013, angle, 0, component);
        FieldMatrix matrix = field.at(List.of(place));
        double plain = matrix.apply(uniform)[0];
        worst = Math.max(worst, Math.abs(plain - cut.read(place)));
        greatest = Math.max(greatest, Math.abs(plain));
        effect =
            Math.max(
                effect, Math.abs(plain - matrix.apply(Rings.equal(ring.ruleFacings(), 1.3))[0]));
      }
    }
    assertTrue(worst < 0.006 * greatest, worst / greatest + " of the greatest reading");
    assertTrue(effect > 3 * worst, "the correction itself is " + effect / greatest);
  }

  private static RingDesign soft() {
    return new RingDesign(Rings.layout(3, 4, Focus.OUT, 10, 13), Rings.block(4, 4, 10, 1.05), null);
  }

  /// A ring whose magnets are cut into n × n × n blocks with a polarisation each, H taken at the
  /// cells' middles; all magnets of one kind look the same but for their slot's angle, so one out
  /// and one along the ring are unknown.
  private static final class CutRing {
    private final RingDesign ring;
    private final int n;
    private final Block cell;
    private final double[] polarisation;

    CutRing(RingDesign ring, double remanence, int n) {
      this.ring = ring;
      this.n = n;
      cell = new Block(0.004 / n, 0.004 / n, 0.010 / n);
      int cells = n * n * n;
      int size = 2 * cells * 3;
      double[][] system = new double[size][size];
      double[] right = new double[size];
      for (int kind = 0; kind < 2; kind++) {
        for (int c = 0; c < cells; c++) {
          int row = (kind * cells + c) * 3;
          Facing facing = ring.layout().ruleFacing(kind + 1);
          right[row] = remanence * Math.cos(facing.radians());
          right[row + 1] = remanence * Math.sin(facing.radians());
          for (int axis = 0; axis < 3; axis++) {
            system[row + axis][row + axis] = 1;
          }
          couple(system, row, kind, c);
        }
      }
      polarisation =
          new LUDecomposition(new Array2DRowRealMatrix(system, false))
              .getSolver()
              .solve(new ArrayRealVector(right, false))
              .toArray();
    }

    private void couple(double[][] system, int row, int kind, int c) {
      int cells = n * n * n;
      double atAngle = ring.layout().angleFromFirstRadians(kind + 1);
      Vector3 point = middle(c).turnedAboutZ(atAngle);
      for (int slot = 1; slot <= 12; slot++) {
        for (int other = 0; other < cells; other++) {
          int column = ((slot + 1) % 2 * cells + other) * 3;
          for (int axis = 0; axis < 3; axis++) {
            Vector3 unit =
                new Vector3(axis == 0 ? 1 : 0, axis == 1 ? 1 : 0, axis == 2 ? 1 : 0)
                    .times(sign(slot));
            Vector3 h = field(slot, other, unit, point).turnedAboutZ(-atAngle);
            if (slot == kind + 1 && other == c) {
              h = h.minus(unit);
            }
            system[row][column + axis] -= 0.05 * h.x();
            system[row + 1][column + axis] -= 0.05 * h.y();
            system[row + 2][column + axis] -= 0.05 * h.z();
          }
        }
      }
    }

    /// Slots 3 and 4 face the other way round than 1 and 2, and so on.
    private static int sign(int slot) {
      return (slot - 1) / 2 % 2 == 0 ? 1 : -1;
    }

    private Vector3 middle(int c) {
      double u = (c % n + 0.5) / n - 0.5;
      int column = c / n % n;
      double v = (column + 0.5) / n - 0.5;
      int layer = c / (n * n);
      double w = (layer + 0.5) / n - 0.5;
      return new Vector3(0.010 + 0.004 * u, 0.004 * v, 0.010 * w);
    }

    private Vector3 field(int slot, int c, Vector3 inSlot, Vector3 point) {
      double angle = ring.layout().angleFromFirstRadians(slot);
      return new PosedBody(cell, Pose.turnedAboutZ(middle(c).turnedAboutZ(angle), angle))
          .flux(point, inSlot.turnedAboutZ(angle));
    }

    double read(ReadingPlace place) {
      Vector3 point =
          new Vector3(place.radiusMetres(), 0, place.heightMetres())
              .turnedAboutZ(place.angleRadians());
      Vector3 sum = Vector3.ZERO;
      int cells = n * n * n;
      for (int slot = 1; slot <= 12; slot++) {
        for (int c = 0; c < cells; c++) {
          int at = ((slot + 1) % 2 * cells + c) * 3;
          Vector3 j =
              new Vector3(polarisation[at], polarisation[at + 1], polarisation[at + 2])
                  .times(sign(slot));
          sum = sum.plus(field(slot, c, j, point));
        }
      }
      Vector3 own = sum.turnedAboutZ(-place.angleRadians());
      return place.component() == Component.RADIAL ? own.x() : own.y();
    }
  }
}
