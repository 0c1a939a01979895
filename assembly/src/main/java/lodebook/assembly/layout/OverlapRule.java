package lodebook.assembly.layout;

import java.util.ArrayList;
import java.util.List;
import lodebook.assembly.field.Vector3;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Shape;
import org.jspecify.annotations.Nullable;

/// Neighbouring magnets must not need the same place.
///
/// The overlap is measured along the ring, at the radius of the corner (a rod's middle) that
/// reaches farthest towards the next slot.
final class OverlapRule {
  private static final double CONCENTRIC_METRES = 0.1e-3;

  private OverlapRule() {}

  private record Overlap(int slot, int next, double metres, double radiusMetres) {}

  static List<String> faults(RingDesign design) {
    List<String> faults = new ArrayList<>(eccentric(design));
    if (!faults.isEmpty()) {
      return faults;
    }
    Overlap worst = worst(design);
    if (worst != null) {
      faults.add(
          LayoutRule.name(design.layout())
              + "slots "
              + worst.slot()
              + " and "
              + worst.next()
              + " overlap by "
              + Rounded.millimetres(Math.max(worst.metres(), 0.01e-3))
              + " mm at radius "
              + Rounded.millimetres(worst.radiusMetres())
              + " mm; "
              + remedy(design, worst));
    }
    return faults;
  }

  /// Arc segments fit a ring only round its own axis.
  private static List<String> eccentric(RingDesign design) {
    List<String> faults = new ArrayList<>();
    for (int slot = 1; slot <= design.slots() && faults.isEmpty(); slot++) {
      MagnetType type = design.typeAt(slot);
      double mean = (type.diameterMetres() + type.innerDiameterMetres()) / 4;
      double radius = design.layout().slotRadiusMetres();
      if (type.shape() == Shape.ARC && Math.abs(mean - radius) > CONCENTRIC_METRES) {
        faults.add(
            LayoutRule.name(design.layout())
                + "slotRadiusMillimetres is "
                + Rounded.millimetres(radius)
                + ", but arc segments of type "
                + type.code()
                + " have their middle at "
                + Rounded.millimetres(mean)
                + " mm; set slotRadiusMillimetres to "
                + Rounded.millimetres(mean));
      }
    }
    return faults;
  }

  private static @Nullable Overlap worst(RingDesign design) {
    Overlap worst = null;
    Layout layout = design.layout();
    List<Footprint> outlines = new ArrayList<>();
    for (int slot = 1; slot <= design.slots(); slot++) {
      outlines.add(Footprint.of(design.bodyAt(slot)));
    }
    double half = Math.PI / design.slots();
    for (int slot = 1; slot <= design.slots(); slot++) {
      Footprint here = outlines.get(slot - 1);
      Footprint there = outlines.get(layout.next(slot) - 1);
      if (!here.overlaps(there)) {
        continue;
      }
      double angle = layout.angleFromFirstRadians(slot);
      Vector3 across = new Vector3(0, 1, 0).turnedAboutZ(angle + half);
      double metres = here.beyond(there, across) / Math.cos(half);
      if (worst == null || metres > worst.metres() + 1e-9) {
        double radius = here.farthest(across).dot(new Vector3(1, 0, 0).turnedAboutZ(angle));
        worst = new Overlap(slot, layout.next(slot), metres, radius);
      }
    }
    return worst;
  }

  private static String remedy(RingDesign design, Overlap worst) {
    for (int slot : new int[] {worst.slot(), worst.next()}) {
      MagnetType type = design.typeAt(slot);
      if (type.shape() == Shape.ARC) {
        return "choose an arc of at most "
            + Rounded.degrees(Math.floor(36000.0 / design.slots()) / 100)
            + " instead of type "
            + type.code();
      }
    }
    double low = design.layout().slotRadiusMetres();
    double high = low;
    do {
      low = high;
      high *= 1.5;
    } while (worst(design.atSlotRadius(high)) != null);
    while (high - low > 1e-9) {
      double middle = (low + high) / 2;
      if (worst(design.atSlotRadius(middle)) != null) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return "raise slotRadiusMillimetres to at least " + Rounded.up(high);
  }
}
