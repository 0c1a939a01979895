package lodebook.ui.desk.ring;

import lodebook.assembly.layout.Layout;
import lodebook.reports.ring.Face;
import lodebook.reports.ring.RingPicture;

/// Turns a picture of a ring and finds slots in it.
final class RingTurn {
  private RingTurn() {}

  /// The picture turned so that a slot stands at 12 o'clock, on whichever face is looked at.
  static RingPicture withOnTop(RingPicture picture, int slot) {
    Layout layout = picture.layout();
    double turn = Math.toDegrees(picture.view().clockRadians(slot));
    double degrees =
        layout.firstSlotClockDegrees() + (picture.face() == Face.MARKED ? -turn : turn);
    Layout turned = layout.numbered(layout.numbering(), degrees - 360 * Math.floor(degrees / 360));
    return new RingPicture(
        turned,
        picture.type(),
        picture.sideType(),
        picture.title(),
        picture.slots(),
        picture.face(),
        picture.highlighted(),
        picture.readings(),
        picture.language());
  }

  /// The slot nearest to a direction from the middle, x to the right and y down.
  static int slotAt(RingPicture picture, double x, double y) {
    double clock = Math.atan2(x, -y);
    double steps =
        picture.view().sense()
            * (clock - picture.view().clockRadians(1))
            * picture.layout().slots()
            / (2 * Math.PI);
    return Math.floorMod(Math.round(steps), picture.layout().slots()) + 1;
  }
}
