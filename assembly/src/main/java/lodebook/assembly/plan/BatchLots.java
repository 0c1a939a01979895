package lodebook.assembly.plan;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;

/// Shares the lots of one magnet type among the rotors of a batch.
///
/// As few lots as can serve all rotors are drawn from, each rotor from one lot where that can be,
/// the rotors spread over those lots in proportion to what they hold; rotors that no single lot can
/// serve share what the others leave.
final class BatchLots {
  private final BatchTask task;
  private final String type;
  private final Map<String, List<Source>> stock = new LinkedHashMap<>();
  private final List<Bucket> buckets = new ArrayList<>();
  private final List<Integer> unserved = new ArrayList<>();

  /// Rotors that draw from the same pieces.
  ///
  /// @param rings indices into the task's rings
  /// @param pieces what they may draw, at least as many as they need
  record Bucket(List<Integer> rings, List<Source> pieces) {}

  BatchLots(BatchTask task, String type) {
    this.task = task;
    this.type = type;
    for (Candidate each : task.candidates()) {
      if (each.type().equals(type)) {
        stock.computeIfAbsent(each.lot(), lot -> new ArrayList<>()).add(Source.of(each));
      }
    }
    for (LotSupply each : task.unmeasured()) {
      if (each.type().equals(type)) {
        List<Source> pieces = stock.computeIfAbsent(each.lot(), lot -> new ArrayList<>());
        for (int i = 0; i < each.count(); i++) {
          pieces.add(Source.of(each));
        }
      }
    }
    if (task.mix() == MixPolicy.FREE) {
      buckets.add(new Bucket(allRings(), together(stock.keySet())));
    } else {
      share();
    }
  }

  private int need(int ring) {
    return task.rings().get(ring).emptySlots(type).size();
  }

  private List<Integer> allRings() {
    List<Integer> rings = new ArrayList<>();
    for (int i = 0; i < task.rings().size(); i++) {
      if (need(i) > 0) {
        rings.add(i);
      }
    }
    return rings;
  }

  private List<Source> together(Iterable<String> lots) {
    List<Source> all = new ArrayList<>();
    for (String lot : lots) {
      all.addAll(stock.getOrDefault(lot, List.of()));
    }
    return all;
  }

  private void share() {
    List<String> lots = new ArrayList<>(stock.keySet());
    lots.sort(Comparator.comparingInt((String lot) -> -stock.getOrDefault(lot, List.of()).size()));
    Map<String, List<Integer>> served = new LinkedHashMap<>();
    for (int drawn = 1; drawn <= lots.size(); drawn++) {
      served.clear();
      unserved.clear();
      spread(lots.subList(0, drawn), served);
      if (unserved.isEmpty()) {
        break;
      }
    }
    if (lots.isEmpty()) {
      unserved.addAll(allRings());
    }
    List<Source> left = new ArrayList<>();
    for (String lot : lots) {
      List<Source> pieces = stock.getOrDefault(lot, List.of());
      List<Integer> rings = served.getOrDefault(lot, List.of());
      int taken = rings.stream().mapToInt(this::need).sum();
      if (unserved.isEmpty() || task.mix() == MixPolicy.NEVER) {
        taken = pieces.size();
      }
      if (!rings.isEmpty()) {
        buckets.add(new Bucket(rings, pieces.subList(0, taken)));
        left.addAll(pieces.subList(taken, pieces.size()));
      } else if (!unserved.isEmpty()) {
        left.addAll(pieces);
      }
    }
    if (!unserved.isEmpty()) {
      buckets.add(new Bucket(List.copyOf(unserved), left));
    }
  }

  private void spread(List<String> lots, Map<String, List<Integer>> served) {
    Map<String, Integer> left = new LinkedHashMap<>();
    lots.forEach(lot -> left.put(lot, stock.getOrDefault(lot, List.of()).size()));
    for (int ring : allRings()) {
      int need = need(ring);
      TreeSet<String> inPlace = new TreeSet<>();
      task.rings().get(ring).kept().forEach(kept -> inPlace.add(kept.lot()));
      String best = null;
      for (String lot : lots) {
        int has = left.getOrDefault(lot, 0);
        if (has >= need
            && (best == null
                || (inPlace.contains(lot) && !inPlace.contains(best))
                || (inPlace.contains(lot) == inPlace.contains(best)
                    && has > left.getOrDefault(best, 0)))) {
          best = lot;
        }
      }
      if (best == null) {
        unserved.add(ring);
      } else {
        left.merge(best, -need, Integer::sum);
        served.computeIfAbsent(best, lot -> new ArrayList<>()).add(ring);
      }
    }
  }

  /// Rotors with the pieces they may draw.
  List<Bucket> buckets() {
    return List.copyOf(buckets);
  }

  /// What is short, or a shortage of nothing.
  Shortage shortage() {
    int needed = allRings().stream().mapToInt(this::need).sum();
    int available = 0;
    for (Bucket bucket : buckets) {
      int wanted = bucket.rings().stream().mapToInt(this::need).sum();
      boolean refused =
          task.mix() == MixPolicy.NEVER && bucket.rings().stream().anyMatch(unserved::contains);
      available += refused ? 0 : Math.min(wanted, bucket.pieces().size());
    }
    return new Shortage(type, needed, Math.min(needed, available));
  }
}
