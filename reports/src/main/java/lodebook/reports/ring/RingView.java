package lodebook.reports.ring;

import java.awt.geom.AffineTransform;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Numbering;

/// Where slots stand in a picture, x to the right and y down from the ring's centre.
///
/// On the marked face slot 1 stands at the layout's clock angle and numbers rise as the layout
/// says. The other face is mirrored at the line through 12 and 6 o'clock.
///
/// @param layout the ring
/// @param face the face looked at
public record RingView(Layout layout, Face face) {
  /// +1 where slot numbers rise clockwise in the picture, −1 where they rise the other way.
  public int sense() {
    boolean clockwise = layout.numbering() == Numbering.CLOCKWISE;
    return clockwise == (face == Face.MARKED) ? 1 : -1;
  }

  /// Clock angle, radians from 12 o'clock clockwise in the picture, of a place between slots.
  ///
  /// @param slot slot number; 2.5 stands midway between slots 2 and 3
  public double clockRadians(double slot) {
    double first = Math.toRadians(layout.firstSlotClockDegrees());
    double onward = 2 * Math.PI * (slot - 1) / layout.slots();
    return (face == Face.MARKED ? first : -first) + sense() * onward;
  }

  /// From a slot's own frame (first coordinate away from the axis, second towards the next slot) to
  /// the picture.
  AffineTransform slotFrame(double slot) {
    double sin = Math.sin(clockRadians(slot));
    double cos = Math.cos(clockRadians(slot));
    return new AffineTransform(sin, -cos, sense() * cos, sense() * sin, 0, 0);
  }
}
