package lodebook.assembly.survey;

import java.util.List;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.InsertFrom;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Numbering;
import lodebook.assembly.layout.Probe;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.layout.Spread;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Shape;

/// Rings on which surveys are tried.
final class Rings {
  static final List<Component> BOTH = List.of(Component.RADIAL, Component.TANGENTIAL);
  static final List<Component> RADIAL = List.of(Component.RADIAL);

  private Rings() {}

  static RingDesign blocks12(List<Component> components) {
    return ring(3, 4, Focus.OUT, 10, 13, block(4, 4, 10), components);
  }

  static RingDesign blocks32(List<Component> components) {
    return ring(8, 4, Focus.IN, 30, 26.5, block(5, 5, 10), components);
  }

  static RingDesign blocks48(List<Component> components) {
    return ring(12, 4, Focus.IN, 45, 41.5, block(5, 5, 10), components);
  }

  static RingDesign blocks18(List<Component> components) {
    return ring(6, 3, Focus.OUT, 17, 20.5, block(5, 5, 10), components);
  }

  static RingDesign blocks40(List<Component> components) {
    return ring(5, 8, Focus.OUT, 38, 41.5, block(5, 5, 10), components);
  }

  static RingDesign blocks24(List<Component> components) {
    return ring(12, 2, Focus.OUT, 22, 25.5, block(5, 5, 10), components);
  }

  static RingDesign rods16(List<Component> components) {
    MagnetType rod =
        new MagnetType(
            "ROD", Shape.ROD, 0, 0, 0.010, 0.005, 0, 0, "N42", 5e-5, "Ni-Cu-Ni", 1.05, 0);
    return ring(4, 4, Focus.IN, 15, 11, rod, components);
  }

  static RingDesign arcs12(List<Component> components) {
    MagnetType arc =
        new MagnetType(
            "ARC", Shape.ARC, 0, 0, 0.010, 0.024, 0.016, 27, "N42", 5e-5, "Ni-Cu-Ni", 1.05, 0);
    return ring(3, 4, Focus.OUT, 10, 13.2, arc, components);
  }

  static RingDesign discs20(List<Component> components) {
    MagnetType disc =
        new MagnetType(
            "DSC", Shape.DISC, 0.003, 0, 0, 0.005, 0, 0, "N42", 5e-5, "Ni-Cu-Ni", 1.05, 0);
    return ring(10, 2, Focus.OUT, 20, 23, disc, components);
  }

  static RingDesign recoil12(List<Component> components) {
    MagnetType block =
        new MagnetType(
            "BLR", Shape.BLOCK, 0.004, 0.004, 0.010, 0, 0, 0, "N42", 5e-5, "Ni-Cu-Ni", 1.05, 0);
    return ring(3, 4, Focus.OUT, 10, 13, block, components);
  }

  static RingDesign recoil32(List<Component> components) {
    MagnetType block =
        new MagnetType(
            "BLR", Shape.BLOCK, 0.005, 0.005, 0.010, 0, 0, 0, "N42", 5e-5, "Ni-Cu-Ni", 1.05, 0);
    return ring(8, 4, Focus.IN, 30, 26.5, block, components);
  }

  static MagnetType block(double thickness, double width, double length) {
    return new MagnetType(
        "BLK",
        Shape.BLOCK,
        thickness / 1000,
        width / 1000,
        length / 1000,
        0,
        0,
        0,
        "N42",
        5e-5,
        "Ni-Cu-Ni",
        1,
        0);
  }

  /// @param slotRadius millimetres
  /// @param probeRadius millimetres
  static RingDesign ring(
      int polePairs,
      int perPair,
      Focus focus,
      double slotRadius,
      double probeRadius,
      MagnetType type,
      List<Component> components) {
    Layout layout =
        new Layout(
            "TRY-" + polePairs * perPair,
            "A",
            polePairs,
            perPair,
            focus,
            Numbering.CLOCKWISE,
            0,
            Facing.OUT,
            slotRadius / 1000,
            type.code(),
            null,
            probeRadius / 1000,
            new Probe(probeRadius / 1000, 0, List.of(Spot.CENTRE), components),
            Spread.DEFAULT,
            "",
            null,
            false,
            InsertFrom.FACE,
            0.03);
    return new RingDesign(layout, type, null);
  }
}
