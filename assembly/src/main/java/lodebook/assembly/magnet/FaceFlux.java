package lodebook.assembly.magnet;

import lodebook.assembly.field.Body;
import lodebook.assembly.field.VolumeAverage;

/// What a gaussmeter reads on the axis over the north face of a single magnet of a type, per tesla
/// of remanence.
///
/// Over the middle of a block's or disc's pole face, over a rod's pole line on the diameter of its
/// magnetisation, over the middle of an arc segment's outer face. The magnet answers to its own
/// field with its type's recoil permeability, uniformly over its volume.
public final class FaceFlux {
  private final Body body;
  private final double faceAt;
  private final double polarisation;

  /// What depends on the type alone, worked out once for all its pieces.
  public FaceFlux(MagnetType type) {
    body = MagnetBody.of(type);
    faceAt =
        switch (type.shape()) {
          case BLOCK, DISC -> type.thicknessMetres() / 2;
          case ROD -> type.diameterMetres() / 2;
          case ARC -> (type.diameterMetres() - type.innerDiameterMetres()) / 4;
        };
    double along =
        type.shape() == Shape.ROD ? 1 : Math.cos(Math.toRadians(type.magnetisationDegrees()));
    double susceptibility = type.recoilPermeability() - 1;
    polarisation =
        susceptibility == 0 ? along : along / (1 + susceptibility * demagnetisingFactor(body));
  }

  /// Share of the polarisation that opposes it inside, averaged over the volume, along the body's
  /// own x.
  static double demagnetisingFactor(Body body) {
    double[] mean = new double[1];
    double[] f = new double[3];
    VolumeAverage.over(
        body,
        (x, y, z, weight) -> {
          body.planarTensor(x, y, z, f, 0);
          mean[0] += weight * f[0];
        });
    return 1 - mean[0];
  }

  /// Flux density over the north face per tesla of remanence.
  ///
  /// @param standoffMetres face to the probe's sensing element, 0 or more
  public double perRemanence(double standoffMetres) {
    double[] f = new double[3];
    body.planarTensor(faceAt + standoffMetres, 0, 0, f, 0);
    return polarisation * f[0];
  }
}
