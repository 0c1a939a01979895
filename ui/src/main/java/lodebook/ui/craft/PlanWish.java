package lodebook.ui.craft;

import java.util.List;
import java.util.Locale;
import lodebook.assembly.plan.MixPolicy;
import org.jspecify.annotations.Nullable;

/// What is to be planned, and how.
///
/// @param rotors the rotors
/// @param lots lots to take from
/// @param mix which lots may go together
/// @param seed the same seed gives the same plan from the same stock
/// @param seconds how long to search at most, or null for the usual effort
public record PlanWish(
    List<String> rotors, List<String> lots, MixPolicy mix, long seed, @Nullable Double seconds) {
  public PlanWish {
    rotors = List.copyOf(rotors);
    lots = List.copyOf(lots);
  }

  /// The wish as it is kept with the plan.
  String settings() {
    return "--from "
        + String.join(",", lots)
        + " --mix "
        + mix.name().toLowerCase(Locale.ROOT)
        + (seconds == null ? "" : " --seconds " + seconds);
  }
}
