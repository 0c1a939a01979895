package lodebook.db.history;

import java.time.Instant;
import java.util.List;

/// One line of history.
///
/// @param sequence its number
/// @param statedAt when it happened, as the person says
/// @param recordedAt when it was recorded
/// @param initials who, empty where nobody signed
/// @param station at which computer
/// @param operation what was done, such as `lot accept`
/// @param fields names and values, in the order in which the operation gave them
/// @param rows how many rows an import had
/// @param states what was so from then on, each as kind, what, how
/// @param hash the line's hash
public record HistoryEntry(
    long sequence,
    Instant statedAt,
    Instant recordedAt,
    String initials,
    String station,
    String operation,
    List<Field> fields,
    int rows,
    List<State> states,
    String hash) {

  /// A value of the line.
  ///
  /// @param name its name
  /// @param content its value as text
  public record Field(String name, String content) {}

  /// What was so from the line on.
  ///
  /// @param kind such as `lot`
  /// @param what such as `L-2404`
  /// @param how such as `accepted`; empty where it was no more
  public record State(String kind, String what, String how) {}
}
