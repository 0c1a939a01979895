package lodebook.assembly.layout;

import java.util.List;
import java.util.stream.IntStream;
import lodebook.assembly.field.Pose;
import lodebook.assembly.field.PosedBody;
import lodebook.assembly.field.Vector3;
import lodebook.assembly.magnet.MagnetBody;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Shape;
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

  /// How far the body in a slot is turned from square to the ring, radians, for a facing.
  ///
  /// Where bodies turn, the magnetisation lies at the type's own angle from the thickness. Where
  /// they don't, the thickness lies along the radius whatever the facing, and along the ring for
  /// magnets of the side type. An arc segment always stays concentric.
  public double bodyTurnRadians(int slot, Facing facing) {
    MagnetType type = typeAt(slot);
    if (type.shape() == Shape.ARC) {
      return 0;
    }
    if (layout.bodyTurns()) {
      return facing.radians() - Math.toRadians(type.magnetisationDegrees());
    }
    return sideType != null && layout.liesAlong(slot) ? Math.PI / 2 : 0;
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
