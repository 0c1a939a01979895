package lodebook.ui.files;

/// What a number of a file may be.
final class Bounds {
  private static final double TURN = 360;

  private Bounds() {}

  /// Any number.
  static boolean any(double number) {
    return Double.isFinite(number);
  }

  /// Above zero.
  static boolean positive(double number) {
    return number > 0;
  }

  /// Zero or above.
  static boolean notNegative(double number) {
    return number >= 0;
  }

  /// An angle of one turn at most, either way.
  static boolean angle(double degrees) {
    return Math.abs(degrees) <= TURN;
  }
}
