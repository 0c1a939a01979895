package lodebook.ui.craft;

import java.util.List;
import java.util.Map;
import lodebook.assembly.plan.RotorPlan;
import lodebook.db.builds.Plan;
import org.jspecify.annotations.Nullable;

/// Plans as they were stored, with what only the planner knows.
///
/// @param plans the plans that count from now on, in the order of the wish
/// @param computed for each rotor what was computed
/// @param leftOver names of measured pieces that no rotor of a batch takes; empty for one rotor
/// @param amplitudeSpread for each layout of a batch the relative standard deviation of amplitudes
/// @param freelyMixed unwanted harmonics, mean of the rotors, where all lots may be mixed; null
///   where that is no other question
/// @param cutShort whether the clock ended the search, so that the same seed may give another plan
public record Planned(
    List<Plan> plans,
    Map<String, RotorPlan> computed,
    List<String> leftOver,
    Map<String, Double> amplitudeSpread,
    @Nullable Double freelyMixed,
    boolean cutShort) {
  public Planned {
    plans = List.copyOf(plans);
    computed = Map.copyOf(computed);
    leftOver = List.copyOf(leftOver);
  }

  /// Mean unwanted harmonics of the rotors.
  public double meanUnwanted() {
    return computed.values().stream()
        .mapToDouble(RotorPlan::unwantedHarmonics)
        .average()
        .orElse(Double.NaN);
  }
}
