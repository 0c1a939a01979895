package lodebook.assembly.layout;

import java.util.Comparator;
import java.util.Optional;
import java.util.stream.IntStream;

/// Pole pairs of a gear's two rings; the number of iron pieces is their sum.
///
/// @param inner pole pairs of the inner ring
/// @param outer pole pairs of the outer ring
public record PolePairChoice(int inner, int outer) {

  /// Number of iron pieces.
  public int pieces() {
    return inner + outer;
  }

  /// Product of both rings' cogging factors, 1 for the smoothest.
  public int roughness() {
    return GearModel.coggingFactor(inner, pieces()) * GearModel.coggingFactor(outer, pieces());
  }

  /// A smoother choice with the same inner ring and one outer pole pair (at most three) less or
  /// more, the smoothest first, then the nearest, then the smaller; nothing where this is the
  /// smoothest.
  public Optional<PolePairChoice> smootherNeighbour() {
    return IntStream.rangeClosed(-3, 3)
        .filter(step -> step != 0 && outer + step > inner)
        .mapToObj(step -> new PolePairChoice(inner, outer + step))
        .filter(choice -> choice.roughness() < roughness())
        .min(
            Comparator.comparingInt(PolePairChoice::roughness)
                .thenComparingInt(choice -> Math.abs(choice.outer() - outer))
                .thenComparingInt(PolePairChoice::outer));
  }
}
