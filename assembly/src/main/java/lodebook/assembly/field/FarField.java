package lodebook.assembly.field;

/// Fields far away from a body, where closed forms lose digits by cancellation.
final class FarField {
  /// Distance, in bounding radii, from which the far field is used.
  private static final double BOUNDING_RADII = 30;

  private static final double[] NODES = {-Math.sqrt(0.6), 0, Math.sqrt(0.6)};
  private static final double[] WEIGHTS = {5.0 / 18, 4.0 / 9, 5.0 / 18};

  private FarField() {}

  /// Whether a point is far from a body at the origin.
  ///
  /// @param boundingRadiusSquared square metres
  static boolean applies(double x, double y, double z, double boundingRadiusSquared) {
    return x * x + y * y + z * z > BOUNDING_RADII * BOUNDING_RADII * boundingRadiusSquared;
  }

  /// F_xx, F_yy, F_xy of a block with half sizes a, b, c: 27 dipoles at Gauss points.
  static void planarOfBlock(
      double a, double b, double c, double x, double y, double z, double[] into, int at) {
    double xx = 0;
    double yy = 0;
    double xy = 0;
    for (int i = 0; i < 3; i++) {
      double u = x - a * NODES[i];
      for (int j = 0; j < 3; j++) {
        double v = y - b * NODES[j];
        for (int k = 0; k < 3; k++) {
          double w = z - c * NODES[k];
          double square = u * u + v * v + w * w;
          double weight =
              WEIGHTS[i] * WEIGHTS[j] * WEIGHTS[k] / (square * square * Math.sqrt(square));
          xx += weight * (3 * u * u - square);
          yy += weight * (3 * v * v - square);
          xy += weight * 3 * u * v;
        }
      }
    }
    double scale = 8 * a * b * c / (4 * Math.PI);
    into[at] = scale * xx;
    into[at + 1] = scale * yy;
    into[at + 2] = scale * xy;
  }

  /// F_xx, F_yy, F_zz, F_xy, F_xz, F_yz of any body: dipoles at the points of its volume rule.
  static void full(Body body, double x, double y, double z, double[] into) {
    double[] sum = new double[6];
    VolumeAverage.over(
        body,
        (px, py, pz, weight) -> {
          double u = x - px;
          double v = y - py;
          double w = z - pz;
          double square = u * u + v * v + w * w;
          double factor = weight / (square * square * Math.sqrt(square));
          sum[0] += factor * (3 * u * u - square);
          sum[1] += factor * (3 * v * v - square);
          sum[2] += factor * (3 * w * w - square);
          sum[3] += factor * 3 * u * v;
          sum[4] += factor * 3 * u * w;
          sum[5] += factor * 3 * v * w;
        });
    double scale = body.volume() / (4 * Math.PI);
    for (int n = 0; n < 6; n++) {
      into[n] = scale * sum[n];
    }
  }
}
