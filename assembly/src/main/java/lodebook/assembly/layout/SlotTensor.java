package lodebook.assembly.layout;

import lodebook.assembly.field.Body;

/// A body's tensor in its slot's frame, where the body may stand turned.
final class SlotTensor {
  private SlotTensor() {}

  /// F_xx, F_yy, F_xy at a point, all in the slot's frame (x out, y to next, from the slot's
  /// middle).
  ///
  /// @param turn how far the body is turned from x towards y, radians
  static void at(Body body, double turn, double x, double y, double z, double[] f) {
    if (turn == 0) {
      body.planarTensor(x, y, z, f, 0);
      return;
    }
    double c = Math.cos(turn);
    double s = Math.sin(turn);
    body.planarTensor(c * x + s * y, c * y - s * x, z, f, 0);
    turnBack(c, s, f);
  }

  /// Turns the tensor itself from the body's frame into the slot's.
  static void turnBack(double c, double s, double[] f) {
    double xx = c * c * f[0] - 2 * c * s * f[2] + s * s * f[1];
    double yy = s * s * f[0] + 2 * c * s * f[2] + c * c * f[1];
    double xy = c * s * (f[0] - f[1]) + (c * c - s * s) * f[2];
    f[0] = xx;
    f[1] = yy;
    f[2] = xy;
  }
}
