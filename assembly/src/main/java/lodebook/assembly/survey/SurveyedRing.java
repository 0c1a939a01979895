package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.magnet.MagnetType;
import org.jspecify.annotations.Nullable;

/// A ring as the record says it was built when its readings were taken.
///
/// @param layout the design; its rule says how each magnet should face
/// @param type the layout's magnet type
/// @param sideType the type of magnets lying along the ring; the same as `type` where the layout
///   names none
/// @param slots one entry per slot, from slot 1; null where no magnet stands
public record SurveyedRing(
    Layout layout, MagnetType type, MagnetType sideType, List<@Nullable PlacedMagnet> slots) {
  public SurveyedRing {
    if (slots.size() != layout.slots()) {
      throw new IllegalArgumentException(
          "layout "
              + layout.name()
              + " has "
              + layout.slots()
              + " slots, the record has "
              + slots.size());
    }
    slots = Collections.unmodifiableList(new ArrayList<>(slots));
  }

  /// The magnet of a slot, or null.
  public @Nullable PlacedMagnet at(int slot) {
    return slots.get(slot - 1);
  }

  /// Magnet type that belongs into a slot.
  public MagnetType typeAt(int slot) {
    return layout.liesAlong(slot) ? sideType : type;
  }
}
