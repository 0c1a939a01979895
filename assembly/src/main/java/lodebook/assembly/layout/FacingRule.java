package lodebook.assembly.layout;

import java.util.ArrayList;
import java.util.List;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Shape;

/// Which facings a magnet can take in its pocket where bodies turn with their facing.
///
/// Square blocks and rods can stand at any. A block that is not square, a disc and an arc segment
/// stand with their thickness along the radius (along the ring for the side type), either way
/// round; a magnetisation at an angle to the thickness can then point to either side of it.
final class FacingRule {
  private static final double SAME_DEGREES = 0.01;

  private FacingRule() {}

  static List<String> faults(RingDesign design) {
    Layout layout = design.layout();
    if (!layout.bodyTurns()) {
      return List.of();
    }
    List<String> faults = new ArrayList<>();
    for (int slot = 1; slot <= design.slots() && faults.isEmpty(); slot++) {
      MagnetType type = design.typeAt(slot);
      if (canStandAnyhow(type)) {
        continue;
      }
      boolean side = design.isSide(slot);
      List<Facing> allowed = allowed(type, side);
      Facing wanted = layout.ruleFacing(slot);
      if (allowed.stream().noneMatch(f -> Math.abs(f.degreesFrom(wanted)) < SAME_DEGREES)) {
        faults.add(
            LayoutRule.name(layout)
                + "slot "
                + slot
                + " would face "
                + Rounded.degrees(wanted.degrees())
                + ", but "
                + what(type)
                + " of type "
                + type.code()
                + " can only face "
                + list(allowed)
                + " there; set bodyTurns to false"
                + (design.sideType() == null && layout.liesAlong(slot)
                    ? ", name a sideMagnetType"
                    : "")
                + " or choose square blocks or rods");
      }
    }
    return faults;
  }

  /// Whether a body may be turned to any angle in its pocket.
  static boolean canStandAnyhow(MagnetType type) {
    return switch (type.shape()) {
      case BLOCK -> Math.abs(type.thicknessMetres() - type.widthMetres()) < 1e-9;
      case ROD -> true;
      case DISC, ARC -> false;
    };
  }

  private static List<Facing> allowed(MagnetType type, boolean side) {
    double base = side ? 90 : 0;
    double lean = type.magnetisationDegrees();
    return List.of(base + lean, base - lean, base + 180 + lean, base + 180 - lean).stream()
        .map(Facing::new)
        .distinct()
        .toList();
  }

  private static String what(MagnetType type) {
    return type.shape() == Shape.BLOCK
        ? "a block that is not square"
        : type.shape() == Shape.DISC ? "a disc" : "an arc segment";
  }

  private static String list(List<Facing> facings) {
    return String.join(
        " or ", facings.stream().map(facing -> Rounded.degrees(facing.degrees())).toList());
  }
}
