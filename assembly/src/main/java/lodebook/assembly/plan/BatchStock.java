package lodebook.assembly.plan;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

/// What a batch may draw of one magnet type: lot by lot, and what certain rotors must have.
final class BatchStock {
  private final BatchTask task;
  private final String type;
  private final Map<String, List<Source>> byLot = new LinkedHashMap<>();
  private final Map<Integer, List<Source>> wished = new LinkedHashMap<>();

  BatchStock(BatchTask task, String type) {
    this.task = task;
    this.type = type;
    for (Candidate each : task.candidates()) {
      if (each.type().equals(type)) {
        List<Source> ofLot = byLot.computeIfAbsent(each.lot(), lot -> new ArrayList<>());
        int ring = task.wishedFor(each.piece());
        if (ring < 0) {
          ofLot.add(Source.of(each));
        } else {
          wished.computeIfAbsent(ring, r -> new ArrayList<>()).add(Source.of(each));
        }
      }
    }
    for (LotSupply each : task.unmeasured()) {
      if (each.type().equals(type)) {
        List<Source> ofLot = byLot.computeIfAbsent(each.lot(), lot -> new ArrayList<>());
        for (int i = 0; i < each.count(); i++) {
          ofLot.add(Source.of(each));
        }
      }
    }
  }

  Set<String> lots() {
    return byLot.keySet();
  }

  /// Pieces of a lot that any rotor may have.
  List<Source> of(String lot) {
    return byLot.getOrDefault(lot, List.of());
  }

  /// Pieces that a rotor must have.
  List<Source> wishedFor(int ring) {
    return wished.getOrDefault(ring, List.of());
  }

  /// Lots of this type that are in a rotor anyway: in place, or of pieces it must have.
  Set<String> lotsIn(int ring) {
    Set<String> lots = new TreeSet<>();
    BatchTask.Ring each = task.rings().get(ring);
    each.kept().stream()
        .filter(kept -> each.design().layout().typeAt(kept.slot()).equals(type))
        .forEach(kept -> lots.add(kept.lot()));
    wishedFor(ring).forEach(source -> lots.add(source.lot()));
    return lots;
  }
}
