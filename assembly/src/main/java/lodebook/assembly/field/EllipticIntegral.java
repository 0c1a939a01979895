package lodebook.assembly.field;

/// Bulirsch's general complete elliptic integral.
///
/// Source: Bulirsch 1969, Numer. Math. 13, 305; used for the fields of cylinders by Derby and
/// Olbert 2010, Am. J. Phys. 78, 229 (arXiv 0909.3880).
final class EllipticIntegral {
  private static final double ACCURACY = 1e-8;

  private EllipticIntegral() {}

  /// ∫ from 0 to π/2 of (a·cos² + b·sin²) / ((cos² + p·sin²)·√(cos² + kc²·sin²)).
  ///
  /// Right to about 10⁻¹⁵; the iteration converges quadratically, so it stops at 10⁻⁸.
  ///
  /// @param kc complementary modulus, above 0
  /// @param p above 0
  static double cel(double kc, double p, double a, double b) {
    double k = kc;
    double e = kc;
    double m = 1;
    double root = Math.sqrt(p);
    double numerator = a;
    double denominator = b / root;
    double f = numerator;
    numerator += denominator / root;
    double g = e / root;
    denominator = 2 * (denominator + f * g);
    root += g;
    g = m;
    m += k;
    while (Math.abs(g - k) > g * ACCURACY) {
      k = 2 * Math.sqrt(e);
      e = k * m;
      f = numerator;
      numerator += denominator / root;
      g = e / root;
      denominator = 2 * (denominator + f * g);
      root += g;
      g = m;
      m += k;
    }
    return Math.PI / 2 * (denominator + numerator * m) / (m * (m + root));
  }
}
