package lodebook.db.trace;

import java.time.Instant;
import java.util.List;
import org.jspecify.annotations.Nullable;

/// A thing in a trace, with its branches one way.
///
/// @param code its number; a piece is `LOT/NUMBER`
/// @param kind `lot`, `supplier lot`, `piece`, `rotor`, `unit`, `batch`, `survey`, `meter`, `tray`,
///   `layout`, `gear` or another word of [lodebook.db.code.CodeKind]
/// @param at when it was recorded, or null where nobody recorded it by itself
/// @param state its state in a word, empty where it has none
/// @param from since when it is or was part of the node above, or null where that has no meaning
/// @param to until when, or null while it is
/// @param magnets how many unmeasured magnets it stands for, or null where it is no such
/// @param branches what it was made from or went into, in order
public record TraceNode(
    String code,
    String kind,
    @Nullable Instant at,
    String state,
    @Nullable Instant from,
    @Nullable Instant to,
    @Nullable Integer magnets,
    List<TraceNode> branches) {
  public TraceNode {
    branches = List.copyOf(branches);
  }
}
