package lodebook.assembly.survey;

import java.util.List;
import lodebook.assembly.layout.ProbePoint;

/// What a set of readings can tell apart.
///
/// @param points the readings of one survey
/// @param worstSingle the two single faults (or the right ring and one) most easily taken for each
///   other
/// @param worstPair the same where at least one of the two is a pair of reversals
/// @param singlesAlike single faults not told apart at 1 in 1000, worst first
/// @param pairsAlike pairs of reversals not told apart at 1 in 100 from the right ring, a single
///   fault or another pair, worst first
public record ProbeReport(
    List<ProbePoint> points,
    ToldApart worstSingle,
    ToldApart worstPair,
    List<ToldApart> singlesAlike,
    List<ToldApart> pairsAlike) {
  public ProbeReport {
    points = List.copyOf(points);
    singlesAlike = List.copyOf(singlesAlike);
    pairsAlike = List.copyOf(pairsAlike);
  }

  /// Whether every single fault is told apart at 1 in 1000 and every pair of reversals at 1 in 100.
  public boolean tellsAll() {
    return singlesAlike.isEmpty() && pairsAlike.isEmpty();
  }
}
