package lodebook.db.builds;

import java.time.Instant;
import java.util.List;

/// An order to build a number of gears of one gear model.
///
/// @param code its number
/// @param gear the gear model, `CODE@REVISION`
/// @param gears how many
/// @param serials the pattern after which its rotors are numbered
/// @param openedAt when it was opened
/// @param rotors its rotors, inner before outer, gear by gear
public record Batch(
    String code, String gear, int gears, String serials, Instant openedAt, List<Rotor> rotors) {
  public Batch {
    rotors = List.copyOf(rotors);
  }
}
