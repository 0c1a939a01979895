package lodebook.assembly.layout;

import java.util.ArrayList;
import java.util.List;
import lodebook.assembly.field.Vector3;
import org.jspecify.annotations.Nullable;

/// The working circle and the probe must lie outside the magnets.
final class ReachRule {
  private ReachRule() {}

  static List<String> faults(RingDesign design) {
    List<String> faults = new ArrayList<>();
    Layout layout = design.layout();
    double working = layout.workingRadiusMetres();
    double inner = RingReach.innermost(design);
    double outer = RingReach.outermost(design);
    if (working > inner && working < outer) {
      faults.add(
          LayoutRule.name(layout)
              + "workingRadiusMillimetres "
              + Rounded.millimetres(working)
              + " lies inside the magnets, which reach from "
              + Rounded.millimetres(inner)
              + " to "
              + Rounded.millimetres(outer)
              + " mm; "
              + (layout.focus() == Focus.OUT
                  ? "raise it to at least " + Rounded.up(outer)
                  : "lower it to at most " + Rounded.down(inner)));
    }
    Integer touched = touchedSlot(design);
    if (touched != null) {
      faults.add(
          LayoutRule.name(layout)
              + "probe.radiusMillimetres "
              + Rounded.millimetres(layout.probe().radiusMetres())
              + " puts the probe inside the magnet of slot "
              + touched
              + "; "
              + (layout.probe().radiusMetres() > layout.slotRadiusMetres()
                  ? "raise it to at least " + Rounded.up(outer)
                  : "lower it to at most " + Rounded.down(inner)));
    }
    return faults;
  }

  private static @Nullable Integer touchedSlot(RingDesign design) {
    Layout layout = design.layout();
    for (int slot = 1; slot <= design.slots(); slot++) {
      for (Spot spot : layout.probe().spots()) {
        ReadingPlace place = ReadingPlace.of(layout, new ProbePoint(slot, spot, Component.RADIAL));
        Vector3 point =
            new Vector3(place.radiusMetres(), 0, place.heightMetres())
                .turnedAboutZ(place.angleRadians());
        for (int magnet : new int[] {slot, layout.next(slot)}) {
          if (design.bodyAt(magnet).contains(point)) {
            return magnet;
          }
        }
      }
    }
    return null;
  }
}
