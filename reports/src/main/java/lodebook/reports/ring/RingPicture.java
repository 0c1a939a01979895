package lodebook.reports.ring;

import java.util.List;
import java.util.Locale;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.magnet.MagnetType;
import org.jspecify.annotations.Nullable;

/// Everything a picture of a ring shows.
///
/// @param layout the ring's design
/// @param type its magnet type
/// @param sideType the type of magnets lying along the ring, or null where it is the same
/// @param title what stands in the middle of the ring, such as the rotor's number; may be empty
/// @param slots one entry for each slot, in any order
/// @param face the face looked at
/// @param highlighted a slot to point at, or null
/// @param readings what is shown in the band round the ring; empty for no band
/// @param language the language of the picture's words
public record RingPicture(
    Layout layout,
    MagnetType type,
    @Nullable MagnetType sideType,
    String title,
    List<DrawnSlot> slots,
    Face face,
    @Nullable Integer highlighted,
    List<ShownReading> readings,
    Locale language) {
  /// @throws IllegalArgumentException if a slot is missing, given twice, or not one of the layout's
  public RingPicture {
    slots = List.copyOf(slots);
    readings = List.copyOf(readings);
    boolean[] seen = new boolean[layout.slots() + 1];
    for (DrawnSlot drawn : slots) {
      int slot = drawn.slot();
      if (slot < 1 || slot > layout.slots() || seen[slot]) {
        throw new IllegalArgumentException(
            "the picture of layout "
                + layout.name()
                + " needs each slot from 1 to "
                + layout.slots()
                + " once; slot "
                + slot
                + " is one too many");
      }
      seen[slot] = true;
    }
    if (slots.size() != layout.slots()) {
      throw new IllegalArgumentException(
          "the picture of layout "
              + layout.name()
              + " needs each slot from 1 to "
              + layout.slots()
              + " once; "
              + slots.size()
              + " are given");
    }
  }

  /// The layout as designed: every magnet faces by the rule, no lots, no readings.
  public static RingPicture ofLayout(
      Layout layout, MagnetType type, @Nullable MagnetType sideType, Locale language) {
    List<DrawnSlot> slots =
        java.util.stream.IntStream.rangeClosed(1, layout.slots())
            .mapToObj(slot -> new DrawnSlot(slot, layout.ruleFacing(slot), null, null))
            .toList();
    return new RingPicture(
        layout,
        type,
        sideType,
        layout.code() + " rev " + layout.revision(),
        slots,
        Face.MARKED,
        null,
        List.of(),
        language);
  }

  /// The same seen on another face.
  public RingPicture seenOn(Face other) {
    return new RingPicture(
        layout, type, sideType, title, slots, other, highlighted, readings, language);
  }

  /// The same pointing at a slot, or at none.
  public RingPicture pointingAt(@Nullable Integer slot) {
    return new RingPicture(layout, type, sideType, title, slots, face, slot, readings, language);
  }

  /// The same with a band of readings.
  public RingPicture with(List<ShownReading> shown) {
    return new RingPicture(
        layout, type, sideType, title, slots, face, highlighted, shown, language);
  }

  /// Where slots stand in the picture.
  public RingView view() {
    return new RingView(layout, face);
  }

  /// The magnet type that stands in a slot.
  MagnetType typeAt(int slot) {
    return sideType != null && layout.liesAlong(slot) ? sideType : type;
  }
}
