package lodebook.assembly.plan;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/// Shares the lots of one magnet type among the rotors of a batch.
///
/// As few lots as can serve all rotors are drawn from, each rotor from one lot where that can be,
/// the rotors spread over those lots in proportion to what they hold; rotors that no single lot can
/// serve get two lots of what is left, then three, and so on. Lots that are apart never meet.
final class BatchLots {
  private static final int MOST_SETS = 2000;

  private final BatchTask task;
  private final String type;
  private final BatchStock stock;
  private final Map<Set<String>, List<Integer>> served = new LinkedHashMap<>();
  private final List<Integer> unserved = new ArrayList<>();
  private Map<String, Integer> left = new LinkedHashMap<>();

  /// How many pieces of each lot the rotors of each set of lots need.
  private final Map<Set<String>, Map<String, Integer>> taken = new LinkedHashMap<>();

  /// Rotors that draw from the same pieces.
  ///
  /// @param rings indices into the task's rings
  /// @param pieces what they may draw, at least as many as they need; pieces that one of them must
  ///   have among them
  record Bucket(List<Integer> rings, List<Source> pieces) {}

  BatchLots(BatchTask task, String type) {
    this.task = task;
    this.type = type;
    stock = new BatchStock(task, type);
    List<String> lots = new ArrayList<>(stock.lots());
    if (task.mix() == MixPolicy.FREE) {
      begin();
      serve(task.apart().largest(new LinkedHashSet<>(lots), Set.of()));
      return;
    }
    lots.sort(Comparator.comparingInt((String lot) -> -stock.of(lot).size()));
    begin();
    for (int drawn = 1; drawn <= lots.size(); drawn++) {
      begin();
      serve(setsOf(lots.subList(0, drawn), 1));
      if (unserved.isEmpty()) {
        return;
      }
    }
    for (int size = 2; task.mix() == MixPolicy.FEW && size <= lots.size(); size++) {
      serve(setsOf(lots, size));
    }
  }

  private void begin() {
    served.clear();
    taken.clear();
    left = new LinkedHashMap<>();
    stock.lots().forEach(lot -> left.put(lot, stock.of(lot).size()));
    unserved.clear();
    for (int ring = 0; ring < task.rings().size(); ring++) {
      if (slots(ring) > 0) {
        unserved.add(ring);
      }
    }
  }

  /// Gives each rotor that has nothing yet one of some sets of lots, where one suffices.
  private void serve(List<Set<String>> sets) {
    for (int ring : List.copyOf(unserved)) {
      Set<String> there = stock.lotsIn(ring);
      Set<String> best = null;
      for (Set<String> lots : sets) {
        if (left(lots) >= need(ring)
            && mayGo(lots, there)
            && (best == null || isBetter(lots, best, there))) {
          best = lots;
        }
      }
      if (best != null) {
        unserved.removeIf(each -> each == ring);
        served.computeIfAbsent(best, lots -> new ArrayList<>()).add(ring);
        take(best, need(ring));
      }
    }
  }

  private boolean mayGo(Set<String> lots, Set<String> there) {
    return task.mix() == MixPolicy.NEVER
        ? lots.containsAll(there)
        : task.apart().allow(lots, there);
  }

  private boolean isBetter(Set<String> lots, Set<String> best, Set<String> there) {
    boolean here = lots.containsAll(there);
    return here == best.containsAll(there) ? left(lots) > left(best) : here;
  }

  /// Takes so many pieces in proportion to what the lots of a set still hold.
  private void take(Set<String> lots, int pieces) {
    int wanted = pieces;
    int rest = left(lots);
    Map<String, Integer> own = taken.computeIfAbsent(lots, each -> new LinkedHashMap<>());
    for (String lot : lots) {
      int has = left.getOrDefault(lot, 0);
      int share = rest == 0 ? 0 : (int) Math.ceilDiv((long) wanted * has, rest);
      left.merge(lot, -share, Integer::sum);
      own.merge(lot, share, Integer::sum);
      wanted -= share;
      rest -= has;
    }
  }

  private int left(Collection<String> lots) {
    return lots.stream().mapToInt(lot -> left.getOrDefault(lot, 0)).sum();
  }

  private int slots(int ring) {
    return task.rings().get(ring).emptySlots(type).size();
  }

  private int need(int ring) {
    return slots(ring) - stock.wishedFor(ring).size();
  }

  private static List<Set<String>> setsOf(List<String> lots, int size) {
    List<Set<String>> sets = new ArrayList<>();
    choose(lots, 0, size, new LinkedHashSet<>(), sets);
    return sets;
  }

  private static void choose(
      List<String> lots, int from, int size, Set<String> soFar, List<Set<String>> sets) {
    if (size == 0) {
      sets.add(new LinkedHashSet<>(soFar));
      return;
    }
    for (int i = from; i <= lots.size() - size && sets.size() < MOST_SETS; i++) {
      soFar.add(lots.get(i));
      choose(lots, i + 1, size - 1, soFar, sets);
      soFar.remove(lots.get(i));
    }
  }

  /// Rotors with the pieces they may draw. What is left of a lot goes to the rotors that are served
  /// from it first.
  List<Bucket> buckets() {
    Map<String, Integer> given = new LinkedHashMap<>();
    Map<String, Integer> spare = new LinkedHashMap<>(left);
    List<Bucket> buckets = new ArrayList<>();
    served.forEach(
        (lots, rings) -> {
          List<Source> pieces = new ArrayList<>();
          rings.forEach(ring -> pieces.addAll(stock.wishedFor(ring)));
          for (String lot : lots) {
            int from = given.getOrDefault(lot, 0);
            int own = taken.getOrDefault(lots, Map.of()).getOrDefault(lot, 0);
            Integer more = spare.remove(lot);
            int to = from + own + (more == null ? 0 : more);
            pieces.addAll(stock.of(lot).subList(from, to));
            given.put(lot, to);
          }
          buckets.add(new Bucket(List.copyOf(rings), pieces));
        });
    return buckets;
  }

  /// What is short, or a shortage of nothing.
  Shortage shortage() {
    int needed = 0;
    for (int ring = 0; ring < task.rings().size(); ring++) {
      needed += slots(ring);
    }
    int open = unserved.stream().mapToInt(this::need).sum();
    int rest =
        task.mix() == MixPolicy.NEVER
            ? 0
            : task.apart().largest(stock.lots(), Set.of()).stream()
                .mapToInt(this::left)
                .max()
                .orElse(0);
    return new Shortage(type, needed, needed - open + Math.min(rest, open));
  }
}
