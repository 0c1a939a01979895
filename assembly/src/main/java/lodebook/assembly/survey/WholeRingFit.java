package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/// Whether all readings are off together, and by what.
///
/// A common gain that is free to be off by a third is tried on the right ring and on the likeliest
/// explanation. The probe's distance is the other reading of the same evidence.
final class WholeRingFit {
  private static final double FREE_GAIN = 0.3;
  private static final double EXPLAINED_SHARE = 0.7;
  private static final double LEAST_GAIN = -0.6;
  private static final double MOST_GAIN = 1.5;
  private static final double FARTHEST_METRES = 2.9e-3;
  private static final int ROUNDS = 6;
  private static final double LARGEST_STEP_METRES = 0.5e-3;

  private final Account account;
  private final RowModel free;
  private final Priors priors;
  private final Judged freed;

  WholeRingFit(Account account, Priors priors) {
    this.account = account;
    this.priors = priors;
    this.free = account.rows().withGainSpread(FREE_GAIN);
    Judge judge = new Judge(free, priors);
    Judged right = judge.judge(Explanation.NONE);
    Judged best = judge.judge(account.best().explanation());
    Judged likelier = right.logWeight() >= best.logWeight() ? right : best;
    this.freed =
        likelier.fitProbability() < Account.LEAST_FIT && !account.fits()
            ? Search.explain(free, priors).getFirst()
            : likelier;
  }

  /// Whether a common gain explains the readings better than an explanation without one.
  boolean likelierThan(Judged judged) {
    return freed.fitProbability() >= Account.LEAST_FIT
        && freed.logWeight() + Math.log(priors.wholeRing()) > judged.logWeight();
  }

  /// Natural logarithm of the odds of one explanation against another if the gain is free.
  double logOddsFreed(Judged one, Judged other) {
    Judge judge = new Judge(free, priors);
    return judge.judge(one.explanation()).logWeight()
        - judge.judge(other.explanation()).logWeight();
  }

  /// By what the readings would fit, or null where neither takes away most of the misfit.
  @Nullable WholeRing estimate() {
    Explanation explanation = freed.explanation();
    double plain = misfit(account.rows(), explanation);
    double excess = plain - account.rows().count();
    double left = freed.misfit() - account.rows().count();
    if (excess <= 0 || left > (1 - EXPLAINED_SHARE) * excess) {
      return null;
    }
    double gain = gain(account.rows(), explanation);
    if (gain < LEAST_GAIN || gain > MOST_GAIN) {
      return null;
    }
    double offset = offset(explanation);
    return new WholeRing(gain, Math.abs(offset) < FARTHEST_METRES ? Double.valueOf(offset) : null);
  }

  private static double misfit(RowModel rows, Explanation explanation) {
    double[] white = new Cholesky(rows.covariance(explanation)).whiten(rows.residual(explanation));
    return Judge.dot(white, white);
  }

  private double gain(RowModel rows, Explanation explanation) {
    Cholesky factor = new Cholesky(rows.covariance(explanation));
    double[] mean = factor.whiten(rows.mean(explanation));
    double[] white = factor.whiten(rows.residual(explanation));
    return Judge.dot(mean, white) / Judge.dot(mean, mean);
  }

  private double offset(Explanation explanation) {
    double offset = 0;
    for (int round = 0; round < ROUNDS; round++) {
      RowModel moved = movedBy(offset);
      Cholesky factor = new Cholesky(moved.covariance(explanation));
      double[] slope = factor.whiten(moved.probeSlope(explanation));
      double[] white = factor.whiten(moved.residual(explanation));
      double step = Judge.dot(slope, white) / Judge.dot(slope, slope);
      offset += Math.clamp(step, -LARGEST_STEP_METRES, LARGEST_STEP_METRES);
    }
    return offset;
  }

  private RowModel movedBy(double metres) {
    List<Row> rows = new ArrayList<>();
    for (Row row : account.rows().rows()) {
      rows.add(row.movedBy(metres));
    }
    return new RowModel(account.rows().ring(), rows);
  }
}
