package lodebook.assembly.safety;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import lodebook.assembly.field.Vector3;
import lodebook.assembly.magnet.Grade;
import lodebook.assembly.magnet.MagnetBody;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Shape;
import org.junit.jupiter.api.Test;

final class SafetyTest {
  private static final MagnetType CUBE = block(0.010, 0.010, 0.010);

  private static MagnetType block(double thickness, double width, double length) {
    return new MagnetType(
        "BLK", Shape.BLOCK, thickness, width, length, 0, 0, 0, "N42", 5e-5, "Ni", 1.05, 0);
  }

  private static MagnetType round(
      Shape shape, double thickness, double length, double diameter, double inner, double arc) {
    return new MagnetType(
        "RND", shape, thickness, 0, length, diameter, inner, arc, "N42", 5e-5, "Ni", 1.05, 0);
  }

  /// Physics: Br²A/(2µ0) is 39.8 N for 1 T over 1 cm², 39.79 N for a face 10 by 10 mm.
  @Test
  void pinchOfOneTeslaOverASquareCentimetre() {
    assertEquals(39.79, PinchForce.upperBoundNewton(CUBE, 1), 0.005);
    assertEquals(4 * 39.79, PinchForce.upperBoundNewton(CUBE, 2), 0.02);
  }

  @Test
  void poleFaceOfEachShape() {
    assertEquals(0.004 * 0.010, PinchForce.poleFaceSquareMetres(block(0.002, 0.004, 0.010)), 1e-12);
    assertEquals(
        Math.PI * 9e-6,
        PinchForce.poleFaceSquareMetres(round(Shape.DISC, 0.002, 0, 0.006, 0, 0)),
        1e-12);
    assertEquals(
        0.005 * 0.010,
        PinchForce.poleFaceSquareMetres(round(Shape.ROD, 0, 0.010, 0.005, 0, 0)),
        1e-12);
    assertEquals(
        Math.PI / 6 * 0.030 * 0.010,
        PinchForce.poleFaceSquareMetres(round(Shape.ARC, 0, 0.010, 0.060, 0.040, 30)),
        1e-12);
  }

  /// Textbook closed form on the axis of a block: a cube of 10 mm has B/Br 0.35665624 at 1 mm above
  /// its face and 1.27323950e-6 at 500 mm from its centre. The axis is the worst direction of a
  /// cube when far; when near, an edge reaches no farther than its own corner.
  @Test
  void keepOutOfACubeIsWhereTheClosedFormHasTheLimit() {
    assertEquals(0.5, KeepOut.metres(CUBE, 1.0, 1.27323950e-6), 1e-6);
    double oneMillimetreUp = KeepOut.metres(CUBE, 1.0, 0.35665624);
    assertTrue(oneMillimetreUp >= 0.006 - 1e-9, "at least 6 mm, not " + oneMillimetreUp);
  }

  /// No direction has more than the limit beyond the distance, and one has it just within.
  @Test
  void noDirectionExceedsTheLimitBeyondTheDistance() {
    var random = new Random(7);
    for (int i = 0; i < 200; i++) {
      double size = 0.002 + 0.02 * random.nextDouble();
      MagnetType type =
          block(
              size, size * (0.3 + 2 * random.nextDouble()), size * (0.3 + 2 * random.nextDouble()));
      FieldLimit limit = i % 2 == 0 ? FieldLimit.IMPLANTS : FieldLimit.LOOSE_IRON;
      double metres = KeepOut.metres(type, 1.3, limit.tesla());
      var body = MagnetBody.of(type);
      for (int j = 0; j < 60; j++) {
        double z = 2 * random.nextDouble() - 1;
        double round = 2 * Math.PI * random.nextDouble();
        double rho = Math.sqrt(1 - z * z);
        var point =
            new Vector3(rho * Math.cos(round), rho * Math.sin(round), z).times(1.002 * metres);
        double flux = body.flux(point, new Vector3(1.3, 0, 0)).norm();
        assertTrue(flux <= 1.01 * limit.tesla(), type + ": " + flux + " beyond " + metres);
      }
    }
  }

