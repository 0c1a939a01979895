package lodebook.assembly.plan;

import java.util.List;
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
public record RotorTask(
    Layout layout,
    List<Candidate> candidates,
    List<LotSupply> unmeasured,
    List<Kept> kept,
    MixPolicy mix,
    @Nullable Double targetAmplitudeTesla) {

  public RotorTask {
    candidates = List.copyOf(candidates);
    unmeasured = List.copyOf(unmeasured);
    kept = List.copyOf(kept);
    if (kept.stream().map(Kept::slot).distinct().count() < kept.size()) {
      throw new IllegalArgumentException("a slot of " + layout.name() + " is kept twice");
    }
    if (candidates.stream().map(Candidate::piece).distinct().count() < candidates.size()) {
      throw new IllegalArgumentException("a piece is offered twice for " + layout.name());
    }
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
    return new RotorTask(layout, candidates, unmeasured, kept, other, targetAmplitudeTesla);
  }
}
