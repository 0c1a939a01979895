package lodebook.assembly.field;

import java.util.function.DoubleUnaryOperator;

/// Integrals over a body's surface: Gauss's rule, its nodes drawn together towards edges, where
/// fields have logarithmic peaks; equal steps round a cylinder.
final class SurfaceRule {
  private static final GaussRule RULE = GaussRule.CLUSTERED;
  private static final int ROUND = 36;

  private SurfaceRule() {}

  /// What is summed.
  @FunctionalInterface
  interface Sample {
    /// A point of the rule and its share of the surface, both in the body's own frame.
    ///
    /// @param point metres
    /// @param area outward normal times the area that the point stands for, square metres
    void at(Vector3 point, Vector3 area);
  }

  static void over(Body body, Sample sample) {
    switch (body) {
      case Block block -> overBlock(block, sample);
      case Cylinder cylinder -> overCylinder(cylinder, sample);
      case ArcSegment arc -> overArc(arc, sample);
    }
  }

  private static void overBlock(Block block, Sample sample) {
    double a = block.xMetres() / 2;
    double b = block.yMetres() / 2;
    double c = block.zMetres() / 2;
    for (int i = 0; i < RULE.count(); i++) {
      for (int j = 0; j < RULE.count(); j++) {
        double u = RULE.node(i);
        double v = RULE.node(j);
        double weight = RULE.weight(i) * RULE.weight(j);
        for (int sign = -1; sign <= 1; sign += 2) {
          sample.at(new Vector3(sign * a, b * u, c * v), new Vector3(sign * weight * b * c, 0, 0));
          sample.at(new Vector3(a * u, sign * b, c * v), new Vector3(0, sign * weight * a * c, 0));
          sample.at(new Vector3(a * u, b * v, sign * c), new Vector3(0, 0, sign * weight * a * b));
        }
      }
    }
  }

  private static void overCylinder(Cylinder cylinder, Sample sample) {
    double r = cylinder.radiusMetres();
    double half = cylinder.lengthMetres() / 2;
    for (int i = 0; i < RULE.count(); i++) {
      double rho = r * (1 + RULE.node(i)) / 2;
      double end = RULE.weight(i) * r / 2 * rho * 2 * Math.PI / ROUND;
      double mantle = RULE.weight(i) * half * r * 2 * Math.PI / ROUND;
      for (int n = 0; n < ROUND; n++) {
        double angle = 2 * Math.PI * (n + 0.5) / ROUND;
        double c = Math.cos(angle);
        double s = Math.sin(angle);
        for (int sign = -1; sign <= 1; sign += 2) {
          sample.at(
              turned(cylinder, rho * c, rho * s, sign * half), turned(cylinder, 0, 0, sign * end));
        }
        sample.at(
            turned(cylinder, r * c, r * s, half * RULE.node(i)),
            turned(cylinder, mantle * c, mantle * s, 0));
      }
    }
  }

  private static Vector3 turned(Cylinder cylinder, double across, double other, double along) {
    return switch (cylinder.axis()) {
      case X -> new Vector3(along, across, other);
      case Z -> new Vector3(across, other, along);
    };
  }

  private static void overArc(ArcSegment arc, Sample sample) {
    double inner = arc.innerRadiusMetres();
    double outer = arc.outerRadiusMetres();
    double mean = arc.meanRadiusMetres();
    double halfAngle = arc.angleRadians() / 2;
    double half = arc.lengthMetres() / 2;
    DoubleUnaryOperator radiusAt = u -> mean + (outer - inner) / 2 * u;
    for (int i = 0; i < RULE.count(); i++) {
      double angle = halfAngle * RULE.node(i);
      double c = Math.cos(angle);
      double s = Math.sin(angle);
      for (int j = 0; j < RULE.count(); j++) {
        double weight = RULE.weight(i) * RULE.weight(j);
        double z = half * RULE.node(j);
        double curved = weight * halfAngle * half;
        Vector3 normal = new Vector3(c, s, 0);
        sample.at(new Vector3(outer * c - mean, outer * s, z), normal.times(curved * outer));
        sample.at(new Vector3(inner * c - mean, inner * s, z), normal.times(-curved * inner));
        double radius = radiusAt.applyAsDouble(RULE.node(j));
        double lid = weight * halfAngle * (outer - inner) / 2 * radius;
        double side = weight * (outer - inner) / 2 * half;
        double sideRadius = radiusAt.applyAsDouble(RULE.node(i));
        for (int sign = -1; sign <= 1; sign += 2) {
          sample.at(
              new Vector3(radius * c - mean, radius * s, sign * half),
              new Vector3(0, 0, sign * lid));
          double sine = sign * Math.sin(halfAngle);
          double cosine = Math.cos(halfAngle);
          sample.at(
              new Vector3(sideRadius * cosine - mean, sideRadius * sine, z),
              new Vector3(-sine * sign, cosine * sign, 0).times(side));
        }
      }
    }
  }
}
