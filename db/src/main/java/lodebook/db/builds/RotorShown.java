package lodebook.db.builds;

import java.util.List;
import lodebook.assembly.layout.RingDesign;

/// A rotor with everything that was ever put into it.
///
/// @param rotor the rotor
/// @param design its layout and magnet types
/// @param placements what stands or stood in it, by slot and in the order of recording
public record RotorShown(Rotor rotor, RingDesign design, List<RecordedPlacement> placements) {
  public RotorShown {
    placements = List.copyOf(placements);
  }

  /// What stands in it now, by slot.
  public List<RecordedPlacement> standing() {
    return placements.stream().filter(each -> each.ended() == null).toList();
  }
}
