package lodebook.assembly.field;

/// The body of a uniformly polarised magnet, in its own frame, whose origin is the body's middle.
///
/// All fields of a uniformly polarised body follow from one symmetric tensor F(r): the flux density
/// at r is B = F·J for a polarisation J (tesla; for recoil permeability 1 its length is the
/// remanence). Outside, F is the second derivative of the body's Newtonian potential divided by 4π
/// and has trace 0; inside, the unit tensor is added and the trace is 2. A point on a face counts
/// as outside.
///
/// Own frame: x along the thickness (the radius, where the body stands square in its slot), y
/// towards the next slot, z along the ring's axis.
public sealed interface Body permits Block, Cylinder, ArcSegment {

  /// The parts of F in the ring's plane.
  ///
  /// @param x metres, own frame
  /// @param y metres, own frame
  /// @param z metres, own frame
  /// @param into where F_xx, F_yy, F_xy go, at `at`, `at + 1`, `at + 2`; dimensionless
  /// @param at index of the first of the three
  void planarTensor(double x, double y, double z, double[] into, int at);

  /// All of F.
  ///
  /// @param x metres, own frame
  /// @param y metres, own frame
  /// @param z metres, own frame
  /// @param into where F_xx, F_yy, F_zz, F_xy, F_xz, F_yz go; dimensionless
  void fullTensor(double x, double y, double z, double[] into);

  /// Whether a point, metres in the own frame, lies inside and not on a face.
  boolean contains(double x, double y, double z);

  /// Volume, cubic metres.
  double volume();

  /// Radius of the smallest sphere round the origin that holds the body, metres.
  double boundingRadius();

  /// Flux density at a point outside or inside, tesla, own frame.
  ///
  /// @param point metres, own frame
  /// @param polarisation tesla, own frame
  default Vector3 flux(Vector3 point, Vector3 polarisation) {
    double[] f = new double[6];
    fullTensor(point.x(), point.y(), point.z(), f);
    double jx = polarisation.x();
    double jy = polarisation.y();
    double jz = polarisation.z();
    return new Vector3(
        f[0] * jx + f[3] * jy + f[4] * jz,
        f[3] * jx + f[1] * jy + f[5] * jz,
        f[4] * jx + f[5] * jy + f[2] * jz);
  }
}
