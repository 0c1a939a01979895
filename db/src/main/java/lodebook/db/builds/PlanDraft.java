package lodebook.db.builds;

import java.util.Map;
import lodebook.assembly.plan.RotorPlan;

/// A plan that is to count for a rotor.
///
/// @param rotor the rotor
/// @param plan which piece goes where
/// @param fillSteps for each slot that is to be filled when it is, from 1
/// @param remarks for slots that need one, what the builder is told, at most 400 characters
/// @param settings how it was asked for, such as `--from L-1 --mix few`
/// @param programVersion version of the program that planned
public record PlanDraft(
    String rotor,
    RotorPlan plan,
    Map<Integer, Integer> fillSteps,
    Map<Integer, String> remarks,
    String settings,
    String programVersion) {
  public PlanDraft {
    fillSteps = Map.copyOf(fillSteps);
    remarks = Map.copyOf(remarks);
  }
}
