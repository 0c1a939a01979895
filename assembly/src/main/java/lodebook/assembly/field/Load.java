package lodebook.assembly.field;

import java.util.List;

/// Force and torque on one magnet.
///
/// @param force newtons
/// @param torque about the magnet's own origin, newton metres
public record Load(Vector3 force, Vector3 torque) {
  private static final double VACUUM_PERMEABILITY = 1.25663706127e-6;

  /// What other magnets do to one, all in one frame: the others' field integrated over its surface
  /// charges.
  ///
  /// Error about 10⁻⁴ of the greatest force, also for magnets that touch.
  public static Load on(PosedMagnet magnet, List<PosedMagnet> others) {
    Pose pose = magnet.place().pose();
    Vector3 own = pose.directionInto(magnet.polarisation());
    double[] sum = new double[6];
    SurfaceRule.over(
        magnet.place().body(),
        (point, area) -> {
          double charge = own.dot(area) / VACUUM_PERMEABILITY;
          if (charge == 0) {
            return;
          }
          Vector3 arm = pose.directionOutOf(point);
          Vector3 place = pose.centre().plus(arm);
          Vector3 flux = Vector3.ZERO;
          for (PosedMagnet other : others) {
            flux = flux.plus(other.flux(place));
          }
          Vector3 force = flux.times(charge);
          Vector3 torque = arm.cross(force);
          sum[0] += force.x();
          sum[1] += force.y();
          sum[2] += force.z();
          sum[3] += torque.x();
          sum[4] += torque.y();
          sum[5] += torque.z();
        });
    return new Load(new Vector3(sum[0], sum[1], sum[2]), new Vector3(sum[3], sum[4], sum[5]));
  }
}
