package lodebook.assembly.field;

/// A segment of a ring, symmetric about its own x.
///
/// The own origin is the middle of the segment: half way between its two radii on the own x; the
/// axis of its curvature crosses the own x at minus the mean radius.
///
/// Fields by integrating the surface charges: along z in closed form, round the contour by Gauss's
/// rule with ten points on pieces that shrink towards the point. Error below 10⁻⁹ of the greatest
/// element; within 1 nm of a face a point is moved outside by 1 nm. Farther away than 30 bounding
/// radii the body is a set of dipoles.
///
/// @param innerRadiusMetres inner radius
/// @param outerRadiusMetres outer radius
/// @param angleRadians angle that the segment spans, below 2π
/// @param lengthMetres length along z
public record ArcSegment(
    double innerRadiusMetres, double outerRadiusMetres, double angleRadians, double lengthMetres)
    implements Body {

  /// Refuses sizes that make no segment.
  public ArcSegment {
    if (!(innerRadiusMetres > 0
        && outerRadiusMetres > innerRadiusMetres
        && angleRadians > 0
        && angleRadians < 2 * Math.PI
        && lengthMetres > 0)) {
      throw new IllegalArgumentException(
          "an arc segment has an inner radius above 0 m, a greater outer one, an angle between 0 "
              + "and 2π and a length above 0 m, not "
              + innerRadiusMetres
              + ", "
              + outerRadiusMetres
              + ", "
              + angleRadians
              + ", "
              + lengthMetres);
    }
  }

  /// Half way between the two radii, metres.
  public double meanRadiusMetres() {
    return (innerRadiusMetres + outerRadiusMetres) / 2;
  }

  @Override
  public void planarTensor(double x, double y, double z, double[] into, int at) {
    double[] f = new double[6];
    fullTensor(x, y, z, f);
    into[at] = f[0];
    into[at + 1] = f[1];
    into[at + 2] = f[3];
  }

  @Override
  public void fullTensor(double x, double y, double z, double[] into) {
    double bounding = boundingRadius();
    if (FarField.applies(x, y, z, bounding * bounding)) {
      FarField.full(this, x, y, z, into);
    } else {
      new ArcContour(this, x + meanRadiusMetres(), y, z).tensor(into);
    }
  }

  @Override
  public boolean contains(double x, double y, double z) {
    return new ArcContour(this, x + meanRadiusMetres(), y, z).isInside();
  }

  @Override
  public double volume() {
    return (outerRadiusMetres * outerRadiusMetres - innerRadiusMetres * innerRadiusMetres)
        / 2
        * angleRadians
        * lengthMetres;
  }

  @Override
  public double boundingRadius() {
    double mean = meanRadiusMetres();
    double inPlane = mean - innerRadiusMetres;
    double half = Math.min(angleRadians / 2, Math.PI);
    for (double radius : new double[] {innerRadiusMetres, outerRadiusMetres}) {
      inPlane =
          Math.max(inPlane, Math.hypot(radius * Math.cos(half) - mean, radius * Math.sin(half)));
    }
    return Math.hypot(inPlane, lengthMetres / 2);
  }
}
