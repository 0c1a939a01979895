package lodebook.assembly.layout;

import java.util.List;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Shape;

/// Rings that several tests use.
public final class Rings {
  private Rings() {}

  /// A block type without recoil, sizes in millimetres.
  public static MagnetType block(double thickness, double width, double length) {
    return new MagnetType(
        "BLK",
        Shape.BLOCK,
        thickness / 1e3,
        width / 1e3,
        length / 1e3,
        0,
        0,
        0,
        "N42",
        0.05e-3,
        "NiCuNi",
        1.0,
        0);
  }

  /// A layout with radii in millimetres.
  public static Layout layout(int p, int k, Focus focus, double slotRadius, double working) {
    return new Layout(
        "STIR-IN",
        "A",
        p,
        k,
        focus,
        Numbering.CLOCKWISE,
        0,
        Facing.OUT,
        slotRadius / 1e3,
        "BLK",
        null,
        working / 1e3,
        new Probe(
            working / 1e3,
            0,
            List.of(Spot.CENTRE),
            List.of(Component.RADIAL, Component.TANGENTIAL)),
        Spread.DEFAULT,
        "",
        null,
        false,
        InsertFrom.FACE,
        0.03);
  }

  /// The ring of the shop's example surveys: 3 pole pairs of four, blocks 4×4×10 at radius 10.
  public static RingDesign stirrer() {
    return new RingDesign(layout(3, 4, Focus.OUT, 10, 13), block(4, 4, 10), null);
  }

  /// Each slot's part of the polarisation along out, for one remanence.
  public static double[] out(List<Facing> facings, double remanence) {
    return facings.stream().mapToDouble(f -> remanence * Math.cos(f.radians())).toArray();
  }

  /// Each slot's part of the polarisation to next, for one remanence.
  public static double[] next(List<Facing> facings, double remanence) {
    return facings.stream().mapToDouble(f -> remanence * Math.sin(f.radians())).toArray();
  }
}
