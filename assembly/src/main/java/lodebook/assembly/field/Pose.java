package lodebook.assembly.field;

/// Where a body stands: its middle and the directions of its own axes, in the frame of the ring.
///
/// @param centre the body's origin, metres
/// @param xAxis unit vector along the body's x
/// @param yAxis unit vector along the body's y, square to x
public record Pose(Vector3 centre, Vector3 xAxis, Vector3 yAxis) {

  /// Refuses axes that are not unit vectors at right angles (to 10⁻⁹).
  public Pose {
    if (Math.abs(xAxis.dot(xAxis) - 1) > 1e-9
        || Math.abs(yAxis.dot(yAxis) - 1) > 1e-9
        || Math.abs(xAxis.dot(yAxis)) > 1e-9) {
      throw new IllegalArgumentException(
          "a pose needs two unit vectors at right angles, not " + xAxis + " and " + yAxis);
    }
  }

  /// A body whose z stays along the ring's axis, turned from x towards y.
  public static Pose turnedAboutZ(Vector3 centre, double radians) {
    double c = Math.cos(radians);
    double s = Math.sin(radians);
    return new Pose(centre, new Vector3(c, s, 0), new Vector3(-s, c, 0));
  }

  /// Unit vector along the body's z.
  public Vector3 zAxis() {
    return xAxis.cross(yAxis);
  }

  /// A point of the ring's frame in the body's own.
  public Vector3 pointInto(Vector3 point) {
    return directionInto(point.minus(centre));
  }

  /// A direction of the ring's frame in the body's own.
  public Vector3 directionInto(Vector3 direction) {
    return new Vector3(direction.dot(xAxis), direction.dot(yAxis), direction.dot(zAxis()));
  }

  /// A direction of the body's own frame in the ring's.
  public Vector3 directionOutOf(Vector3 direction) {
    return xAxis
        .times(direction.x())
        .plus(yAxis.times(direction.y()))
        .plus(zAxis().times(direction.z()));
  }
}
