package lodebook.assembly.layout;

import java.util.List;
import java.util.stream.IntStream;
import lodebook.assembly.field.Pose;
import lodebook.assembly.field.PosedBody;
import lodebook.assembly.field.Vector3;
import lodebook.assembly.magnet.MagnetBody;
import lodebook.assembly.magnet.MagnetType;
import org.jspecify.annotations.Nullable;

/// A layout together with the magnet types it names: everything the field of its ring depends on,
/// but for how strong each magnet is and which way it faces.
///
/// Frame: the ring's axis is z, towards the marked face; slot 1 stands at angle 0 and angles rise
/// with slot numbers, whatever the numbering on the marked face.
///
/// @param layout the layout
/// @param mainType the type it names for its magnets
/// @param sideType the type it names for magnets lying along the ring, or null
public record RingDesign(Layout layout, MagnetType mainType, @Nullable MagnetType sideType) {

  /// A design that can be built.
  ///
  /// @throws IllegalArgumentException if it cannot, with everything that is wrong, a sentence a
  ///   line
  public static RingDesign checked(
      Layout layout, MagnetType mainType, @Nullable MagnetType sideType) {
    RingDesign design = new RingDesign(layout, mainType, sideType);
    List<String> faults = design.faults();
    if (!faults.isEmpty()) {
      throw new IllegalArgumentException(String.join("\n", faults));
    }
    return design;
  }

  /// Everything that keeps a ring from being built from this design, each a sentence that names the
  /// layout, the slots or the key, and the remedy; empty where nothing does.
  public List<String> faults() {
    return LayoutRule.faults(this);
  }

  /// Number of slots.
  public int slots() {
    return layout.slots();
  }

  /// The magnet type that belongs into a slot.
  public MagnetType typeAt(int slot) {
    return sideType != null && layout.liesAlong(slot) ? sideType : mainType;
  }

  /// Facings by the rule, from slot 1 on.
  public List<Facing> ruleFacings() {
    return IntStream.rangeClosed(1, slots()).mapToObj(layout::ruleFacing).toList();
  }

  /// Whether a slot holds a magnet of the side type.
  public boolean isSide(int slot) {
    return sideType != null && layout.liesAlong(slot);
  }

  /// How far the body in a slot is turned from square to the ring, radians, for a facing.
  ///
  /// Where bodies turn, a square block's magnetisation lies at the type's own angle from its
  /// thickness. Everything else stands with its thickness along the radius, along the ring for
  /// magnets of the side type, whatever the facing; an arc segment always stays concentric, and a
  /// rod looks the same at any turn.
  public double bodyTurnRadians(int slot, Facing facing) {
    MagnetType type = typeAt(slot);
    return switch (type.shape()) {
      case ARC, ROD -> 0;
      case BLOCK, DISC -> {
        if (layout.bodyTurns() && FacingRule.canStandAnyhow(type)) {
          yield facing.radians() - Math.toRadians(type.magnetisationDegrees());
        }
        yield isSide(slot) ? Math.PI / 2 : 0;
      }
    };
  }

  /// The same design with its magnets at another distance from the axis.
  RingDesign atSlotRadius(double metres) {
    return new RingDesign(layout.withSlotRadius(metres), mainType, sideType);
  }

  /// The body in a slot when it faces as the rule says.
  public PosedBody bodyAt(int slot) {
    return bodyAt(slot, layout.ruleFacing(slot));
  }

  /// The body in a slot for a facing, in the ring's frame.
  public PosedBody bodyAt(int slot, Facing facing) {
    double angle = layout.angleFromFirstRadians(slot);
    Vector3 centre = new Vector3(layout.slotRadiusMetres(), 0, 0).turnedAboutZ(angle);
    return new PosedBody(
        MagnetBody.of(typeAt(slot)),
        Pose.turnedAboutZ(centre, angle + bodyTurnRadians(slot, facing)));
  }
}
