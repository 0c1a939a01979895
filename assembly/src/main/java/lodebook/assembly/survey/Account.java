package lodebook.assembly.survey;

import java.util.List;

/// A whole account of a survey: what the person did and what is wrong in the ring.
///
/// @param slip what the person measuring did
/// @param rows the readings freed of that slip
/// @param weighed all explanations weighed under that slip, likeliest first
/// @param alternatives other slips that explain the readings equally
record Account(Slip slip, RowModel rows, List<Judged> weighed, List<Slip> alternatives) {
  /// Below this probability of a worse misfit an explanation does not fit.
  static final double LEAST_FIT = 1e-4;

  Judged best() {
    return weighed.getFirst();
  }

  boolean fits() {
    return best().fitProbability() >= LEAST_FIT;
  }
}
