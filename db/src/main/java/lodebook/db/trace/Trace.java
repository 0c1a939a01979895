package lodebook.db.trace;

import java.time.Instant;
import java.util.List;
import org.jspecify.annotations.Nullable;

/// One tree each way.
///
/// @param code the number that was asked for, as the book shows it
/// @param kind what it is
/// @param at when it was recorded, or null
/// @param state its state, empty where it has none
/// @param madeFrom what it was made from
/// @param wentInto what it went into
/// @param others things of the same number that were not meant: a supplier's lot that equals one of
///   the shop's own numbers; each as the shop's lot it belongs to
public record Trace(
    String code,
    String kind,
    @Nullable Instant at,
    String state,
    List<TraceNode> madeFrom,
    List<TraceNode> wentInto,
    List<TraceNode> others) {
  public Trace {
    madeFrom = List.copyOf(madeFrom);
    wentInto = List.copyOf(wentInto);
    others = List.copyOf(others);
  }
}
