package lodebook.db.builds;

import java.util.List;

/// What placing came to.
///
/// @param rotor the rotor
/// @param slots the slots that were filled or changed, rising
/// @param filled how many slots hold a magnet now
/// @param of how many slots there are
/// @param takenOut pieces that stand in no slot any more and lie in no cell, `LOT/NUMBER`
public record Placed(String rotor, List<Integer> slots, int filled, int of, List<String> takenOut) {
  public Placed {
    slots = List.copyOf(slots);
    takenOut = List.copyOf(takenOut);
  }
}
