package lodebook.ui.paper;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import lodebook.assembly.layout.RingDesign;
import lodebook.db.builds.RecordedPlacement;
import lodebook.db.builds.RotorShown;
import lodebook.reports.ring.DrawnSlot;
import lodebook.reports.ring.Face;
import lodebook.reports.ring.RingPicture;

/// Pictures of rings as the book records them.
public final class RingPictures {
  private RingPictures() {}

  /// A layout as designed.
  public static RingPicture of(RingDesign design, Locale language) {
    return RingPicture.ofLayout(design.layout(), design.mainType(), design.sideType(), language);
  }

  /// A rotor as it stands: empty slots are drawn empty.
  public static RingPicture of(RotorShown rotor, Locale language) {
    RingDesign design = rotor.design();
    Map<Integer, RecordedPlacement> standing = new HashMap<>();
    rotor.standing().forEach(p -> standing.put(p.slot(), p));
    List<DrawnSlot> slots = new ArrayList<>();
    for (int slot = 1; slot <= design.slots(); slot++) {
      RecordedPlacement placement = standing.get(slot);
      slots.add(
          placement == null
              ? new DrawnSlot(slot, null, null, null)
              : new DrawnSlot(slot, placement.facing(), placement.lot(), null));
    }
    return new RingPicture(
        design.layout(),
        design.mainType(),
        design.sideType(),
        rotor.rotor().code(),
        slots,
        Face.MARKED,
        null,
        List.of(),
        language);
  }
}
