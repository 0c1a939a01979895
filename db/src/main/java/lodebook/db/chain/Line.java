package lodebook.db.chain;

import java.time.Instant;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import lodebook.db.code.CodeText;
import org.jspecify.annotations.Nullable;

/// What an operation writes into its line of history, in the order in which it says it.
///
/// `field` and `row` hold what is needed to do the operation again; `now` says in which state
/// something is from here on, and the verification compares the last such statement of each thing
/// with the tables.
public final class Line {
  private final Set<String> subjects = new LinkedHashSet<>();
  private final List<List<String>> items = new ArrayList<>();

  /// The line speaks of this number of the shop (or piece, `LOT/NUMBER`).
  public Line subject(String code) {
    subjects.add(CodeText.fold(code));
    return this;
  }

  /// A value that the operation was given or decided; null is left out.
  public Line field(String name, @Nullable Object content) {
    if (content != null) {
      items.add(List.of("field", name, String.valueOf(content)));
    }
    return this;
  }

  /// One row of many alike, its values in the file's order.
  public Line row(List<String> values) {
    List<String> item = new ArrayList<>(values.size() + 1);
    item.add("row");
    item.addAll(values);
    items.add(item);
    return this;
  }

  /// From now on the thing is so: kind such as `lot` or `slot`, what such as `L-2404` or
  /// `R-0007/3`, how such as `accepted`; an empty `how` says that it is no more.
  public Line now(String kind, String what, String how) {
    items.add(List.of("now", kind, what, how));
    return this;
  }

  /// The folded numbers the line speaks of.
  public Set<String> subjects() {
    return subjects;
  }

  /// The whole text.
  ///
  /// @param head what every line begins with
  public String text(Head head) {
    List<List<String>> all = new ArrayList<>(head.items());
    subjects.forEach(s -> all.add(List.of("subject", s)));
    all.addAll(items);
    return LineText.encode(all);
  }

  /// What every line begins with, in this order.
  ///
  /// @param sequence number of the line, from 1
  /// @param statedAt when the person says it happened
  /// @param recordedAt when it was recorded
  /// @param initials who, empty where nobody signs (creating the book, the first person)
  /// @param station at which computer
  /// @param operation what was done, such as `lot accept`
  public record Head(
      long sequence,
      Instant statedAt,
      Instant recordedAt,
      String initials,
      String station,
      String operation) {
    List<List<String>> items() {
      return List.of(
          List.of("line", Long.toString(sequence)),
          List.of("stated", statedAt.toString()),
          List.of("recorded", recordedAt.toString()),
          List.of("who", initials),
          List.of("station", station),
          List.of("operation", operation));
    }
  }
}
