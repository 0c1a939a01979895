package lodebook.assembly.layout;

import java.util.Arrays;
import java.util.List;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Shape;

/// Rings that several tests use.
public final class Rings {
  private Rings() {}

  /// A block type without recoil, sizes in millimetres.
  public static MagnetType block(double thickness, double width, double length) {
    return block(thickness, width, length, 1.0);
  }

  /// A block type, sizes in millimetres.
  public static MagnetType block(
      double thickness, double width, double length, double recoilPermeability) {
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
        recoilPermeability,
        0);
  }

  /// A rod type without recoil, sizes in millimetres.
  public static MagnetType rod(double diameter, double length) {
    return new MagnetType(
        "ROD", Shape.ROD, 0, 0, length / 1e3, diameter / 1e3, 0, 0, "N42", 0, "", 1.0, 0);
  }

  /// A disc type without recoil, sizes in millimetres.
  public static MagnetType disc(double diameter, double thickness) {
    return new MagnetType(
        "DSC", Shape.DISC, thickness / 1e3, 0, 0, diameter / 1e3, 0, 0, "N42", 0, "", 1.0, 0);
  }

  /// An arc type without recoil, radii and length in millimetres.
  public static MagnetType arc(double inner, double outer, double degrees, double length) {
    return arc(inner, outer, degrees, length, 1.0);
  }

  /// An arc type, radii and length in millimetres.
  public static MagnetType arc(
      double inner, double outer, double degrees, double length, double recoilPermeability) {
    return new MagnetType(
        "ARC",
        Shape.ARC,
        0,
        0,
        length / 1e3,
        2 * outer / 1e3,
        2 * inner / 1e3,
        degrees,
        "N42",
        0,
        "",
        recoilPermeability,
        0);
  }

  /// The same layout with bodies that turn with their facing.
  public static Layout turning(Layout layout) {
    return new Layout(
        layout.code(),
        layout.revision(),
        layout.polePairs(),
        layout.segmentsPerPolePair(),
        layout.focus(),
        layout.numbering(),
        layout.firstSlotClockDegrees(),
        layout.firstFacing(),
        layout.slotRadiusMetres(),
        layout.magnetType(),
        layout.sideMagnetType(),
        layout.workingRadiusMetres(),
        layout.probe(),
        layout.spread(),
        layout.adhesive(),
        layout.adhesiveWorkingMinutes(),
        true,
        layout.insertFrom(),
        layout.workingAmplitudeTolerance());
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

  /// Facings with one remanence for all slots.
  public static RingPolarisation equal(List<Facing> facings, double remanence) {
    double[] remanences = new double[facings.size()];
    Arrays.fill(remanences, remanence);
    return RingPolarisation.of(remanences, facings);
  }
}
