package lodebook.assembly.plan;

import java.util.List;
import org.jspecify.annotations.Nullable;

/// Where every magnet of a rotor goes.
///
/// The three harmonics are ratios: root mean square of the radial field's harmonics on the working
/// circle that an ideal ring does not have, over that of the working wave. For unmeasured magnets
/// they are what the spread of their lot lets expect.
///
/// @param placements one for each slot, slot 1 first
/// @param seed seed of the search
/// @param unwantedHarmonics of this plan
/// @param lowerBound proven for every order of these pieces, or null where none is proven
/// @param asTheyCome of the first pieces in the order of their numbers
/// @param workingAmplitudeTesla amplitude of the working wave
/// @param targetAmplitudeTesla the amplitude that was wanted
/// @param withinTolerance whether the amplitude is within the layout's tolerance of the wanted one
/// @param lots lots in the rotor, sorted
/// @param freelyMixed harmonics of a plan that may take any lot, where fewer were taken than
///   offered; otherwise null. The difference is the price of few lots.
public record RotorPlan(
    List<Placement> placements,
    long seed,
    double unwantedHarmonics,
    @Nullable Double lowerBound,
    double asTheyCome,
    double workingAmplitudeTesla,
    double targetAmplitudeTesla,
    boolean withinTolerance,
    List<String> lots,
    @Nullable Double freelyMixed) {
  public RotorPlan {
    placements = List.copyOf(placements);
    lots = List.copyOf(lots);
  }
}
