package lodebook.assembly.layout;

/// How well things stand where they should; every number is a standard deviation.
///
/// @param pocketMetres position of a magnet in its pocket, each of two directions in the ring's
///   plane, metres
/// @param facingDegrees facing of a magnet in its pocket, degrees
/// @param probeMetres position of the probe, each direction, fresh at every reading, metres
/// @param probeTiltDegrees tilt of the probe in the ring's plane, fresh at every reading, degrees
public record Spread(
    double pocketMetres, double facingDegrees, double probeMetres, double probeTiltDegrees) {
  /// What holds where a layout says nothing: 0.05 mm, 1°, 0.15 mm, 2°.
  public static final Spread DEFAULT = new Spread(0.05e-3, 1.0, 0.15e-3, 2.0);
}
