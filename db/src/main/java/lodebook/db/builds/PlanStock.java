package lodebook.db.builds;

import java.util.List;
import lodebook.assembly.plan.BatchTask;
import lodebook.assembly.plan.Candidate;
import lodebook.assembly.plan.LotSupply;

/// What rotors may be planned from, as the book was at one line of its history.
///
/// @param rings the rotors with what stands in them
/// @param candidates measured pieces that are free, by lot and number
/// @param unmeasured unmeasured magnets that are free, by lot
/// @param seen the last line of history when it was read
public record PlanStock(
    List<BatchTask.Ring> rings, List<Candidate> candidates, List<LotSupply> unmeasured, long seen) {
  public PlanStock {
    rings = List.copyOf(rings);
    candidates = List.copyOf(candidates);
    unmeasured = List.copyOf(unmeasured);
  }
}
