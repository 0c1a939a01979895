package lodebook.assembly.field;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/// What holds for every magnet, at seeded random points outside and inside.
class FieldLawsTest {
  private static final double STEP = 1e-6;

  static Stream<Body> bodies() {
    return Stream.of(
        new Block(0.004, 0.005, 0.01),
        new Cylinder(0.003, 0.004, Cylinder.Axis.X),
        new Cylinder(0.0025, 0.01, Cylinder.Axis.Z),
        new ArcSegment(0.01, 0.014, Math.toRadians(40), 0.008),
        new ArcSegment(0.002, 0.006, Math.toRadians(200), 0.003));
  }

  private interface Check {
    void at(Vector3 point, Vector3 polarisation, String message);
  }

  /// Points up to twice the bounding radius away, none within 0.1 mm of a face.
  private static void sample(Body body, long seed, int count, Check check) {
    Random random = new Random(seed);
    int done = 0;
    while (done < count) {
      double reach = 2 * body.boundingRadius();
      Vector3 point = randomVector(random).times(reach);
      Vector3 polarisation = randomVector(random);
      if (awayFromFaces(body, point)) {
        check.at(point, polarisation, body + " seed " + seed + " at " + point);
        done++;
      }
    }
  }

  private static Vector3 randomVector(Random random) {
    return new Vector3(
        random.nextDouble(-1, 1), random.nextDouble(-1, 1), random.nextDouble(-1, 1));
  }

  private static boolean awayFromFaces(Body body, Vector3 p) {
    boolean inside = body.contains(p.x(), p.y(), p.z());
    double d = 1e-4;
    for (Vector3 step :
        List.of(
            new Vector3(d, 0, 0),
            new Vector3(0, d, 0),
            new Vector3(0, 0, d),
            new Vector3(d, d, d),
            new Vector3(d, -d, d),
            new Vector3(d, d, -d),
            new Vector3(d, -d, -d))) {
      for (Vector3 q : List.of(p.plus(step), p.minus(step))) {
        if (body.contains(q.x(), q.y(), q.z()) != inside) {
          return false;
        }
      }
    }
    return true;
  }

  private static Vector3 slope(Body body, Vector3 point, Vector3 along, Vector3 polarisation) {
    return body.flux(point.plus(along.times(STEP)), polarisation)
        .minus(body.flux(point.minus(along.times(STEP)), polarisation))
        .times(0.5 / STEP);
  }

  /// A block cut into eight gives the same field, outside and inside.
  @Test
  void blockCutIntoEight() {
    Block whole = new Block(0.004, 0.005, 0.01);
    Block part = new Block(0.002, 0.0025, 0.005);
    sample(
        whole,
        13,
        100,
        (point, j, message) -> {
          Vector3 sum = Vector3.ZERO;
          for (int corner = 0; corner < 8; corner++) {
            Vector3 middle =
                new Vector3(
                    (corner & 1) == 0 ? 0.001 : -0.001,
                    (corner & 2) == 0 ? 0.00125 : -0.00125,
                    (corner & 4) == 0 ? 0.0025 : -0.0025);
            sum = sum.plus(part.flux(point.minus(middle), j));
          }
          assertEquals(0, sum.minus(whole.flux(point, j)).norm(), 1e-12, message);
        });
  }

  /// The on-axis formula's surface charges summed by hand: a pole face of fine squares.
  @Test
  void blockFromItsSurfaceCharges() {
    Block block = new Block(0.004, 0.005, 0.01);
    Vector3 point = new Vector3(0.0055, 0.0013, -0.0024);
    int n = 400;
    Vector3 sum = Vector3.ZERO;
    for (int i = 0; i < n; i++) {
      for (int k = 0; k < n; k++) {
        double y = 0.005 * ((i + 0.5) / n - 0.5);
        double z = 0.01 * ((k + 0.5) / n - 0.5);
        for (int sign = -1; sign <= 1; sign += 2) {
          Vector3 r = point.minus(new Vector3(sign * 0.002, y, z));
          double charge = sign * 0.005 * 0.01 / n / n / (4 * Math.PI);
          sum = sum.plus(r.times(charge / Math.pow(r.norm(), 3)));
        }
      }
    }
    assertEquals(0, sum.minus(block.flux(point, new Vector3(1, 0, 0))).norm(), 1e-6);
  }

  @ParameterizedTest
  @MethodSource("bodies")
  void noSourcesAndNoCurrents(Body body) {
    sample(
        body,
        11,
        60,
        (point, j, message) -> {
          Vector3 dx = slope(body, point, new Vector3(1, 0, 0), j);
          Vector3 dy = slope(body, point, new Vector3(0, 1, 0), j);
          Vector3 dz = slope(body, point, new Vector3(0, 0, 1), j);
          double scale = 1e-5 * (1 / STEP) * 1e-4;
          assertEquals(0, dx.x() + dy.y() + dz.z(), scale, "divergence of " + message);
          assertEquals(0, dy.z() - dz.y(), scale, "curl of " + message);
          assertEquals(0, dz.x() - dx.z(), scale, "curl of " + message);
          assertEquals(0, dx.y() - dy.x(), scale, "curl of " + message);
        });
  }

  @ParameterizedTest
  @MethodSource("bodies")
  void dipolesFillingTheVolumeGiveTheSameFieldAtADistance(Body body) {
    Random random = new Random(12);
    for (int n = 0; n < 40; n++) {
      Vector3 direction = randomVector(random);
      Vector3 point =
          direction.times(body.boundingRadius() * random.nextDouble(4, 28) / direction.norm());
      double[] closed = new double[6];
      double[] filled = new double[6];
      body.fullTensor(point.x(), point.y(), point.z(), closed);
      FarField.full(body, point.x(), point.y(), point.z(), filled);
      double scale = body.volume() / Math.pow(point.norm(), 3);
      for (int element = 0; element < 6; element++) {
        assertEquals(filled[element], closed[element], 2e-7 * scale, body + " at " + point);
      }
    }
  }

  @ParameterizedTest
  @MethodSource("bodies")
  void farAwayEveryMagnetIsADipole(Body body) {
    Vector3 point = new Vector3(0.9, 1.3, -0.7);
    Vector3 j = new Vector3(0.3, -0.8, 0.5);
    Vector3 r = point.times(1 / point.norm());
    double scale = body.volume() / (4 * Math.PI * Math.pow(point.norm(), 3));
    Vector3 dipole = r.times(3 * r.dot(j)).minus(j).times(scale);
    assertEquals(0, body.flux(point, j).minus(dipole).norm(), 3e-2 * dipole.norm());
  }
}
