package lodebook.assembly.field;

/// A round body: a disc, whose axis lies along the own x (its thickness), or a rod, whose axis lies
/// along the own z.
///
/// Closed forms with complete elliptic integrals, right to 10⁻⁹ of the greatest element; within 1
/// nm of a face's plane or the mantle a point is moved outside by 1 nm. Farther away than 30
/// bounding radii the body is a set of dipoles.
///
/// @param radiusMetres radius
/// @param lengthMetres length along its axis
/// @param axis direction of its axis in the own frame
public record Cylinder(double radiusMetres, double lengthMetres, Axis axis) implements Body {

  /// Direction of a cylinder's axis in its own frame.
  public enum Axis {
    /// Along the thickness: a disc.
    X,
    /// Along the ring's axis: a rod.
    Z
  }

  /// Refuses a size that is not a positive number.
  public Cylinder {
    if (!(radiusMetres > 0 && lengthMetres > 0)) {
      throw new IllegalArgumentException(
          "a cylinder has a radius and a length above 0 m, not "
              + radiusMetres
              + ", "
              + lengthMetres);
    }
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
      return;
    }
    switch (axis) {
      case Z -> CylinderTensor.full(radiusMetres, lengthMetres / 2, x, y, z, into);
      case X -> {
        double[] f = new double[6];
        CylinderTensor.full(radiusMetres, lengthMetres / 2, y, z, x, f);
        into[0] = f[2];
        into[1] = f[0];
        into[2] = f[1];
        into[3] = f[4];
        into[4] = f[5];
        into[5] = f[3];
      }
    }
  }

  @Override
  public boolean contains(double x, double y, double z) {
    return switch (axis) {
      case Z -> CylinderTensor.contains(radiusMetres, lengthMetres / 2, Math.hypot(x, y), z);
      case X -> CylinderTensor.contains(radiusMetres, lengthMetres / 2, Math.hypot(y, z), x);
    };
  }

  @Override
  public double volume() {
    return Math.PI * radiusMetres * radiusMetres * lengthMetres;
  }

  @Override
  public double boundingRadius() {
    return Math.hypot(radiusMetres, lengthMetres / 2);
  }
}
