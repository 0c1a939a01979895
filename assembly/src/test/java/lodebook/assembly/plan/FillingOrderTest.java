package lodebook.assembly.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import lodebook.assembly.field.Vector3;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.InsertFrom;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.RingDesign;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FillingOrderTest {

  /// Source: independent figures for 4 × 4 × 10 mm blocks of 1.3 T in a ring of 12 slots: 11 to 15
  /// N on a wall; the sign rule is common practice (trade): in a complete ring with four per pole
  /// pair towards the working side where it faces out or in, towards the other where it lies along.
  @Test
  void theLastMagnetOfTwelvePressesWithElevenToFifteenNewtons() {
    for (int slot = 1; slot <= 2; slot++) {
      FillingOrder order = last(slot, InsertFrom.FACE);
      FillingStep step = order.steps().getFirst();
      double radial = step.force().radialNewtons();
      assertEquals(1, order.steps().size());
      assertTrue(Math.abs(radial) > 11 && Math.abs(radial) < 15, "slot " + slot + ": " + radial);
      assertEquals(slot % 2 == 1 ? Wall.OUTER : Wall.INNER, step.wall());
      assertEquals(0, step.force().tangentialNewtons(), 1e-3);
      assertTrue(step.force().pushOutNewtons() < 1, "slot " + slot + ": " + step.force());
    }
  }

  /// Source: the same independent figures, about 1 N along the axis. In place the magnets lie in
  /// line and there is none; on its way in one that faces out is drawn in by 0.8 N at most, one
  /// that lies along the ring is pushed out by 0.45 N at most.
  @Test
  void onItsWayInTheLastMagnetOfTwelveFeelsSomeTenthsOfANewtonAlongTheAxis() {
    UnitForces forces = new UnitForces(design(InsertFrom.FACE));
    double[][] greatest = new double[2][2];
    for (int slot = 1; slot <= 2; slot++) {
      for (int i = 0; i < UnitForces.DRAWN_OUT.length; i++) {
        double axial = 0;
        for (int other = 1; other <= 12; other++) {
          axial += other == slot ? 0 : 1.3 * 1.3 * forces.on(slot, other)[i].z();
        }
        greatest[slot - 1][0] = Math.min(greatest[slot - 1][0], axial);
        greatest[slot - 1][1] = Math.max(greatest[slot - 1][1], axial);
      }
    }
    assertEquals(-0.8, greatest[0][0], 0.1);
    assertEquals(0, greatest[0][1], 0.01);
    assertEquals(0.44, greatest[1][1], 0.1);
  }

  /// Against dipoles: each block is 6 × 6 × 15 of them, and a force is the change of energy with
  /// place. Neighbours touch nearly, so the sum is right to some per cent only.
  @Test
  void forcesAreThoseOfManyDipoles() {
    UnitForces forces = new UnitForces(design(InsertFrom.FACE));
    for (int from : new int[] {2, 5}) {
      Vector3[] onFirst = forces.on(1, from);
      for (int i : new int[] {0, 3, 5}) {
        Vector3 expected = dipoleForce(from, UnitForces.DRAWN_OUT[i] * 10e-3);
        double error = onFirst[i].minus(expected).norm();
        assertTrue(
            error < 0.06 * expected.norm() + 0.002,
            "from " + from + " at " + i + ": " + onFirst[i] + " and not " + expected);
      }
    }
  }

  @Test
  void actionAndReactionAreEqual() {
    UnitForces forces = new UnitForces(design(InsertFrom.FACE));
    for (int slot = 1; slot <= 2; slot++) {
      for (int from = slot + 1; from <= slot + 5; from++) {
        Vector3 on = forces.on(slot, from)[0].turnedAboutZ(Math.PI / 6 * (slot - 1));
        Vector3 back = forces.on(from, slot)[0].turnedAboutZ(Math.PI / 6 * (from - 1));
        assertEquals(0, on.plus(back).norm(), 2e-3 * on.norm() + 1e-6, slot + " and " + from);
      }
    }
  }

  @ParameterizedTest
  @CsvSource({
    "ROUND_THE_RING,3,12,'3,4,5,6,7,8,9,10,11,12,1,2'",
    "EVERY_SECOND,2,12,'2,4,6,8,10,12,3,5,7,9,11,1'",
    "OPPOSITE_PAIRS,1,12,'1,7,2,8,3,9,4,10,5,11,6,12'",
    "QUADRANTS,1,12,'1,4,7,10,2,5,8,11,3,6,9,12'",
    "EVERY_SECOND,1,5,'1,3,5,2,4'",
    "QUADRANTS,1,10,'1,3,6,8,2,4,7,9,5,10'"
  })
  void patterns(OrderPattern pattern, int start, int slots, String expected) {
    List<Integer> order = Arrays.stream(expected.split(",")).map(Integer::valueOf).toList();
    assertEquals(order, pattern.from(start, slots));
  }

  @Test
  void everyPatternFillsEverySlotOnce() {
    for (OrderPattern pattern : OrderPattern.values()) {
      for (int slots = 4; slots <= 50; slots++) {
        assertEquals(
            IntStream.rangeClosed(1, slots).boxed().toList(),
            pattern.from(1 + slots % 4, slots).stream().sorted().toList(),
            pattern + " of " + slots);
      }
    }
  }

  /// No pattern begun at any slot of a pole pair does better by more than is worth a harder order,
  /// and slots that are filled are left alone.
  @Test
  void theOrderTakenHasTheLeastWorstPushOut() {
    RingDesign design = design(InsertFrom.FACE);
    double[] remanence = new double[12];
    Arrays.fill(remanence, 1.3);
    Set<Integer> filled = Set.of(2, 9);
    FillingOrder taken = FillingOrder.of(design, remanence, filled);
    List<Integer> slots = taken.steps().stream().map(FillingStep::slot).sorted().toList();
    assertEquals(List.of(1, 3, 4, 5, 6, 7, 8, 10, 11, 12), slots);
    StepForces forces = new StepForces(design, new UnitForces(design), remanence);
    for (OrderPattern pattern : OrderPattern.values()) {
      for (int start = 1; start <= 4; start++) {
        Set<Integer> standing = new HashSet<>(filled);
        List<FillingStep> steps = new ArrayList<>();
        for (int slot : pattern.from(start, 12)) {
          if (!standing.contains(slot)) {
            steps.add(forces.step(steps.size() + 1, slot, standing));
            standing.add(slot);
          }
        }
        double worst = new FillingOrder(pattern, steps).worstPushOut();
        assertTrue(taken.worstPushOut() < worst + 0.05, pattern + " from " + start);
      }
    }
  }

  @Test
  void fromOutsideAMagnetThatPressesOutwardLifts() {
    FillingStep out = last(1, InsertFrom.OUTSIDE).steps().getFirst();
    assertEquals(Behaviour.LIFTS, out.behaviour());
    assertEquals(null, out.wall());
    assertTrue(out.force().pushOutNewtons() >= out.force().radialNewtons());
    FillingStep along = last(2, InsertFrom.OUTSIDE).steps().getFirst();
    assertEquals(Wall.INNER, along.wall());
    FillingStep inside = last(2, InsertFrom.INSIDE).steps().getFirst();
    assertEquals(Behaviour.LIFTS, inside.behaviour());
    assertEquals(null, inside.wall());
  }

  private static FillingOrder last(int slot, InsertFrom way) {
    Set<Integer> others = new HashSet<>(IntStream.rangeClosed(1, 12).boxed().toList());
    others.remove(slot);
    double[] remanence = new double[12];
    Arrays.fill(remanence, 1.3);
    return FillingOrder.of(design(way), remanence, others);
  }

  /// Twelve slots at radius 10 mm.
  private static RingDesign design(InsertFrom way) {
    Layout plain = Examples.layout(3, 4, Focus.OUT, null);
    return Examples.design(
        new Layout(
            "EX",
            "A",
            3,
            4,
            Focus.OUT,
            plain.numbering(),
            0,
            Facing.OUT,
            10e-3,
            "MAIN",
            null,
            13e-3,
            plain.probe(),
            plain.spread(),
            "",
            null,
            false,
            way,
            0.03));
  }

  /// Force on slot 1's block, drawn out along the axis, from another slot's, newtons per T².
  private static Vector3 dipoleForce(int from, double height) {
    double step = 1e-5;
    return new Vector3(
        (energy(from, -step, 0, height) - energy(from, step, 0, height)) / (2 * step),
        (energy(from, 0, -step, height) - energy(from, 0, step, height)) / (2 * step),
        (energy(from, 0, 0, height - step) - energy(from, 0, 0, height + step)) / (2 * step));
  }

  private static double energy(int from, double dx, double dy, double dz) {
    double angle = Math.PI / 6 * (from - 1);
    double north = angle - Math.PI / 2 * (from - 1);
    double mx = Math.cos(north);
    double my = Math.sin(north);
    double moment = 160e-9 / 540 / 1.25663706127e-6;
    double sum = 0;
    for (int a = 0; a < 540; a++) {
      double ax = 10e-3 + at(a % 6, 6, 4e-3) + dx;
      double ay = at(a / 6 % 6, 6, 4e-3) + dy;
      double az = at(a / 36, 15, 10e-3) + dz;
      for (int b = 0; b < 540; b++) {
        double u = 10e-3 + at(b % 6, 6, 4e-3);
        double v = at(b / 6 % 6, 6, 4e-3);
        double x = ax - (u * Math.cos(angle) - v * Math.sin(angle));
        double y = ay - (u * Math.sin(angle) + v * Math.cos(angle));
        double z = az - at(b / 36, 15, 10e-3);
        double square = x * x + y * y + z * z;
        double cube = square * Math.sqrt(square);
        sum += (mx - 3 * (mx * x + my * y) * x / square) / cube;
      }
    }
    return 1e-7 * moment * moment * sum;
  }

  private static double at(int index, int count, double size) {
    return size * ((index + 0.5) / count - 0.5);
  }
}
