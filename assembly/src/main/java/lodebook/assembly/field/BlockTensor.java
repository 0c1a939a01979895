package lodebook.assembly.field;

/// The closed form behind [Block].
///
/// With the point folded into the first octant and U = (a+x, a−x), V = (b+y, b−y), W = (c+z, c−z),
/// R the distance to a corner: F_xx = −1/4π · Σ atan(V·W / (U·R)) over the eight corners (plus 1
/// inside), and F_xy = 1/4π · Σ ± ln(w + R), ± the corner's parity.
final class BlockTensor {
  /// Points closer than this to a face's plane are taken this far outside, metres.
  private static final double NEAREST = 1e-9;

  private static final double QUARTER_OVER_PI = 1 / (4 * Math.PI);

  private BlockTensor() {}

  /// Half size minus the folded coordinate, moved off zero to the outside.
  static double beyond(double coordinate, double half) {
    double distance = half - Math.abs(coordinate);
    return Math.abs(distance) < NEAREST ? -NEAREST : distance;
  }

  /// F_xx, F_yy, F_xy at a point; a, b, c half sizes, metres.
  static void planar(
      double a, double b, double c, double x, double y, double z, double[] into, int at) {
    double u0 = beyond(x, a);
    double v0 = beyond(y, b);
    double w0 = beyond(z, c);
    double u1 = a + Math.abs(x);
    double v1 = b + Math.abs(y);
    double w1 = c + Math.abs(z);
    double uu0 = u0 * u0;
    double uu1 = u1 * u1;
    double vv0 = v0 * v0;
    double vv1 = v1 * v1;
    double rho00 = uu0 + vv0;
    double rho01 = uu0 + vv1;
    double rho10 = uu1 + vv0;
    double rho11 = uu1 + vv1;
    double ww1 = w1 * w1;
    double r001 = Math.sqrt(rho00 + ww1);
    double r011 = Math.sqrt(rho01 + ww1);
    double r101 = Math.sqrt(rho10 + ww1);
    double r111 = Math.sqrt(rho11 + ww1);
    double xx = angle(u0, u1, v0, v1, w1, r001, r011, r101, r111);
    double yy = angle(v0, v1, u0, u1, w1, r001, r101, r011, r111);
    double quotient;
    if (z == 0) {
      xx *= 2;
      yy *= 2;
      double g00 = (w1 + r001) * (w1 + r001) * (rho01 * rho10);
      double g11 = (w1 + r111) * (w1 + r111);
      double g01 = (w1 + r011) * (w1 + r011) * (rho00 * rho11);
      double g10 = (w1 + r101) * (w1 + r101);
      quotient = g00 * g11 / (g01 * g10);
    } else {
      double ww0 = w0 * w0;
      double r000 = Math.sqrt(rho00 + ww0);
      double r010 = Math.sqrt(rho01 + ww0);
      double r100 = Math.sqrt(rho10 + ww0);
      double r110 = Math.sqrt(rho11 + ww0);
      xx += angle(u0, u1, v0, v1, w0, r000, r010, r100, r110);
      yy += angle(v0, v1, u0, u1, w0, r000, r100, r010, r110);
      double near;
      if (w0 > 0) {
        near =
            (r000 + w0)
                * (r110 + w0)
                * (rho01 * rho10)
                / ((r010 + w0) * (r100 + w0) * (rho00 * rho11));
      } else {
        near = (r010 - w0) * (r100 - w0) / ((r000 - w0) * (r110 - w0));
      }
      quotient = near * (w1 + r001) * (w1 + r111) / ((w1 + r011) * (w1 + r101));
    }
    double inside = u0 > 0 && v0 > 0 && w0 > 0 ? 1 : 0;
    double xy = QUARTER_OVER_PI * Math.log(quotient);
    into[at] = inside - QUARTER_OVER_PI * xx;
    into[at + 1] = inside - QUARTER_OVER_PI * yy;
    into[at + 2] = (x < 0) == (y < 0) ? xy : -xy;
  }

  /// Sum of atan(v·w / (u·r)) over the four pairs of u and v; r is named by u's index, then v's.
  ///
  /// Each arctangent is the argument of a complex number with positive real part, the sum of two of
  /// them that of their product; the last product may pass ±π, which the signs of its factors show.
  private static double angle(
      double u0,
      double u1,
      double v0,
      double v1,
      double w,
      double r00,
      double r01,
      double r10,
      double r11) {
    double s = u0 < 0 ? -w : w;
    double p = Math.abs(u0);
    double re0 = p * r00;
    double im0 = s * v0;
    double re1 = p * r01;
    double im1 = s * v1;
    double reA = re0 * re1 - im0 * im1;
    double imA = re0 * im1 + im0 * re1;
    re0 = u1 * r10;
    im0 = w * v0;
    re1 = u1 * r11;
    im1 = w * v1;
    double reB = re0 * re1 - im0 * im1;
    double imB = re0 * im1 + im0 * re1;
    double re = reA * reB - imA * imB;
    double im = reA * imB + imA * reB + 0.0;
    double principal = Math.atan2(im, re);
    if (imA >= 0 && imB >= 0 && im < 0) {
      return principal + 2 * Math.PI;
    }
    if (imA < 0 && imB < 0 && im >= 0) {
      return principal - 2 * Math.PI;
    }
    return principal;
  }
}
