package lodebook.assembly.magnet;

import java.util.ArrayList;
import java.util.List;

/// The dimensions that a type's shape has.
final class Dimensions {
  private Dimensions() {}

  /// The type with one of its dimensions grown at a time.
  static List<MagnetType> eachGrown(MagnetType type, double byMetres) {
    List<MagnetType> grown = new ArrayList<>();
    switch (type.shape()) {
      case BLOCK -> {
        grown.add(grown(type, byMetres, 0, 0, 0, 0));
        grown.add(grown(type, 0, byMetres, 0, 0, 0));
        grown.add(grown(type, 0, 0, byMetres, 0, 0));
      }
      case DISC -> {
        grown.add(grown(type, byMetres, 0, 0, 0, 0));
        grown.add(grown(type, 0, 0, 0, byMetres, 0));
      }
      case ROD -> {
        grown.add(grown(type, 0, 0, byMetres, 0, 0));
        grown.add(grown(type, 0, 0, 0, byMetres, 0));
      }
      case ARC -> {
        grown.add(grown(type, 0, 0, byMetres, 0, 0));
        grown.add(grown(type, 0, 0, 0, byMetres, 0));
        grown.add(grown(type, 0, 0, 0, 0, byMetres));
      }
    }
    return grown;
  }

  private static MagnetType grown(
      MagnetType type,
      double thickness,
      double width,
      double length,
      double diameter,
      double innerDiameter) {
    return new MagnetType(
        type.code(),
        type.shape(),
        type.thicknessMetres() + thickness,
        type.widthMetres() + width,
        type.lengthMetres() + length,
        type.diameterMetres() + diameter,
        type.innerDiameterMetres() + innerDiameter,
        type.arcDegrees(),
        type.grade(),
        type.toleranceMetres(),
        type.coating(),
        type.recoilPermeability(),
        type.magnetisationDegrees());
  }
}
