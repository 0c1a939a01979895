package lodebook.assembly.survey;

import java.util.List;
import lodebook.assembly.layout.ProbePoint;

/// A reading that would help.
///
/// @param point where to measure
/// @param why the reason
/// @param magnets the faults that the reading parts or shows, likeliest first; may be empty
public record MeasureNext(ProbePoint point, Why why, List<NamedFault> magnets) {
  public MeasureNext {
    magnets = List.copyOf(magnets);
  }

  /// Reasons for one more reading.
  public enum Why {
    /// It parts the likeliest explanations.
    PARTS_EXPLANATIONS,
    /// Nothing read so far shows whether this magnet is right.
    NOT_YET_SHOWN,
    /// An empty pocket there would read nearly the same: look, or read there.
    EMPTY_POCKET_ALIKE,
    /// The reading there belongs to nothing: take it again.
    READ_AGAIN,
    /// Slots must be counted from the index mark, or the fault may be in another slot.
    AGAINST_INDEX_MARK
  }
}