  /// Textbook closed form on the axis of a disc, diameter 10 and thickness 5 mm, at 40 mm from its
  /// centre: B/Br = ½[(z+t)/√(R²+(z+t)²) − z/√(R²+z²)] with z = 37.5 mm from the face. Of a disc
  /// this thin the axis is not always the farthest direction, so the distance is at least that.
  @Test
  void keepOutOfADiscReachesWhereTheClosedFormHasTheLimit() {
    MagnetType disc = round(Shape.DISC, 0.005, 0, 0.010, 0, 0);
    double z = 0.0375;
    double perTesla = 0.5 * ((z + 0.005) / Math.hypot(0.005, z + 0.005) - z / Math.hypot(0.005, z));
    double metres = KeepOut.metres(disc, 1.3, 1.3 * perTesla);
    assertTrue(metres >= 0.04 - 1e-9 && metres < 0.0401, "40 mm or a little more, not " + metres);
  }

  /// Far away every body is the dipole of its volume: (Br·V/(2π·B))^(1/3).
  @Test
  void farAwayEveryShapeIsADipole() {
    double arcVolume = Math.PI / 12 * (0.030 * 0.030 - 0.020 * 0.020) * 0.010;
    double limit = 1e-6;
    assertEquals(
        Math.cbrt(1.3 * Math.PI * 0.0025 * 0.0025 * 0.010 / (2 * Math.PI * limit)),
        KeepOut.metres(round(Shape.ROD, 0, 0.010, 0.005, 0, 0), 1.3, limit),
        0.0005);
    assertEquals(
        Math.cbrt(1.3 * arcVolume / (2 * Math.PI * limit)),
        KeepOut.metres(round(Shape.ARC, 0, 0.010, 0.060, 0.040, 30), 1.3, limit),
        0.001);
  }

  /// Twelve magnets at the bound's distance from a point, each turned so that its field there is as
  /// strong as it can be and all fields point the same way, just reach the limit.
  @Test
  void manyMagnetsTogetherReachTheLimitAtMost() {
    double limit = FieldLimit.IMPLANTS.tesla();
    double metres = KeepOut.metresTogether(CUBE, 1.3, limit, 12);
    var point = new Vector3(metres, 0, 0);
    double one = MagnetBody.of(CUBE).flux(point, new Vector3(1.3, 0, 0)).norm();
    assertEquals(limit, 12 * one, 1e-3 * limit);
    assertEquals(Math.cbrt(12), metres / KeepOut.metres(CUBE, 1.3, limit), 1e-3);
  }

  /// Block 4 × 4 × 10 mm of N42 at its highest remanence: a dipole of Br·V/µ0 has 0.5 mT at
  /// (Br·V/(2π·0.5 mT))^(1/3), 40.7 mm; the body's own figure is within a few per cent.
  @Test
  void figuresOfABlock() {
    var grade = new Grade("N42", 1.28, 1.32, -0.0012, 1.05, 80, 7500, "trade");
    var figures = HandlingFigures.of(block(0.004, 0.004, 0.010), grade, 12);
    assertEquals(1.32 * 1.32 * 40e-6 / (8e-7 * Math.PI), figures.pinchNewton(), 1e-6);
    assertEquals(0.0407, figures.implantsMetres(), 0.0015);
    assertEquals(0.0407 * Math.cbrt(12), figures.implantsTogetherMetres(), 0.001);
    assertEquals(0.0224, figures.looseIronMetres(), 0.0015);
    assertEquals(80, figures.highestTemperatureCelsius());
  }

  /// Sources: Directive 2013/35/EU, action levels.
  @Test
  void limits() {
    assertEquals(0.0005, FieldLimit.IMPLANTS.tesla());
    assertEquals(0.003, FieldLimit.LOOSE_IRON.tesla());
  }
}
