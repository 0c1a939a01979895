package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.List;
import org.hipparchus.special.Erf;
import org.hipparchus.special.Gamma;

/// Weighs explanations, each with the covariance that it implies itself.
final class Judge {
  private static final double LOG_TWO_PI = Math.log(2 * Math.PI);

  private final RowModel rows;
  private final Priors priors;

  Judge(RowModel rows, Priors priors) {
    this.rows = rows;
    this.priors = priors;
  }

  /// Weighs an explanation. The amounts of weak, strong and turned magnets are fitted to the
  /// readings and integrated over the prior on the range of their kind.
  Judged judge(Explanation start) {
    Judged first = weigh(start);
    for (int round = 0; round < 3 && moved(start, first.explanation()); round++) {
      start = first.explanation();
      first = weigh(start);
    }
    return first;
  }

  private static boolean moved(Explanation from, Explanation to) {
    for (int i = 0; i < from.faults().size(); i++) {
      if (Math.abs(from.faults().get(i).amount() - to.faults().get(i).amount()) > 0.05) {
        return true;
      }
    }
    return false;
  }

  private Judged weigh(Explanation start) {
    double[] polarisation = rows.ring().polarisation(start);
    Cholesky factor = new Cholesky(rows.covariance(start));
    double[] white = factor.whiten(rows.residual(start));
    double misfit = dot(white, white);
    double logWeight = -0.5 * (factor.logDeterminant() + rows.count() * LOG_TWO_PI);
    logWeight += start.logPrior(priors);
    List<Fault> fitted = start.faults().stream().filter(Fault::fitted).toList();
    if (fitted.isEmpty()) {
      return new Judged(start, logWeight - 0.5 * misfit, misfit, fit(misfit, rows.count()));
    }
    Fit fit = new Fit(fitted, slopes(fitted, polarisation, factor), white);
    List<Fault> moved = new ArrayList<>(start.faults());
    for (int k = 0; k < fitted.size(); k++) {
      moved.set(moved.indexOf(fitted.get(k)), fitted.get(k).withAmount(fit.clamped(k)));
    }
    logWeight += fit.logEvidence() - 0.5 * (misfit - fit.gain());
    double clampedMisfit = misfit - fit.gain() + fit.clampCost();
    return new Judged(
        new Explanation(moved), logWeight, clampedMisfit, fit(clampedMisfit, rows.count()));
  }

  private double[][] slopes(List<Fault> fitted, double[] polarisation, Cholesky factor) {
    double[] right = rows.ring().rightPolarisation();
    double[][] slopes = new double[fitted.size()][];
    for (int k = 0; k < slopes.length; k++) {
      Fault fault = fitted.get(k);
      int at = 2 * fault.place();
      double[] slope =
          fault.kind() == FaultKind.TURNED
              ? rows.answer(fault.place(), -polarisation[at + 1], polarisation[at])
              : rows.answer(fault.place(), right[at], right[at + 1]);
      slopes[k] = factor.whiten(slope);
    }
    return slopes;
  }

  static double fit(double misfit, int degrees) {
    return degrees == 0 ? 1 : Gamma.regularizedGammaQ(0.5 * degrees, 0.5 * misfit);
  }

  static double dot(double[] a, double[] b) {
    double sum = 0;
    for (int i = 0; i < a.length; i++) {
      sum += a[i] * b[i];
    }
    return sum;
  }

  /// Least squares for the amounts, and what the prior on their ranges costs.
  private static final class Fit {
    private final List<Fault> faults;
    private final double[] best;
    private final double[][] information;
    private final double gain;
    private final double logEvidence;

    Fit(List<Fault> faults, double[][] slopes, double[] white) {
      this.faults = faults;
      int size = faults.size();
      information = new double[size][size];
      double[] right = new double[size];
      double[][] lower = new double[size][];
      for (int k = 0; k < size; k++) {
        for (int l = 0; l < size; l++) {
          information[k][l] = dot(slopes[k], slopes[l]) + (k == l ? 1e-9 : 0);
        }
        lower[k] = information[k].clone();
        right[k] = dot(slopes[k], white);
      }
      Cholesky factor = new Cholesky(lower);
      double[] step = factor.solve(right);
      double[] variances = factor.inverseDiagonal();
      gain = dot(step, right);
      best = new double[size];
      double sum = 0.5 * (size * LOG_TWO_PI - factor.logDeterminant());
      for (int k = 0; k < size; k++) {
        Fault fault = faults.get(k);
        best[k] = fault.amount() + step[k];
        sum +=
            fault.kind() == FaultKind.TURNED
                ? turnEvidence(fault, best[k])
                : logShareEvidence(fault, best[k], Math.sqrt(variances[k]));
      }
      logEvidence = sum;
    }

    /// An even prior on all turns; what is less than the least turn is none.
    private static double turnEvidence(Fault fault, double turn) {
      return Math.abs(turn) < Fault.LEAST_TURN
          ? Double.NEGATIVE_INFINITY
          : -Math.log(fault.highest() - fault.lowest());
    }

    /// Weight of the prior on the range of shares, under the likelihood's bell curve; the prior's
    /// density is taken at the mean inside the range.
    private static double logShareEvidence(Fault fault, double mean, double sd) {
      double low = (fault.lowest() - mean) / sd;
      double high = (fault.highest() - mean) / sd;
      double inside = normal(high) - normal(low);
      double clamped = Math.clamp(mean, fault.lowest(), fault.highest());
      if (inside < 1e-12) {
        return Math.log(Math.max(inside, 1e-300)) + Math.log(fault.shareDensity(clamped));
      }
      double bells = Math.exp(-0.5 * low * low) - Math.exp(-0.5 * high * high);
      double within = mean + sd * bells / (Math.sqrt(2 * Math.PI) * inside);
      double share = Math.clamp(within, fault.lowest(), fault.highest());
      return Math.log(inside) + Math.log(fault.shareDensity(share));
    }

    double clamped(int k) {
      Fault fault = faults.get(k);
      return Math.clamp(best[k], fault.lowest(), fault.highest());
    }

    double gain() {
      return gain;
    }

    double logEvidence() {
      return logEvidence;
    }

    double clampCost() {
      double cost = 0;
      for (int k = 0; k < best.length; k++) {
        for (int l = 0; l < best.length; l++) {
          cost += (best[k] - clamped(k)) * information[k][l] * (best[l] - clamped(l));
        }
      }
      return cost;
    }

    private static double normal(double z) {
      return 0.5 * Erf.erfc(-z / Math.sqrt(2));
    }
  }
}
