package lodebook.assembly.plan;

import java.util.List;
import java.util.Map;

/// Plans of all rotors of a batch.
///
/// @param plans a plan for each rotor's serial number, in the order of the task; the lower bounds
///   are for the pieces that each rotor was given
/// @param amplitudeSpread for each layout the standard deviation of its rotors' working amplitudes
///   over their mean
/// @param leftOver names of measured pieces that no rotor takes, in the order of the task
public record BatchPlan(
    Map<String, RotorPlan> plans, Map<String, Double> amplitudeSpread, List<String> leftOver) {}
