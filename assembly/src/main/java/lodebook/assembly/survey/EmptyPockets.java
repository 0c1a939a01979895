package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.List;

/// Finds the pockets that could be empty without the readings saying so.
///
/// Nobody overlooks an empty pocket often, so the prior hardly counts absences among what is
/// likely. A verdict must not rest on that prior alone: where readings themselves speak less than
/// 100 to 1 against an empty pocket, a person is asked to look.
final class EmptyPockets {
  private static final double SPOKEN_AGAINST = Math.log(100);
  private static final double FAR = 25;

  private final RowModel rows;
  private final Priors priors;

  EmptyPockets(RowModel rows, Priors priors) {
    this.rows = rows;
    this.priors = priors;
  }

  /// Slots, from 1, whose magnet could be missing although an explanation says otherwise of it.
  List<Integer> alike(Judged best) {
    RingModel ring = rows.ring();
    Explanation explanation = best.explanation();
    double[] polarisation = ring.polarisation(explanation);
    Cholesky factor = new Cholesky(rows.covariance(explanation));
    double[] white = factor.whiten(rows.residual(explanation));
    Judge judge = new Judge(rows, priors);
    double bar = logLikelihood(best) - SPOKEN_AGAINST;
    List<Integer> slots = new ArrayList<>();
    for (int slot = 0; slot < ring.slots(); slot++) {
      if (!ring.filled(slot) || saysWeak(explanation, slot)) {
        continue;
      }
      double[] change =
          factor.whiten(rows.answer(slot, -polarisation[2 * slot], -polarisation[2 * slot + 1]));
      boolean near = Judge.dot(change, white) - 0.5 * Judge.dot(change, change) > -FAR;
      if (near && logLikelihood(judge.judge(emptied(explanation, slot))) > bar) {
        slots.add(slot + 1);
      }
    }
    return slots;
  }

  private double logLikelihood(Judged judged) {
    return judged.logWeight() - judged.explanation().logPrior(priors);
  }

  private static boolean saysWeak(Explanation explanation, int slot) {
    return explanation.faults().stream()
        .filter(f -> f.ofMagnet() && f.place() == slot)
        .anyMatch(f -> f.kind() == FaultKind.MISSING || f.kind() == FaultKind.WEAK);
  }

  private static Explanation emptied(Explanation explanation, int slot) {
    List<Fault> others =
        explanation.faults().stream().filter(f -> !f.ofMagnet() || f.place() != slot).toList();
    return new Explanation(others).with(Fault.of(slot, FaultKind.MISSING));
  }
}
