package lodebook.assembly.layout;

/// How near to the axis and how far from it a ring's magnets reach at mid-height.
public final class RingReach {
  private RingReach() {}

  /// Distance from the axis to the nearest point of any magnet, metres.
  public static double innermost(RingDesign design) {
    double nearest = Double.POSITIVE_INFINITY;
    for (int slot = 1; slot <= design.slots(); slot++) {
      nearest = Math.min(nearest, Footprint.of(design.bodyAt(slot)).nearestToAxis());
    }
    return nearest;
  }

  /// Distance from the axis to the farthest point of any magnet, metres.
  public static double outermost(RingDesign design) {
    double farthest = 0;
    for (int slot = 1; slot <= design.slots(); slot++) {
      farthest = Math.max(farthest, Footprint.of(design.bodyAt(slot)).farthestFromAxis());
    }
    return farthest;
  }
}
