package lodebook.assembly.safety;

import lodebook.assembly.magnet.MagnetType;

/// Pull of two pole faces that touch: an upper bound.
///
/// F = Br²·A/(2µ0) with the remanence, not a surface reading, and the largest face that the pole
/// can have: the Maxwell stress of the flux Br through the whole face. Real magnets of finite
/// thickness pull less (two cubes about 0.8 of it).
public final class PinchForce {
  /// Magnetic constant, T·m/A (CODATA 2018, rounded).
  private static final double MU0 = 1.25663706212e-6;

  private PinchForce() {}

  /// The bound for two magnets of a type.
  ///
  /// @param remanenceTesla remanence of the stronger one, tesla
  /// @return newtons
  public static double upperBoundNewton(MagnetType type, double remanenceTesla) {
    return remanenceTesla * remanenceTesla * poleFaceSquareMetres(type) / (2 * MU0);
  }

  /// Area of a pole face, square metres: the block's width by length, the disc's round face, the
  /// rod's shadow along its magnetisation, the arc's whole outer face.
  public static double poleFaceSquareMetres(MagnetType type) {
    return switch (type.shape()) {
      case BLOCK -> type.widthMetres() * type.lengthMetres();
      case DISC -> Math.PI * type.diameterMetres() * type.diameterMetres() / 4;
      case ROD -> type.diameterMetres() * type.lengthMetres();
      case ARC ->
          Math.toRadians(type.arcDegrees()) * type.diameterMetres() / 2 * type.lengthMetres();
    };
  }
}
