package lodebook.db.surveys;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.db.builds.RecordedPlacement;
import lodebook.db.builds.RecordedPlacement.Ended;

/// What stood in a rotor's slots at a line of its history.
///
/// A placement stands from its own line until the line that ended it. One that was corrected never
/// stood; what corrected it stands from where the wrong record began.
final class BuiltRings {
  private final List<RecordedPlacement> placements;
  private final Map<Long, Long> from = new HashMap<>();

  BuiltRings(List<RecordedPlacement> placements) {
    this.placements = placements;
    for (RecordedPlacement placement : placements) {
      from.merge(placement.id(), placement.sequence(), Math::min);
      Ended ended = placement.ended();
      if (ended != null && corrected(placement) && ended.supersededBy() != null) {
        from.put(ended.supersededBy(), from.getOrDefault(placement.id(), placement.sequence()));
      }
    }
  }

  private static boolean corrected(RecordedPlacement placement) {
    return placement.ended() != null && placement.ended().kind().equals("corrected");
  }

  /// The placements that stood just before a line, by slot.
  Map<Integer, RecordedPlacement> before(long sequence) {
    Map<Integer, RecordedPlacement> standing = new HashMap<>();
    for (RecordedPlacement placement : placements) {
      Ended ended = placement.ended();
      boolean begun = from.getOrDefault(placement.id(), placement.sequence()) < sequence;
      boolean over = corrected(placement) || (ended != null && ended.sequence() < sequence);
      if (begun && !over) {
        standing.put(placement.slot(), placement);
      }
    }
    return standing;
  }
}
