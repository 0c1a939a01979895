package lodebook.assembly.magnet;

import lodebook.assembly.field.ArcSegment;
import lodebook.assembly.field.Block;
import lodebook.assembly.field.Body;
import lodebook.assembly.field.Cylinder;
import lodebook.assembly.field.Cylinder.Axis;

/// The body of a magnet type as the field computation sees it.
public final class MagnetBody {
  private MagnetBody() {}

  /// The body in its own frame: x along the thickness (or, for rods and arcs, the radius), z along
  /// the rotor's axis.
  public static Body of(MagnetType type) {
    return switch (type.shape()) {
      case BLOCK -> new Block(type.thicknessMetres(), type.widthMetres(), type.lengthMetres());
      case DISC -> new Cylinder(type.diameterMetres() / 2, type.thicknessMetres(), Axis.X);
      case ROD -> new Cylinder(type.diameterMetres() / 2, type.lengthMetres(), Axis.Z);
      case ARC ->
          new ArcSegment(
              type.innerDiameterMetres() / 2,
              type.diameterMetres() / 2,
              Math.toRadians(type.arcDegrees()),
              type.lengthMetres());
    };
  }
}
