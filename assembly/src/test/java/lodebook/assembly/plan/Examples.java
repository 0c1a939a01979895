package lodebook.assembly.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
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
import lodebook.assembly.magnet.Strength;
import org.jspecify.annotations.Nullable;

/// Layouts and stocks for the planner's tests: blocks of 4 × 4 × 10 mm, 1.3 T, spread 1.5 %.
final class Examples {
  static final double SIZE = 4e-3;
  static final double LENGTH = 10e-3;

  /// A ring of 4 mm blocks with 5.2 mm of circle for each, working circle 3 mm off the centres.
  static Layout layout(int polePairs, int segments, Focus focus, @Nullable String sideType) {
    double radius = polePairs * segments * 5.2e-3 / (2 * Math.PI) + 1e-3;
    double working = focus == Focus.OUT ? radius + 3e-3 : radius - 3e-3;
    return of(polePairs, segments, focus, radius, working, "MAIN", sideType);
  }

  /// A ring of 12 slots has its centres at 10 mm, others in proportion; four magnets per pole pair.
  ///
  /// @param gap from the circle of the magnets' centres out to the working circle
  static Layout layoutWithGap(int polePairs, double gap) {
    double radius = polePairs * 4 * 10e-3 / 12;
    return of(polePairs, 4, Focus.OUT, radius, radius + gap, "MAIN", null);
  }

  private static Layout of(
      int polePairs,
      int segments,
      Focus focus,
      double radius,
      double working,
      String type,
      @Nullable String sideType) {
    return new Layout(
        "EX",
        "A",
        polePairs,
        segments,
        focus,
        Numbering.CLOCKWISE,
        0,
        Facing.OUT,
        radius,
        type,
        sideType,
        working,
        new Probe(working, 0, List.of(Spot.CENTRE), List.of(Component.RADIAL)),
        Spread.DEFAULT,
        "",
        null,
        false,
        InsertFrom.FACE,
        0.03);
  }

  /// The outer ring of the invented workshop: 16 blocks of 5 × 5 × 10 mm, focus in.
  static RingDesign workshopOuterRing() {
    return new RingDesign(
        of(4, 4, Focus.IN, 20e-3, 16.5e-3, "MAIN", null), block("MAIN", 5e-3), null);
  }

  /// The layout with its blocks, recoil permeability 1.
  static RingDesign design(Layout layout) {
    String side = layout.sideMagnetType();
    return new RingDesign(layout, block("MAIN", SIZE), side == null ? null : block(side, SIZE));
  }

  private static MagnetType block(String code, double size) {
    return new MagnetType(
        code, Shape.BLOCK, size, size, LENGTH, 0, 0, 0, "N42", 0.05e-3, "nickel", 1, 0);
  }

  static DipoleRing ring(Layout layout) {
    return new DipoleRing(layout, SIZE, LENGTH);
  }

  /// Measured pieces of one lot, strengths normally spread by 1.5 %.
  static List<Candidate> lot(String lot, String type, int count, double mean, long seed) {
    Random random = new Random(seed);
    List<Candidate> pieces = new ArrayList<>();
    for (int i = 1; i <= count; i++) {
      double strength = mean * (1 + 0.015 * random.nextGaussian());
      pieces.add(
          new Candidate(
              "%s/%04d".formatted(lot, i), lot, type, new Strength(strength, 0.005 * mean)));
    }
    return pieces;
  }

  static RotorPlanner planner(RotorTask task) {
    DipoleRing ring = ring(task.layout());
    double[] facings = ring.ruleFacings();
    SlotHarmonics byRule = ring.harmonics(facings);
    for (Kept kept : task.kept()) {
      facings[kept.slot() - 1] = kept.facing().degrees();
    }
    return new RotorPlanner(task, ring.harmonics(facings), byRule);
  }

  private Examples() {}
}
