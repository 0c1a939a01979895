package lodebook.assembly.plan;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.IntStream;
import lodebook.assembly.layout.Layout;
import org.jspecify.annotations.Nullable;

/// What a rotor's planner is asked: a layout, what may be used, and what is in place already.
///
/// Only pieces that may be used belong here; those on hold, scrapped or placed elsewhere do not.
///
/// @param layout the ring
/// @param candidates measured pieces that may be used, in the order of their numbers
/// @param unmeasured lots of which any magnet may be used; they are taken where measured pieces do
///   not suffice
/// @param kept slots that are filled and stay
/// @param mix which lots may go together
/// @param targetAmplitudeTesla wanted working amplitude; null for that of a ring by the rule with
///   the mean strengths of the lots drawn from and of what is kept
/// @param wished names of candidates that must be used
/// @param apart lots of one type that must not go together
public record RotorTask(
    Layout layout,
    List<Candidate> candidates,
    List<LotSupply> unmeasured,
    List<Kept> kept,
    MixPolicy mix,
    @Nullable Double targetAmplitudeTesla,
    Set<String> wished,
    LotsApart apart) {

  public RotorTask {
    candidates = List.copyOf(candidates);
    unmeasured = List.copyOf(unmeasured);
    kept = List.copyOf(kept);
    wished = Set.copyOf(wished);
    if (kept.stream().map(Kept::slot).distinct().count() < kept.size()) {
      throw new IllegalArgumentException("a slot of " + layout.name() + " is kept twice");
    }
    if (candidates.stream().map(Candidate::piece).distinct().count() < candidates.size()) {
      throw new IllegalArgumentException("a piece is offered twice for " + layout.name());
    }
    refuseWishesThatCannotBe(layout, candidates, kept, wished);
  }

  private static void refuseWishesThatCannotBe(
      Layout layout, List<Candidate> candidates, List<Kept> kept, Set<String> wished) {
    Map<String, Integer> byType = new HashMap<>();
    for (Candidate each : candidates) {
      if (wished.contains(each.piece())) {
        byType.merge(each.type(), 1, Integer::sum);
      }
    }
    int found = byType.values().stream().mapToInt(count -> count).sum();
    if (found < wished.size()) {
      throw new IllegalArgumentException("a piece that is wished is not offered");
    }
    byType.forEach(
        (type, count) -> {
          long empty =
              IntStream.rangeClosed(1, layout.slots())
                  .filter(slot -> layout.typeAt(slot).equals(type))
                  .filter(slot -> kept.stream().noneMatch(each -> each.slot() == slot))
                  .count();
          if (count > empty) {
            throw new IllegalArgumentException(
                count + " pieces of type " + type + " are wished for " + empty + " empty slots");
          }
        });
  }

  /// A task in which no piece must be used and no lot is apart from another.
  public RotorTask(
      Layout layout,
      List<Candidate> candidates,
      List<LotSupply> unmeasured,
      List<Kept> kept,
      MixPolicy mix,
      @Nullable Double targetAmplitudeTesla) {
    this(layout, candidates, unmeasured, kept, mix, targetAmplitudeTesla, Set.of(), LotsApart.NONE);
  }

  /// A task with no slot filled, few lots and the amplitude of the stock's mean.
  public static RotorTask of(Layout layout, List<Candidate> candidates) {
    return new RotorTask(layout, candidates, List.of(), List.of(), MixPolicy.FEW, null);
  }

  /// Empty slots that want a magnet of a type, in rising order.
  List<Integer> emptySlots(String type) {
    return IntStream.rangeClosed(1, layout.slots())
        .filter(slot -> layout.typeAt(slot).equals(type))
        .filter(slot -> kept.stream().noneMatch(each -> each.slot() == slot))
        .boxed()
        .toList();
  }

  /// Types of the ring's magnets in the order in which slots want them first.
  List<String> types() {
    return IntStream.rangeClosed(1, layout.slots()).mapToObj(layout::typeAt).distinct().toList();
  }

  RotorTask withMix(MixPolicy other) {
    return new RotorTask(
        layout, candidates, unmeasured, kept, other, targetAmplitudeTesla, wished, apart);
  }
}
