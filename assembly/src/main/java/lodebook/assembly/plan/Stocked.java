package lodebook.assembly.plan;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.IntStream;

/// A rotor's task turned into a puzzle of numbers, and an order turned back into placements.
final class Stocked {
  private final RotorTask task;
  private final List<Source> sources;
  private final Puzzle puzzle;

  /// @param task what is asked
  /// @param form the ring's harmonics, for the facings of the task
  /// @param lots lots that may be drawn from
  /// @param target wanted working amplitude, tesla
  Stocked(RotorTask task, HarmonicForm form, Set<String> lots, double target) {
    this.task = task;
    int slots = task.layout().slots();
    Source[] inSlots = new Source[slots];
    for (Kept kept : task.kept()) {
      inSlots[kept.slot() - 1] = Source.of(kept);
    }
    List<Source> spares = new ArrayList<>();
    List<int[]> pools = new ArrayList<>();
    for (String type : task.types()) {
      List<Integer> empty = task.emptySlots(type);
      List<Source> usable = usable(type, lots, empty.size());
      for (int i = 0; i < empty.size(); i++) {
        inSlots[empty.get(i) - 1] = usable.get(i);
      }
      List<Source> more = usable.subList(empty.size(), usable.size());
      int firstSpare = slots + spares.size();
      IntStream spareHolders = IntStream.range(firstSpare, firstSpare + more.size());
      if (!empty.isEmpty()) {
        pools.add(
            IntStream.concat(empty.stream().mapToInt(slot -> slot - 1), spareHolders).toArray());
        spares.addAll(more);
      }
    }
    sources = new ArrayList<>(Arrays.asList(inSlots));
    sources.addAll(spares);
    boolean[] wished = new boolean[sources.size()];
    for (int i = 0; i < wished.length; i++) {
      String piece = sources.get(i).piece();
      wished[i] = piece != null && task.wished().contains(piece);
    }
    puzzle =
        new Puzzle(
            form,
            sources.stream().mapToDouble(Source::remanence).toArray(),
            sources.stream().mapToDouble(Source::variance).toArray(),
            wished,
            pools.toArray(int[][]::new),
            target / 2,
            task.layout().workingAmplitudeTolerance());
  }

  /// What may be used of a type, wished pieces first.
  private List<Source> usable(String type, Set<String> lots, int needed) {
    List<Source> usable = new ArrayList<>();
    for (boolean wished : new boolean[] {true, false}) {
      for (Candidate each : task.candidates()) {
        if (each.type().equals(type)
            && lots.contains(each.lot())
            && task.wished().contains(each.piece()) == wished) {
          usable.add(Source.of(each));
        }
      }
    }
    for (LotSupply each : task.unmeasured()) {
      if (each.type().equals(type) && lots.contains(each.lot())) {
        int count = Math.min(each.count(), Math.max(0, needed - usable.size()));
        for (int i = 0; i < count; i++) {
          usable.add(Source.of(each));
        }
      }
    }
    return usable;
  }

  Puzzle puzzle() {
    return puzzle;
  }

  List<Placement> placements(int[] order) {
    List<Placement> placements = new ArrayList<>();
    for (int slot = 1; slot <= task.layout().slots(); slot++) {
      placements.add(sources.get(order[slot - 1]).in(slot, task.layout().ruleFacing(slot)));
    }
    return placements;
  }

  static List<String> lotsOf(List<Placement> placements) {
    Set<String> lots = new TreeSet<>();
    placements.forEach(each -> lots.add(each.lot()));
    return List.copyOf(lots);
  }
}
