package lodebook.assembly.plan;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

/// Which lots a rotor may draw from under its mix policy.
final class LotChoice {
  /// So many sets of lots are compared at most.
  private static final int MOST_SETS = 24;

  private final RotorTask task;

  LotChoice(RotorTask task) {
    this.task = task;
  }

  /// What is short, type by type; empty where everything suffices.
  List<Shortage> shortages() {
    List<Shortage> shortages = new ArrayList<>();
    for (String type : task.types()) {
      int needed = task.emptySlots(type).size();
      int available =
          smallestSets(type).stream().mapToInt(lots -> supply(type, lots)).max().orElse(0);
      if (available < needed) {
        shortages.add(new Shortage(type, needed, available));
      }
    }
    return shortages;
  }

  /// Sets of lots worth comparing, each enough for all types; only where nothing is short.
  List<Set<String>> sets() {
    List<Set<String>> sets = List.of(Set.of());
    for (String type : task.types()) {
      List<Set<String>> grown = new ArrayList<>();
      for (Set<String> before : sets) {
        for (Set<String> lots : smallestSets(type)) {
          if (grown.size() < MOST_SETS && supply(type, lots) >= task.emptySlots(type).size()) {
            Set<String> both = new LinkedHashSet<>(before);
            both.addAll(lots);
            grown.add(both);
          }
        }
      }
      sets = grown;
    }
    return sets;
  }

  /// Under FREE all lots that may go together; under NEVER each single lot; under FEW the sets of
  /// the smallest size that suffice, or the largest where nothing does. Lots of magnets in place
  /// and of wished pieces are in the rotor anyway.
  private List<Set<String>> smallestSets(String type) {
    Map<String, Integer> supply = supplyByLot(type);
    Set<String> inAnyway = lotsInAnyway(type);
    int needed = task.emptySlots(type).size();
    if (needed == 0) {
      return List.of(Set.of());
    }
    if (task.mix() == MixPolicy.FREE) {
      return task.apart().largest(supply.keySet(), inAnyway);
    }
    if (task.mix() == MixPolicy.NEVER) {
      return inAnyway.isEmpty()
          ? supply.entrySet().stream()
              .sorted((a, b) -> Boolean.compare(b.getValue() >= needed, a.getValue() >= needed))
              .map(each -> Set.of(each.getKey()))
              .toList()
          : List.of(inAnyway.size() == 1 ? inAnyway : Set.of());
    }
    List<String> others = supply.keySet().stream().filter(lot -> !inAnyway.contains(lot)).toList();
    for (int size = 0; size <= others.size(); size++) {
      List<Set<String>> enough = new ArrayList<>();
      choose(type, others, 0, size, inAnyway, needed, enough);
      if (!enough.isEmpty()) {
        return enough;
      }
    }
    return task.apart().largest(supply.keySet(), inAnyway);
  }

  private void choose(
      String type,
      List<String> others,
      int from,
      int size,
      Set<String> soFar,
      int needed,
      List<Set<String>> enough) {
    if (enough.size() >= MOST_SETS) {
      return;
    }
    if (size == 0) {
      if (supply(type, soFar) >= needed) {
        enough.add(soFar);
      }
      return;
    }
    for (int i = from; i <= others.size() - size; i++) {
      Set<String> with = new LinkedHashSet<>(soFar);
      with.add(others.get(i));
      if (task.apart().allow(with, lotsInAnyway(type))) {
        choose(type, others, i + 1, size - 1, with, needed, enough);
      }
    }
  }

  private Set<String> lotsInAnyway(String type) {
    Set<String> lots = new TreeSet<>();
    task.kept().stream()
        .filter(kept -> task.layout().typeAt(kept.slot()).equals(type))
        .forEach(kept -> lots.add(kept.lot()));
    task.candidates().stream()
        .filter(each -> each.type().equals(type) && task.wished().contains(each.piece()))
        .forEach(each -> lots.add(each.lot()));
    return lots;
  }

  private int supply(String type, Set<String> lots) {
    return supplyByLot(type).entrySet().stream()
        .filter(each -> lots.contains(each.getKey()))
        .mapToInt(Map.Entry::getValue)
        .sum();
  }

  private Map<String, Integer> supplyByLot(String type) {
    Map<String, Integer> supply = new LinkedHashMap<>();
    for (Candidate each : task.candidates()) {
      if (each.type().equals(type)) {
        supply.merge(each.lot(), 1, Integer::sum);
      }
    }
    for (LotSupply each : task.unmeasured()) {
      if (each.type().equals(type) && each.count() > 0) {
        supply.merge(each.lot(), each.count(), Integer::sum);
      }
    }
    return supply;
  }
}
