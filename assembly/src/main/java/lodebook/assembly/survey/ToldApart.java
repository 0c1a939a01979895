package lodebook.assembly.survey;

import java.util.List;

/// Two explanations and how often readings take one for the other.
///
/// @param one what may be wrong; empty means that the ring is right
/// @param other what else may be wrong
/// @param errorRate share of surveys in which the wrong one of the two fits better, from the
///   separation d of their readings in standard deviations: Φ(−d/2)
public record ToldApart(List<NamedFault> one, List<NamedFault> other, double errorRate) {
  public ToldApart {
    one = List.copyOf(one);
    other = List.copyOf(other);
  }
}
