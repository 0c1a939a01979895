package lodebook.ui.desk.bench;

import java.util.List;
import lodebook.db.builds.RotorShown;

/// Where a rotor stands when somebody sits down at it.
public sealed interface BenchLoad {
  /// There is a step to do.
  record Ready(BenchStep step) implements BenchLoad {}

  /// Every slot holds a magnet and is read as far as the bench reads.
  record Full(RotorShown rotor) implements BenchLoad {}

  /// There is no plan.
  ///
  /// @param lots accepted lots of its magnet types, from which it can be planned
  record Unplanned(RotorShown rotor, List<String> lots) implements BenchLoad {
    public Unplanned {
      lots = List.copyOf(lots);
    }
  }

  /// The plan lost pieces; it must be planned anew.
  ///
  /// @param lots the lots that the plan took from
  /// @param slots the slots whose piece is gone or on hold
  record Spoilt(RotorShown rotor, List<String> lots, List<Integer> slots) implements BenchLoad {
    public Spoilt {
      lots = List.copyOf(lots);
      slots = List.copyOf(slots);
    }
  }
}
