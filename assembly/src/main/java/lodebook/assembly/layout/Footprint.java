package lodebook.assembly.layout;

import java.util.ArrayList;
import java.util.List;
import lodebook.assembly.field.ArcSegment;
import lodebook.assembly.field.Block;
import lodebook.assembly.field.Cylinder;
import lodebook.assembly.field.PosedBody;
import lodebook.assembly.field.Vector3;

/// What a standing magnet covers of the ring's plane at mid-height: corners, each widened by a
/// radius (which is 0 but for rods).
///
/// @param corners of the convex outline, in turn, metres
/// @param radiusMetres radius round each corner
record Footprint(List<Vector3> corners, double radiusMetres) {
  private static final int ARC_STEPS = 64;

  static Footprint of(PosedBody magnet) {
    return switch (magnet.body()) {
      case Block b -> rectangle(magnet, b.xMetres() / 2, b.yMetres() / 2);
      case Cylinder c ->
          switch (c.axis()) {
            case X -> rectangle(magnet, c.lengthMetres() / 2, c.radiusMetres());
            case Z -> new Footprint(List.of(magnet.pose().centre()), c.radiusMetres());
          };
      case ArcSegment arc -> segment(magnet, arc);
    };
  }

  private static Footprint rectangle(PosedBody magnet, double a, double b) {
    return placed(
        magnet,
        List.of(
            new Vector3(a, b, 0),
            new Vector3(-a, b, 0),
            new Vector3(-a, -b, 0),
            new Vector3(a, -b, 0)));
  }

  private static Footprint segment(PosedBody magnet, ArcSegment arc) {
    List<Vector3> own = new ArrayList<>();
    for (int n = 0; n <= ARC_STEPS; n++) {
      own.add(
          onArc(arc, arc.outerRadiusMetres(), arc.angleRadians() * (n / (double) ARC_STEPS - 0.5)));
    }
    for (int n = ARC_STEPS; n >= 0; n--) {
      own.add(
          onArc(arc, arc.innerRadiusMetres(), arc.angleRadians() * (n / (double) ARC_STEPS - 0.5)));
    }
    return placed(magnet, own);
  }

  private static Vector3 onArc(ArcSegment arc, double radius, double angle) {
    return new Vector3(
        radius * Math.cos(angle) - arc.meanRadiusMetres(), radius * Math.sin(angle), 0);
  }

  private static Footprint placed(PosedBody magnet, List<Vector3> own) {
    return new Footprint(
        own.stream()
            .map(corner -> magnet.pose().centre().plus(magnet.pose().directionOutOf(corner)))
            .toList(),
        0);
  }

  /// The corner farthest along a direction.
  Vector3 farthest(Vector3 direction) {
    Vector3 best = corners.getFirst();
    for (Vector3 corner : corners) {
      if (corner.dot(direction) > best.dot(direction)) {
        best = corner;
      }
    }
    return best;
  }

  /// How far the outline reaches along a unit vector, metres from the axis.
  double reach(Vector3 direction) {
    return farthest(direction).dot(direction) + radiusMetres;
  }

  /// How far this outline, seen along a unit vector, reaches beyond the beginning of another.
  double beyond(Footprint other, Vector3 direction) {
    return reach(direction) + other.reach(direction.times(-1));
  }

  /// Whether two outlines share more than 1 nm: no edge's normal, nor a line between corners where
  /// one is round, parts them.
  boolean overlaps(Footprint other) {
    List<Vector3> directions = new ArrayList<>();
    addNormals(corners, directions);
    addNormals(other.corners, directions);
    if (radiusMetres > 0 || other.radiusMetres > 0) {
      for (Vector3 a : corners) {
        for (Vector3 b : other.corners) {
          Vector3 line = b.minus(a);
          directions.add(line.times(1 / line.norm()));
        }
      }
    }
    for (Vector3 direction : directions) {
      if (beyond(other, direction) < 1e-9 || beyond(other, direction.times(-1)) < 1e-9) {
        return false;
      }
    }
    return true;
  }

  private static void addNormals(List<Vector3> corners, List<Vector3> directions) {
    for (int i = 0; i < corners.size() && corners.size() > 2; i++) {
      Vector3 edge = corners.get((i + 1) % corners.size()).minus(corners.get(i));
      if (edge.norm() > 1e-12) {
        directions.add(new Vector3(edge.y(), -edge.x(), 0).times(1 / edge.norm()));
      }
    }
  }

  /// Distance from the axis to the nearest point, metres; 0 where the axis lies inside.
  double nearestToAxis() {
    if (corners.size() == 1) {
      return Math.max(0, corners.getFirst().norm() - radiusMetres);
    }
    double nearest = Double.POSITIVE_INFINITY;
    for (int i = 0; i < corners.size(); i++) {
      Vector3 a = corners.get(i);
      Vector3 edge = corners.get((i + 1) % corners.size()).minus(a);
      double square = edge.dot(edge);
      double along = square == 0 ? 0 : Math.clamp(-a.dot(edge) / square, 0, 1);
      nearest = Math.min(nearest, a.plus(edge.times(along)).norm());
    }
    return nearest;
  }

  /// Distance from the axis to the farthest point, metres.
  double farthestFromAxis() {
    double farthest = 0;
    for (Vector3 corner : corners) {
      farthest = Math.max(farthest, corner.norm());
    }
    return farthest + radiusMetres;
  }
}
