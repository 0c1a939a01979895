package lodebook.ui.desk.ring;

import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Numbering;
import lodebook.reports.ring.Face;
import lodebook.reports.ring.RingPicture;

/// Turns a picture of a ring and finds slots in it.
final class RingTurn {
  private RingTurn() {}

  /// The picture turned so that a slot stands at 12 o'clock, on whichever face is looked at.
  static RingPicture withOnTop(RingPicture picture, int slot) {
    double turn = Math.toDegrees(clockRadians(picture, slot));
    double sign = picture.face() == Face.MARKED ? -1 : 1;
    Layout turned =
        withFirstAt(picture.layout(), picture.layout().firstSlotClockDegrees() + sign * turn);
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

  private static Layout withFirstAt(Layout l, double degrees) {
    return new Layout(
        l.code(),
        l.revision(),
        l.polePairs(),
        l.segmentsPerPolePair(),
        l.focus(),
        l.numbering(),
        degrees - 360 * Math.floor(degrees / 360),
        l.firstFacing(),
        l.slotRadiusMetres(),
        l.magnetType(),
        l.sideMagnetType(),
        l.workingRadiusMetres(),
        l.probe(),
        l.spread(),
        l.adhesive(),
        l.adhesiveWorkingMinutes(),
        l.bodyTurns(),
        l.insertFrom(),
        l.workingAmplitudeTolerance());
  }

  /// Clock angle of a slot in the picture, radians from 12 o'clock clockwise.
  static double clockRadians(RingPicture picture, double slot) {
    Layout layout = picture.layout();
    double first = Math.toRadians(layout.firstSlotClockDegrees());
    double onward = 2 * Math.PI * (slot - 1) / layout.slots();
    return (picture.face() == Face.MARKED ? first : -first) + sense(picture) * onward;
  }

  /// +1 where slot numbers rise clockwise in the picture, −1 where they rise the other way.
  static int sense(RingPicture picture) {
    boolean clockwise = picture.layout().numbering() == Numbering.CLOCKWISE;
    return clockwise == (picture.face() == Face.MARKED) ? 1 : -1;
  }

  /// The slot nearest to a direction from the middle, x to the right and y down.
  static int slotAt(RingPicture picture, double x, double y) {
    double clock = Math.atan2(x, -y);
    double steps =
        sense(picture)
            * (clock - clockRadians(picture, 1))
            * picture.layout().slots()
            / (2 * Math.PI);
    return Math.floorMod(Math.round(steps), picture.layout().slots()) + 1;
  }
}
