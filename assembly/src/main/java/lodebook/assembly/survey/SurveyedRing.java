package lodebook.assembly.survey;

import java.util.Map;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.RingDesign;
import org.jspecify.annotations.Nullable;

/// A ring as the record says it was built when its readings were taken.
///
/// @param design the layout with its magnet types; its rule says how each magnet should face
/// @param magnets the magnets that stand in the ring by slot number; slots that are not named are
///   empty
public record SurveyedRing(RingDesign design, Map<Integer, PlacedMagnet> magnets) {
  public SurveyedRing {
    magnets = Map.copyOf(magnets);
    for (int slot : magnets.keySet()) {
      if (slot < 1 || slot > design.slots()) {
        throw new IllegalArgumentException(
            "layout "
                + design.layout().name()
                + " has slots 1 to "
                + design.slots()
                + ", the record has a magnet in slot "
                + slot);
      }
    }
  }

  /// The magnet of a slot, or null.
  public @Nullable PlacedMagnet at(int slot) {
    return magnets.get(slot);
  }

  /// The design without its magnet types.
  public Layout layout() {
    return design.layout();
  }
}
