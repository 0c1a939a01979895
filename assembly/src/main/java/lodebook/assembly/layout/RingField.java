package lodebook.assembly.layout;

import java.util.List;
import lodebook.assembly.field.Body;
import lodebook.assembly.magnet.MagnetBody;

/// The field of a ring's magnets as a linear map from their polarisations to readings.
///
/// Every magnet is uniformly polarised in the ring's plane. The matrices refer to polarisations;
/// [MutualMagnetisation] makes them refer to remanences.
public final class RingField {
  /// Step of the central differences, metres: relative error about 10⁻⁶ at 3 mm from a magnet.
  private static final double STEP = 2e-6;

  private final double slotRadius;
  private final double[] slotAngle;
  private final Body[] body;
  private final double[] turn;

  /// A ring whose bodies stand as the layout's rule wants them.
  public RingField(RingDesign design) {
    this(design, design.ruleFacings());
  }

  /// A ring whose bodies stand as given facings turn them; without turning bodies that makes no
  /// difference.
  ///
  /// @param design the ring
  /// @param facings one for each slot, slot 1 first
  public RingField(RingDesign design, List<Facing> facings) {
    int slots = design.slots();
    slotRadius = design.layout().slotRadiusMetres();
    slotAngle = new double[slots];
    body = new Body[slots];
    turn = new double[slots];
    for (int i = 0; i < slots; i++) {
      slotAngle[i] = design.layout().angleFromFirstRadians(i + 1);
      body[i] = MagnetBody.of(design.typeAt(i + 1));
      turn[i] = design.bodyTurnRadians(i + 1, facings.get(i));
    }
  }

  /// Readings at places, per tesla of each slot's polarisation.
  public FieldMatrix at(List<ReadingPlace> places) {
    FieldMatrix matrix = new FieldMatrix(places.size(), body.length);
    double[] f = new double[3];
    for (int row = 0; row < places.size(); row++) {
      ReadingPlace place = places.get(row);
      for (int i = 0; i < body.length; i++) {
        double angle = place.angleRadians() - slotAngle[i];
        double c = Math.cos(angle);
        double s = Math.sin(angle);
        tensor(
            i,
            place.radiusMetres() * c - slotRadius,
            place.radiusMetres() * s,
            place.heightMetres(),
            f);
        put(matrix, row, i, place.component(), c, s, f);
      }
    }
    return matrix;
  }

  /// Derivatives of the readings at places with respect to the positions of magnets and probe.
  public FieldDerivatives derivatives(List<ReadingPlace> places) {
    int rows = places.size();
    int slots = body.length;
    FieldDerivatives result =
        new FieldDerivatives(
            new FieldMatrix(rows, slots),
            new FieldMatrix(rows, slots),
            new FieldMatrix(rows, slots),
            new FieldMatrix(rows, slots),
            new FieldMatrix(rows, slots));
    for (int row = 0; row < rows; row++) {
      ReadingPlace place = places.get(row);
      Component component = place.component();
      for (int i = 0; i < slots; i++) {
        double angle = place.angleRadians() - slotAngle[i];
        double c = Math.cos(angle);
        double s = Math.sin(angle);
        double x = place.radiusMetres() * c - slotRadius;
        double y = place.radiusMetres() * s;
        double z = place.heightMetres();
        double[] dx = slope(i, x, y, z, 1, 0, 0);
        double[] dy = slope(i, x, y, z, 0, 1, 0);
        put(result.magnetOut(), row, i, component, c, s, combined(-1, dx, 0, dy));
        put(result.magnetNext(), row, i, component, c, s, combined(0, dx, -1, dy));
        put(result.probeOut(), row, i, component, c, s, combined(c, dx, s, dy));
        put(result.probeNext(), row, i, component, c, s, combined(-s, dx, c, dy));
        put(result.probeUp(), row, i, component, c, s, slope(i, x, y, z, 0, 0, 1));
      }
    }
    return result;
  }

  private static double[] combined(double byA, double[] a, double byB, double[] b) {
    double[] sum = new double[3];
    for (int n = 0; n < 3; n++) {
      sum[n] = byA * a[n] + byB * b[n];
    }
    return sum;
  }

  private double[] slope(int i, double x, double y, double z, int alongX, int alongY, int alongZ) {
    double[] ahead = new double[3];
    double[] behind = new double[3];
    double hx = STEP * alongX;
    double hy = STEP * alongY;
    double hz = STEP * alongZ;
    tensor(i, x + hx, y + hy, z + hz, ahead);
    tensor(i, x - hx, y - hy, z - hz, behind);
    return combined(0.5 / STEP, ahead, -0.5 / STEP, behind);
  }

  private void tensor(int i, double x, double y, double z, double[] f) {
    SlotTensor.at(body[i], turn[i], x, y, z, f);
  }

  private static void put(
      FieldMatrix matrix, int row, int i, Component component, double c, double s, double[] f) {
    switch (component) {
      case RADIAL -> matrix.set(row, i + 1, c * f[0] + s * f[2], c * f[2] + s * f[1]);
      case TANGENTIAL -> matrix.set(row, i + 1, c * f[2] - s * f[0], c * f[1] - s * f[2]);
    }
  }
}
