package lodebook.assembly.field;

/// The closed form behind [Cylinder], with the axis along z.
///
/// Axial magnetisation: Derby and Olbert 2010, Am. J. Phys. 78, 229 (arXiv 0909.3880). Across: the
/// azimuthal element is (∂Φ/∂ρ)/ρ of the body's potential, one integral over the mantle for each
/// end, F_φφ = −R²/4π · Σ ± w·∫ sin²φ / (d²·√(w² + d²)) dφ, d² = ρ² + R² − 2ρR·cos φ, which is a
/// sum of complete elliptic integrals (Caciagli et al. 2018, J. Magn. Magn. Mater. 456, 423, have
/// the same field); near the axis, where that sum cancels, the integral of the smooth periodic
/// function is taken by equal steps. The third element follows from the trace.
final class CylinderTensor {
  private static final double NEAREST = 1e-9;

  /// Below this ratio of the radii (or above its inverse) equal steps are used.
  private static final double NEAR_THE_AXIS = 0.3;

  private static final int STEPS = 32;

  private CylinderTensor() {}

  static boolean contains(double radius, double half, double rho, double z) {
    return offMantle(radius, rho) < radius && BlockTensor.beyond(z, half) > 0;
  }

  private static double offMantle(double radius, double rho) {
    return Math.abs(rho - radius) < NEAREST ? radius + NEAREST : rho;
  }

  /// F_xx, F_yy, F_zz, F_xy, F_xz, F_yz; half is half the length.
  static void full(double radius, double half, double x, double y, double z, double[] into) {
    double distance = Math.hypot(x, y);
    double rho = offMantle(radius, distance);
    double c = distance > 0 ? x / distance : 1;
    double s = distance > 0 ? y / distance : 0;
    double above = half + Math.abs(z);
    double below = -BlockTensor.beyond(z, half);
    double inside = rho < radius && below < 0 ? 1 : 0;

    double zz = axial(radius, rho, above) - axial(radius, rho, below);
    double rz = radial(radius, rho, above) - radial(radius, rho, below);
    double azimuthal =
        inside
            - radius
                * radius
                / (4 * Math.PI)
                * (across(radius, rho, above) - across(radius, rho, below));
    double outward = 2 * inside - zz - azimuthal;
    if (z < 0) {
      rz = -rz;
    }
    into[0] = outward * c * c + azimuthal * s * s;
    into[1] = outward * s * s + azimuthal * c * c;
    into[2] = zz;
    into[3] = (outward - azimuthal) * c * s;
    into[4] = rz * c;
    into[5] = rz * s;
  }

  private static double axial(double a, double rho, double w) {
    double sum = a + rho;
    double gamma = (a - rho) / sum;
    double far = w * w + sum * sum;
    double k = Math.sqrt((w * w + (a - rho) * (a - rho)) / far);
    return a
        / (Math.PI * sum)
        * w
        / Math.sqrt(far)
        * EllipticIntegral.cel(k, gamma * gamma, 1, gamma);
  }

  private static double radial(double a, double rho, double w) {
    double sum = a + rho;
    double far = w * w + sum * sum;
    double k = Math.sqrt((w * w + (a - rho) * (a - rho)) / far);
    return a / (Math.PI * Math.sqrt(far)) * EllipticIntegral.cel(k, 1, 1, -1);
  }

  /// w · ∫ over the circle of sin²φ / (d²·√(w² + d²)).
  private static double across(double a, double rho, double w) {
    double ratio = rho < a ? rho / a : a / rho;
    if (ratio < NEAR_THE_AXIS) {
      double sum = 0;
      for (int n = 1; n < STEPS; n += 2) {
        double angle = Math.PI * n / STEPS;
        double sine = Math.sin(angle);
        double square = rho * rho + a * a - 2 * rho * a * Math.cos(angle);
        sum += sine * sine / (square * Math.sqrt(w * w + square));
      }
      return w * sum * 4 * Math.PI / STEPS;
    }
    double total = a + rho;
    double far = w * w + total * total;
    double n = 4 * a * rho / (total * total);
    double complement = (a - rho) * (a - rho) / (total * total);
    double k = Math.sqrt((w * w + (a - rho) * (a - rho)) / far);
    double difference =
        EllipticIntegral.cel(k, 1, 0, 1) - complement * EllipticIntegral.cel(k, complement, 0, 1);
    return 16 * w * difference / (n * total * total * Math.sqrt(far));
  }
}
