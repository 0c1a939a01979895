package lodebook.assembly.field;

/// Gauss–Legendre nodes and weights on [−1, 1]; n points are exact to degree 2n − 1.
final class GaussRule {
  static final GaussRule SIX = new GaussRule(6);
  static final GaussRule TEN = new GaussRule(10);

  /// Twenty points drawn together towards the ends by x = (15u − 10u³ + 3u⁵)/8, for integrands with
  /// logarithmic peaks there.
  static final GaussRule CLUSTERED = new GaussRule(28).clustered();

  private final double[] nodes;
  private final double[] weights;

  /// Newton's iteration on the Legendre polynomial.
  GaussRule(int count) {
    nodes = new double[count];
    weights = new double[count];
    for (int i = 0; i < count; i++) {
      double x = Math.cos(Math.PI * (i + 0.75) / (count + 0.5));
      double slope = 1;
      for (int step = 0; step < 20; step++) {
        double before = 1;
        double here = x;
        for (int n = 2; n <= count; n++) {
          double after = ((2 * n - 1) * x * here - (n - 1) * before) / n;
          before = here;
          here = after;
        }
        slope = count * (x * here - before) / (x * x - 1);
        x -= here / slope;
      }
      nodes[i] = x;
      weights[i] = 2 / ((1 - x * x) * slope * slope);
    }
  }

  private GaussRule clustered() {
    for (int i = 0; i < nodes.length; i++) {
      double u = nodes[i];
      double square = u * u;
      weights[i] *= 1.5 * (1 - square);
      nodes[i] = u * (3 - square) / 2;
    }
    return this;
  }

  int count() {
    return nodes.length;
  }

  double node(int i) {
    return nodes[i];
  }

  double weight(int i) {
    return weights[i];
  }
}
