package lodebook.assembly.layout;

/// The way a magnet's north points, in its slot's own frame.
///
/// 0° is out (away from the axis), 90° to the next higher slot number, 180° in, 270° to the
/// previous. It does not depend on the face from which a person looks.
///
/// @param degrees angle in [0, 360)
public record Facing(double degrees) {
  /// North away from the axis.
  public static final Facing OUT = new Facing(0);

  /// North towards the next higher slot number.
  public static final Facing TO_NEXT = new Facing(90);

  /// North towards the axis.
  public static final Facing IN = new Facing(180);

  /// North towards the next lower slot number.
  public static final Facing TO_PREVIOUS = new Facing(270);

  /// Folds any angle into [0, 360).
  public Facing {
    if (!Double.isFinite(degrees)) {
      throw new IllegalArgumentException("a facing is a number of degrees, not " + degrees);
    }
    degrees = degrees - 360 * Math.floor(degrees / 360);
    if (degrees >= 360 || degrees == 0) {
      degrees = 0;
    }
  }

  /// The facing turned on by an angle, positive from out towards next.
  public Facing turned(double byDegrees) {
    return new Facing(degrees + byDegrees);
  }

  /// The facing the other way round.
  public Facing reversed() {
    return turned(180);
  }

  /// How far this facing is turned from another, in (−180, 180] degrees.
  public double degreesFrom(Facing other) {
    double turn = new Facing(degrees - other.degrees).degrees();
    return turn > 180 ? turn - 360 : turn;
  }

  /// The angle in radians.
  public double radians() {
    return Math.toRadians(degrees);
  }
}
