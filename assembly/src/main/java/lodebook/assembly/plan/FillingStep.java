package lodebook.assembly.plan;

import java.util.List;
import org.jspecify.annotations.Nullable;

/// One magnet going into its slot while those of earlier steps stand.
///
/// @param step number of the step, from 1
/// @param slot the slot it goes into
/// @param force what it feels from those that stand
/// @param behaviour what it does when the hand lets go
/// @param wall the wall on which it presses, or null where it presses on none
/// @param neighbours what the magnets before and after feel, where those slots are filled
public record FillingStep(
    int step,
    int slot,
    SlotForce force,
    Behaviour behaviour,
    @Nullable Wall wall,
    List<SlotForce> neighbours) {
  public FillingStep {
    neighbours = List.copyOf(neighbours);
  }
}
