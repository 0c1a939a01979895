package lodebook.assembly.field;

/// Averages over a body's volume: Gauss's rule along straight and radial directions, equal steps
/// round a cylinder's axis.
public final class VolumeAverage {
  private static final GaussRule RULE = GaussRule.SIX;
  private static final int ROUND = 12;

  private VolumeAverage() {}

  /// What is summed.
  @FunctionalInterface
  public interface Sample {
    /// One point of the rule, metres in the body's own frame; the weights of all points sum to 1.
    void at(double x, double y, double z, double weight);
  }

  /// Visits the points of a rule over a body's volume, of degree 11 in each direction.
  public static void over(Body body, Sample sample) {
    switch (body) {
      case Block block -> overBlock(block, sample);
      case Cylinder cylinder -> overCylinder(cylinder, sample);
      case ArcSegment arc -> overArc(arc, sample);
    }
  }

  private static void overBlock(Block block, Sample sample) {
    for (int i = 0; i < RULE.count(); i++) {
      for (int j = 0; j < RULE.count(); j++) {
        for (int k = 0; k < RULE.count(); k++) {
          sample.at(
              block.xMetres() / 2 * RULE.node(i),
              block.yMetres() / 2 * RULE.node(j),
              block.zMetres() / 2 * RULE.node(k),
              RULE.weight(i) * RULE.weight(j) * RULE.weight(k) / 8);
        }
      }
    }
  }

  private static void overCylinder(Cylinder cylinder, Sample sample) {
    for (int i = 0; i < RULE.count(); i++) {
      double rho = cylinder.radiusMetres() * Math.sqrt((1 + RULE.node(i)) / 2);
      for (int k = 0; k < RULE.count(); k++) {
        double along = cylinder.lengthMetres() / 2 * RULE.node(k);
        double weight = RULE.weight(i) * RULE.weight(k) / 4 / ROUND;
        for (int n = 0; n < ROUND; n++) {
          double angle = 2 * Math.PI * (n + 0.5) / ROUND;
          double c = rho * Math.cos(angle);
          double s = rho * Math.sin(angle);
          switch (cylinder.axis()) {
            case X -> sample.at(along, c, s, weight);
            case Z -> sample.at(c, s, along, weight);
          }
        }
      }
    }
  }

  private static void overArc(ArcSegment arc, Sample sample) {
    double inner = arc.innerRadiusMetres() * arc.innerRadiusMetres();
    double outer = arc.outerRadiusMetres() * arc.outerRadiusMetres();
    int pieces = 1 + (int) (arc.angleRadians() / 0.9);
    for (int i = 0; i < RULE.count(); i++) {
      double radius = Math.sqrt((inner + outer) / 2 + (outer - inner) / 2 * RULE.node(i));
      for (int j = 0; j < RULE.count() * pieces; j++) {
        int piece = j / RULE.count();
        double middle = (2.0 * piece + 1) / pieces - 1;
        double angle = arc.angleRadians() / 2 * (middle + RULE.node(j % RULE.count()) / pieces);
        for (int k = 0; k < RULE.count(); k++) {
          sample.at(
              radius * Math.cos(angle) - arc.meanRadiusMetres(),
              radius * Math.sin(angle),
              arc.lengthMetres() / 2 * RULE.node(k),
              RULE.weight(i) * RULE.weight(j % RULE.count()) * RULE.weight(k) / (8 * pieces));
        }
      }
    }
  }
}
