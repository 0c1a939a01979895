package lodebook.assembly.field;

/// A place (metres) or a vector quantity (its unit where it is used).
///
/// @param x first component
/// @param y second component
/// @param z third component
public record Vector3(double x, double y, double z) {
  /// The origin.
  public static final Vector3 ZERO = new Vector3(0, 0, 0);

  /// Sum of two vectors.
  public Vector3 plus(Vector3 other) {
    return new Vector3(x + other.x, y + other.y, z + other.z);
  }

  /// Difference of two vectors.
  public Vector3 minus(Vector3 other) {
    return new Vector3(x - other.x, y - other.y, z - other.z);
  }

  /// The vector times a number.
  public Vector3 times(double factor) {
    return new Vector3(factor * x, factor * y, factor * z);
  }

  /// Scalar product.
  public double dot(Vector3 other) {
    return x * other.x + y * other.y + z * other.z;
  }

  /// Vector product.
  public Vector3 cross(Vector3 other) {
    return new Vector3(
        y * other.z - z * other.y, z * other.x - x * other.z, x * other.y - y * other.x);
  }

  /// Length.
  public double norm() {
    return Math.sqrt(dot(this));
  }

  /// The vector turned about the z axis, radians, x towards y.
  public Vector3 turnedAboutZ(double radians) {
    double c = Math.cos(radians);
    double s = Math.sin(radians);
    return new Vector3(c * x - s * y, s * x + c * y, z);
  }
}
