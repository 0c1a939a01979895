package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import lodebook.assembly.survey.SlipCandidates.Candidate;
import org.jspecify.annotations.Nullable;

/// Decides what the person measuring did.
///
/// Everything as set wins where it explains the readings, unless a slip is a thousand times as
/// probable. Look-alikes are not listed anywhere: every slip is tried on the ring's own expected
/// readings. One is left out only where the readings make it a thousand times less likely than the
/// chosen one: a ring of eight pole pairs has seven other starts, and at 20 to 1 the true one would
/// be left out in three surveys of a hundred.
final class Slips {
  private static final double EQUAL = Math.log(1000);
  private static final double AS_SET_WINS_BY = Math.log(1000);
  private static final double ROUGHLY_LIKE = 0.1;
  private static final int STRAINED_FAULTS = 3;
  private static final double STRAINED_FIT = 1e-3;
  private static final int WEIGHED = 12;
  private static final int WEIGHED_ROWS = 800;

  private final RingModel ring;
  private final List<Reading> readings;
  private final Priors priors;
  private final SlipCandidates candidates;
  private final @Nullable Explanation expected;

  /// @param expected what the readings but for the last few said, or null
  Slips(RingModel ring, List<Reading> readings, Priors priors, @Nullable Explanation expected) {
    this.expected = expected;
    this.ring = ring;
    this.readings = readings;
    this.priors = priors;
    this.candidates = new SlipCandidates(ring, readings);
  }

  private record Tried(Slip slip, Judged judged, double logWeight) {}

  Account account() {
    Account plain = searched(Slip.NONE);
    boolean right = plain.best().explanation().faults().isEmpty();
    if (plain.fits() && right) {
      return withAlternatives(plain);
    }
    List<Candidate> promising =
        new ArrayList<>(candidates.like(Slip.NONE, Explanation.NONE, ROUGHLY_LIKE));
    if (isStrained(plain)) {
      promising.addAll(candidates.withOneFault(ROUGHLY_LIKE));
    }
    Tried slipped = likeliest(promising);
    if (slipped != null
        && (!plain.fits() || slipped.logWeight() > plain.best().logWeight() + AS_SET_WINS_BY)) {
      return withAlternatives(searched(slipped.slip()));
    }
    return withAlternatives(plain);
  }

  /// Whether an explanation needs so much that a slip with one fault might do better.
  private static boolean isStrained(Account account) {
    return !account.fits()
        || account.best().explanation().faults().size() >= STRAINED_FAULTS
        || account.best().fitProbability() < STRAINED_FIT;
  }

  /// Weighs the candidates that leave least, then chooses among all that look like the best of
  /// them.
  private @Nullable Tried likeliest(List<Candidate> promising) {
    Tried best =
        promising.stream()
            .filter(c -> !c.slip().equals(Slip.NONE))
            .sorted(Comparator.comparingDouble(Candidate::leftOver))
            .limit(WEIGHED + WEIGHED_ROWS / readings.size())
            .map(this::tried)
            .filter(t -> t.judged().fitProbability() >= Account.LEAST_FIT)
            .max(Comparator.comparingDouble(Tried::logWeight))
            .orElse(null);
    if (best == null) {
      return null;
    }
    Likeness likeness = new Likeness(best.slip(), best.judged());
    Tried chosen = best;
    for (Candidate candidate :
        candidates.like(best.slip(), best.judged().explanation(), ROUGHLY_LIKE)) {
      double logWeight = likeness.logWeight(candidate) + logPrior(candidate.slip());
      if (!candidate.slip().equals(Slip.NONE) && logWeight > chosen.logWeight()) {
        chosen = new Tried(candidate.slip(), best.judged(), logWeight);
      }
    }
    return chosen;
  }

  private Tried tried(Candidate candidate) {
    Judged judged = new Judge(rows(candidate.slip()), priors).judge(candidate.explanation());
    return new Tried(candidate.slip(), judged, judged.logWeight() + logPrior(candidate.slip()));
  }

  private double logPrior(Slip slip) {
    return slip.logPrior(priors, ring.slots());
  }

  private Account searched(Slip slip) {
    RowModel rows = rows(slip);
    @Nullable Explanation start = slip.equals(Slip.NONE) ? expected : null;
    return new Account(slip, rows, Search.explain(rows, priors, start), List.of());
  }

  private Account withAlternatives(Account chosen) {
    Explanation explanation = chosen.best().explanation();
    Likeness likeness = new Likeness(chosen.slip(), chosen.best());
    record Like(Slip slip, double logWeight) {}
    List<Slip> alternatives =
        candidates.like(chosen.slip(), explanation, ROUGHLY_LIKE).stream()
            .filter(c -> !c.slip().equals(chosen.slip()))
            .filter(c -> likeness.logWeight(c) >= chosen.best().logWeight() - EQUAL)
            .map(c -> new Like(c.slip(), likeness.logWeight(c) + logPrior(c.slip())))
            .sorted(Comparator.comparingDouble(l -> -l.logWeight()))
            .map(Like::slip)
            .toList();
    return new Account(chosen.slip(), chosen.rows(), chosen.weighed(), alternatives);
  }

  private RowModel rows(Slip slip) {
    return new RowModel(ring, slip.rows(readings, ring.layout()));
  }

  /// Weighs what looks like an explanation with that explanation's own covariance: whoever expects
  /// nearly the same readings has nearly the same uncertainty.
  private final class Likeness {
    private final Slip slip;
    private final Judged judged;
    private final RowModel rows;
    private final Cholesky factor;

    Likeness(Slip slip, Judged judged) {
      this.slip = slip;
      this.judged = judged;
      this.rows = rows(slip);
      this.factor = new Cholesky(rows.covariance(judged.explanation()));
    }

    double logWeight(Candidate candidate) {
      double[] residual = rows.read();
      for (int i = 0; i < residual.length; i++) {
        residual[i] -= candidate.written()[i] * slip.freeing(readings.get(i).component());
      }
      double[] white = factor.whiten(residual);
      return judged.logWeight() + 0.5 * (judged.misfit() - Judge.dot(white, white));
    }
  }
}
