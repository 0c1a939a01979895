package lodebook.assembly.layout;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;

/// What a layout must keep to before a ring can be built from it.
final class LayoutRule {
  private static final Set<Integer> SEGMENTS = new TreeSet<>(Set.of(2, 3, 4, 5, 6, 8));
  private static final int MOST_SLOTS = 400;

  private LayoutRule() {}

  /// Everything that is wrong, each a sentence that names the layout, the value and the remedy.
  static List<String> faults(RingDesign design) {
    List<String> faults = new ArrayList<>(numbers(design.layout()));
    if (faults.isEmpty()) {
      faults.addAll(FacingRule.faults(design));
      faults.addAll(OverlapRule.faults(design));
      faults.addAll(ReachRule.faults(design));
    }
    return faults;
  }

  /// How a refusal names a layout.
  static String name(Layout layout) {
    return "layout " + layout.code() + " rev " + layout.revision() + ": ";
  }

  private static List<String> numbers(Layout layout) {
    String name = name(layout);
    List<String> faults = new ArrayList<>();
    if (layout.polePairs() < 1) {
      faults.add(name + "polePairs is " + layout.polePairs() + "; it must be 1 or more");
    }
    if (!SEGMENTS.contains(layout.segmentsPerPolePair())) {
      faults.add(
          name
              + "segmentsPerPolePair is "
              + layout.segmentsPerPolePair()
              + "; it must be 2, 3, 4, 5, 6 or 8");
    }
    if (faults.isEmpty() && layout.slots() > MOST_SLOTS) {
      faults.add(
          name
              + layout.slots()
              + " slots are more than "
              + MOST_SLOTS
              + "; lower polePairs or segmentsPerPolePair");
    }
    if (faults.isEmpty() && layout.slots() < 3) {
      faults.add(name + "a ring needs 3 slots or more, not 2; raise segmentsPerPolePair");
    }
    above(name, "slotRadiusMillimetres", layout.slotRadiusMetres(), faults);
    above(name, "workingRadiusMillimetres", layout.workingRadiusMetres(), faults);
    above(name, "probe.radiusMillimetres", layout.probe().radiusMetres(), faults);
    Spread spread = layout.spread();
    notBelow(name, "spread.pocketMillimetres", 1e3 * spread.pocketMetres(), faults);
    notBelow(name, "spread.facingDegrees", spread.facingDegrees(), faults);
    notBelow(name, "spread.probeMillimetres", 1e3 * spread.probeMetres(), faults);
    notBelow(name, "spread.probeTiltDegrees", spread.probeTiltDegrees(), faults);
    if (layout.probe().spots().isEmpty()) {
      faults.add(name + "probe.spots is empty; name \"centre\" or \"to-next\"");
    }
    if (layout.probe().components().isEmpty()) {
      faults.add(name + "probe.components is empty; name \"radial\" or \"tangential\"");
    }
    return faults;
  }

  private static void above(String name, String key, double metres, List<String> faults) {
    if (!(metres > 0)) {
      faults.add(name + key + " is " + Rounded.millimetres(metres) + "; it must be above 0");
    }
  }

  private static void notBelow(String name, String key, double value, List<String> faults) {
    if (!(value >= 0)) {
      faults.add(name + key + " is " + value + "; it must be 0 or more");
    }
  }
}
