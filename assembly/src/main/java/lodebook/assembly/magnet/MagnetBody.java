package lodebook.assembly.magnet;

import lodebook.assembly.field.Block;
import lodebook.assembly.field.Body;

/// The body of a magnet type as the field computation sees it.
public final class MagnetBody {
  private MagnetBody() {}

  /// The body in its own frame: x along the thickness (or, for rods and arcs, the radius), z along
  /// the rotor's axis.
  public static Body of(MagnetType type) {
    return switch (type.shape()) {
      case BLOCK -> new Block(type.thicknessMetres(), type.widthMetres(), type.lengthMetres());
      case DISC, ROD, ARC ->
          throw new IllegalArgumentException("type " + type.code() + " is not a block");
    };
  }
}
