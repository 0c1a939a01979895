package lodebook.assembly.plan;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/// Deals the pieces of one bucket to the rings that draw from it, as a start for the search.
///
/// The pieces nearest to each other in strength are taken. Where a ring has classes of slots that
/// may differ at no cost, each class gets a run of neighbours in strength, and runs are exchanged
/// between rings until their amplitudes match. Where it has only one, pieces are dealt to and fro,
/// so that all rings get the same mixture.
final class BatchDeal {
  /// Slots of one class of one ring, with the pieces dealt to them.
  ///
  /// @param ring index of the ring
  /// @param slots slots of the ring, from 0
  /// @param weight what a tesla more in each of them adds to the ring's |w·s|, relative to its
  ///   target
  /// @param pieces one for each slot
  record Run(int ring, List<Integer> slots, double weight, List<Source> pieces) {
    double share() {
      return weight * pieces.stream().mapToDouble(Source::remanence).average().orElse(0);
    }
  }

  private final List<Source> left = new ArrayList<>();
  private final List<Run> runs = new ArrayList<>();

  /// @param pieces what may be dealt; unmeasured ones are taken only where the others don't suffice
  /// @param classes classes of slots of each ring that draws from the bucket, still without pieces
  /// @param toAndFro whether all rings get the same mixture instead of runs of neighbours
  BatchDeal(List<Source> pieces, List<Run> classes, boolean toAndFro) {
    int needed = classes.stream().mapToInt(run -> run.slots().size()).sum();
    List<Source> measured = pieces.stream().filter(each -> each.piece() != null).toList();
    List<Source> sorted = new ArrayList<>(measured);
    pieces.stream()
        .filter(each -> each.piece() == null)
        .limit(Math.max(0, needed - measured.size()))
        .forEach(sorted::add);
    sorted.sort(Comparator.comparingDouble(Source::remanence));
    int from = closest(sorted, needed);
    left.addAll(sorted.subList(0, from));
    left.addAll(sorted.subList(from + needed, sorted.size()));
    List<Source> taken = sorted.subList(from, from + needed);
    if (toAndFro) {
      dealToAndFro(taken, classes);
    } else {
      int at = 0;
      for (Run each : classes) {
        int end = at + each.slots().size();
        runs.add(new Run(each.ring(), each.slots(), each.weight(), taken.subList(at, end)));
        at = end;
      }
    }
  }

  /// Where the window of least sum of squares begins.
  private static int closest(List<Source> sorted, int needed) {
    int best = 0;
    double least = Double.MAX_VALUE;
    double sum = 0;
    double squares = 0;
    for (int end = 0; end < sorted.size(); end++) {
      double in = sorted.get(end).remanence();
      sum += in;
      squares += in * in;
      if (end >= needed) {
        double out = sorted.get(end - needed).remanence();
        sum -= out;
        squares -= out * out;
      }
      if (end >= needed - 1 && needed > 0 && squares - sum * sum / needed < least) {
        least = squares - sum * sum / needed;
        best = end - needed + 1;
      }
    }
    return best;
  }

  private void dealToAndFro(List<Source> taken, List<Run> classes) {
    List<List<Source>> hands = new ArrayList<>();
    classes.forEach(each -> hands.add(new ArrayList<>()));
    int at = 0;
    for (int round = 0; at < taken.size(); round++) {
      for (int i = 0; i < hands.size() && at < taken.size(); i++) {
        int hand = round % 2 == 0 ? i : hands.size() - 1 - i;
        if (hands.get(hand).size() < classes.get(hand).slots().size()) {
          hands.get(hand).add(taken.get(at));
          at++;
        }
      }
    }
    for (int i = 0; i < hands.size(); i++) {
      Run run = classes.get(i);
      runs.add(new Run(run.ring(), run.slots(), run.weight(), hands.get(i)));
    }
  }

  /// Runs with their pieces.
  List<Run> runs() {
    return runs;
  }

  /// Measured pieces and unmeasured ones that were not dealt.
  List<Source> left() {
    return left;
  }
}
