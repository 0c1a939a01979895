package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.PriorityQueue;

/// Keeps the highest scores out of many.
///
/// @param <T> what is scored
final class Best<T> {
  /// @param <T> what is scored
  /// @param score higher is better
  /// @param what what is scored
  record Scored<T>(double score, T what) {}

  private final int limit;
  private final PriorityQueue<Scored<T>> queue =
      new PriorityQueue<>(Comparator.comparingDouble((Scored<T> s) -> s.score()));

  Best(int limit) {
    this.limit = limit;
  }

  /// Score that a newcomer has to exceed.
  double bar() {
    Scored<T> least = queue.peek();
    return least == null || queue.size() < limit ? Double.NEGATIVE_INFINITY : least.score();
  }

  void offer(double score, T what) {
    queue.add(new Scored<>(score, what));
    if (queue.size() > limit) {
      queue.remove();
    }
  }

  /// Highest first.
  List<Scored<T>> sorted() {
    List<Scored<T>> list = new ArrayList<>(queue);
    list.sort(Comparator.comparingDouble((Scored<T> s) -> -s.score()));
    return list;
  }
}
