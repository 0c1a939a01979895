package lodebook.assembly.layout;

/// Where and along which direction a flux density is read.
///
/// @param radiusMetres axis to sensing element, metres
/// @param angleRadians angle from slot 1, positive towards rising slot numbers
/// @param heightMetres above the ring's middle plane, towards the marked face, metres
/// @param component radial (positive away from the axis) or tangential (positive to next)
public record ReadingPlace(
    double radiusMetres, double angleRadians, double heightMetres, Component component) {

  /// A probe point of a layout, at the layout's own probe radius and height.
  public static ReadingPlace of(Layout layout, ProbePoint point) {
    return of(layout, point, layout.probe().radiusMetres(), layout.probe().heightMetres());
  }

  /// A probe point of a layout, read at another radius and height, metres.
  public static ReadingPlace of(
      Layout layout, ProbePoint point, double radiusMetres, double heightMetres) {
    double angle = layout.angleFromFirstRadians(point.slot());
    if (point.spot() == Spot.TO_NEXT) {
      angle += Math.PI / layout.slots();
    }
    return new ReadingPlace(radiusMetres, angle, heightMetres, point.component());
  }
}
