package lodebook.db.builds;

import java.time.Instant;
import java.util.List;
import org.jspecify.annotations.Nullable;

/// The plan that counts for a rotor.
///
/// @param rotor the rotor
/// @param seed seed of the search
/// @param settings how it was asked for
/// @param stockLine line of the history up to which the stock was seen
/// @param programVersion version of the program that planned
/// @param unwantedHarmonics ratio, of this plan
/// @param lowerBound ratio, proven for every order of its pieces, or null
/// @param asTheyCome ratio, of the pieces in the order of their numbers
/// @param workingAmplitudeTesla amplitude of the working wave
/// @param by who planned
/// @param at when, as stated
/// @param slots the slots that it fills, rising
public record Plan(
    String rotor,
    long seed,
    String settings,
    long stockLine,
    String programVersion,
    double unwantedHarmonics,
    @Nullable Double lowerBound,
    double asTheyCome,
    double workingAmplitudeTesla,
    String by,
    Instant at,
    List<PlannedSlot> slots) {
  public Plan {
    slots = List.copyOf(slots);
  }

  /// Slots whose piece was put on hold or is gone since: the rotor waits for a new plan.
  public List<PlannedSlot> spoilt() {
    return slots.stream()
        .filter(slot -> slot.state().equals("on hold") || slot.state().equals("gone"))
        .toList();
  }
}
