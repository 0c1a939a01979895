package lodebook.assembly.safety;

import lodebook.assembly.field.Body;
import lodebook.assembly.field.Vector3;
import lodebook.assembly.magnet.MagnetBody;
import lodebook.assembly.magnet.MagnetType;

/// How far from a magnet its field has fallen to a limit.
///
/// The field is that of the whole body and not of a dipole; the worst direction is searched.
/// Distances are from the magnet's centre.
public final class KeepOut {
  private static final int POLAR = 8;
  private static final int ROUND = 16;

  private KeepOut() {}

  /// Distance from the centre of one magnet beyond which its field stays below a limit.
  ///
  /// @param remanenceTesla remanence, tesla
  /// @param limitTesla the limit, tesla
  /// @return metres, in the direction in which the field reaches farthest
  public static double metres(MagnetType type, double remanenceTesla, double limitTesla) {
    Body body = MagnetBody.of(type);
    double magnetisation = Math.toRadians(type.magnetisationDegrees());
    var polarisation = new Vector3(remanenceTesla, 0, 0).turnedAboutZ(magnetisation);
    double dipole = Math.cbrt(remanenceTesla * body.volume() / (2 * Math.PI * limitTesla));
    double probe = Math.max(dipole, 1.05 * body.boundingRadius());
    Vector3 worst = worstDirection(body, polarisation, probe);
    double near = 0;
    double far = 4 * probe;
    for (int i = 0; i < 40; i++) {
      double middle = (near + far) / 2;
      Vector3 point = worst.times(middle);
      if (body.contains(point.x(), point.y(), point.z())
          || body.flux(point, polarisation).norm() > limitTesla) {
        near = middle;
      } else {
        far = middle;
      }
    }
    return far;
  }

  /// Upper bound for many magnets, however they stand: farther than this from each of them, n
  /// fields that are each at most 1/n of the limit cannot add up to it.
  ///
  /// @return metres from the centre of the nearest magnet
  public static double metresTogether(
      MagnetType type, double remanenceTesla, double limitTesla, int magnets) {
    return metres(type, remanenceTesla, limitTesla / magnets);
  }

  private static Vector3 worstDirection(Body body, Vector3 polarisation, double metres) {
    Vector3 worst = polarisation.times(1 / polarisation.norm());
    double most = body.flux(worst.times(metres), polarisation).norm();
    for (int i = 0; i <= POLAR; i++) {
      double polar = Math.PI / 2 * i / POLAR;
      for (int j = 0; j < ROUND; j++) {
        double round = 2 * Math.PI * j / ROUND;
        var direction =
            new Vector3(
                Math.sin(polar) * Math.cos(round),
                Math.sin(polar) * Math.sin(round),
                Math.cos(polar));
        double flux = body.flux(direction.times(metres), polarisation).norm();
        if (flux > most) {
          most = flux;
          worst = direction;
        }
      }
    }
    return worst;
  }
}
