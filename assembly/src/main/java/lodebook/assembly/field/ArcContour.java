package lodebook.assembly.field;

/// The integral round an arc segment's contour for one point.
///
/// With d from the contour to the point in the plane, w = (z + half, z − half) and R² = d² + w²:
/// F_ab = 1/4π · ∮ n_b · d_a/d² · (w₁/R₁ − w₀/R₀) dl and F_az = 1/4π · ∮ n_a · (1/R₀ − 1/R₁) dl.
final class ArcContour {
  private static final double NEAREST = 1e-9;
  private static final int DEEPEST = 40;
  private static final GaussRule RULE = GaussRule.TEN;

  private final ArcSegment arc;
  private final double x;
  private final double y;
  private final double above;
  private final double below;
  private final boolean inside;
  private final boolean mirrored;
  private double xx;
  private double xy;
  private double yy;
  private double xz;
  private double yz;

  /// @param x from the axis of curvature
  ArcContour(ArcSegment arc, double x, double y, double z) {
    this.arc = arc;
    double half = arc.lengthMetres() / 2;
    above = half + Math.abs(z);
    below = -BlockTensor.beyond(z, half);
    mirrored = z < 0;
    double radius = Math.hypot(x, y);
    double angle = Math.atan2(y, x);
    double moved = radius;
    double turned = angle;
    if (Math.abs(radius - arc.outerRadiusMetres()) < NEAREST) {
      moved = arc.outerRadiusMetres() + NEAREST;
    } else if (Math.abs(radius - arc.innerRadiusMetres()) < NEAREST) {
      moved = arc.innerRadiusMetres() - NEAREST;
    }
    double off = arc.angleRadians() / 2 - Math.abs(angle);
    if (Math.abs(off) * radius < NEAREST && moved > arc.innerRadiusMetres() / 2) {
      turned = Math.copySign(arc.angleRadians() / 2 + NEAREST / moved, angle);
    }
    boolean kept = moved == radius && turned == angle;
    this.x = kept ? x : moved * Math.cos(turned);
    this.y = kept ? y : moved * Math.sin(turned);
    inside =
        below < 0
            && moved < arc.outerRadiusMetres()
            && moved > arc.innerRadiusMetres()
            && Math.abs(turned) < arc.angleRadians() / 2;
  }

  boolean isInside() {
    return inside;
  }

  void tensor(double[] into) {
    double half = arc.angleRadians() / 2;
    alongArc(arc.outerRadiusMetres(), 1, -half, half, 0);
    alongArc(arc.innerRadiusMetres(), -1, -half, half, 0);
    alongSide(half, 1, arc.innerRadiusMetres(), arc.outerRadiusMetres(), 0);
    alongSide(-half, -1, arc.innerRadiusMetres(), arc.outerRadiusMetres(), 0);
    double added = inside ? 1 : 0;
    double scale = 1 / (4 * Math.PI);
    into[0] = added + scale * xx;
    into[1] = added + scale * yy;
    into[2] = -scale * (xx + yy);
    into[3] = scale * xy;
    into[4] = (mirrored ? -scale : scale) * xz;
    into[5] = (mirrored ? -scale : scale) * yz;
  }

  private void alongArc(double radius, int sign, double from, double to, int depth) {
    double middle = (from + to) / 2;
    double length = radius * (to - from);
    double away = Math.hypot(x - radius * Math.cos(middle), y - radius * Math.sin(middle));
    if ((away < 1.5 * length || to - from > 0.8) && depth < DEEPEST) {
      alongArc(radius, sign, from, middle, depth + 1);
      alongArc(radius, sign, middle, to, depth + 1);
      return;
    }
    for (int n = 0; n < RULE.count(); n++) {
      double angle = middle + (to - from) / 2 * RULE.node(n);
      double c = Math.cos(angle);
      double s = Math.sin(angle);
      add(radius * c, radius * s, sign * c, sign * s, length / 2 * RULE.weight(n));
    }
  }

  private void alongSide(double angle, int sign, double from, double to, int depth) {
    double c = Math.cos(angle);
    double s = Math.sin(angle);
    double middle = (from + to) / 2;
    double length = to - from;
    double away = Math.hypot(x - middle * c, y - middle * s);
    if (away < 1.5 * length && depth < DEEPEST) {
      alongSide(angle, sign, from, middle, depth + 1);
      alongSide(angle, sign, middle, to, depth + 1);
      return;
    }
    for (int n = 0; n < RULE.count(); n++) {
      double radius = middle + length / 2 * RULE.node(n);
      add(radius * c, radius * s, -sign * s, sign * c, length / 2 * RULE.weight(n));
    }
  }

  private void add(double px, double py, double nx, double ny, double weight) {
    double dx = x - px;
    double dy = y - py;
    double square = dx * dx + dy * dy;
    double r1 = Math.sqrt(square + above * above);
    double r0 = Math.sqrt(square + below * below);
    double plane = weight * (above / r1 - below / r0) / square;
    double axial = weight * (1 / r0 - 1 / r1);
    xx += nx * dx * plane;
    yy += ny * dy * plane;
    xy += ny * dx * plane;
    xz += nx * axial;
    yz += ny * axial;
  }
}
