package lodebook.assembly.plan;

import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import lodebook.assembly.layout.RingDesign;

/// Rotors to be planned together from common stock.
///
/// @param rings the rotors, in the order of their serials
/// @param candidates measured pieces that may be used, in the order of their numbers
/// @param unmeasured lots of which any magnet may be used, where measured pieces do not suffice
/// @param mix which lots may go together in one rotor
/// @param wished names of candidates that must be used, each with the serial number of its rotor
/// @param apart lots of one type that must not go together in one rotor
public record BatchTask(
    List<Ring> rings,
    List<Candidate> candidates,
    List<LotSupply> unmeasured,
    MixPolicy mix,
    Map<String, String> wished,
    LotsApart apart) {

  /// One rotor of the batch.
  ///
  /// @param rotor its serial number
  /// @param design its layout with the magnet types
  /// @param kept slots that are filled and stay
  public record Ring(String rotor, RingDesign design, List<Kept> kept) {
    public Ring {
      kept = List.copyOf(kept);
    }

    /// Empty slots (from 1) that want a magnet of a type.
    List<Integer> emptySlots(String type) {
      return IntStream.rangeClosed(1, design.slots())
          .filter(slot -> design.layout().typeAt(slot).equals(type))
          .filter(slot -> kept.stream().noneMatch(each -> each.slot() == slot))
          .boxed()
          .toList();
    }
  }

  public BatchTask {
    rings = List.copyOf(rings);
    candidates = List.copyOf(candidates);
    unmeasured = List.copyOf(unmeasured);
    wished = Map.copyOf(wished);
    if (candidates.stream().map(Candidate::piece).distinct().count() < candidates.size()) {
      throw new IllegalArgumentException("a piece is offered twice for the batch");
    }
  }

  /// A task in which no piece must be used and no lot is apart from another.
  public BatchTask(
      List<Ring> rings, List<Candidate> candidates, List<LotSupply> unmeasured, MixPolicy mix) {
    this(rings, candidates, unmeasured, mix, Map.of(), LotsApart.NONE);
  }

  /// Lots that may be drawn from.
  Set<String> lots() {
    return Stream.concat(
            candidates.stream().map(Candidate::lot), unmeasured.stream().map(LotSupply::lot))
        .collect(Collectors.toSet());
  }

  /// Index of the ring that must have a piece, or −1.
  int wishedFor(String piece) {
    String rotor = wished.get(piece);
    return rotor == null
        ? -1
        : IntStream.range(0, rings.size())
            .filter(i -> rings.get(i).rotor().equals(rotor))
            .findFirst()
            .orElse(-1);
  }

  /// Types of magnet that the rotors want, in the order in which they are wanted first.
  List<String> types() {
    return rings.stream()
        .flatMap(
            ring ->
                IntStream.rangeClosed(1, ring.design().slots())
                    .mapToObj(ring.design().layout()::typeAt))
        .distinct()
        .toList();
  }
}
