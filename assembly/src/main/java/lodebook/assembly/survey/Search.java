package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/// Finds the likeliest explanations of a set of rows.
///
/// The first screening uses the plan's covariance, widened where a reversed magnet would widen it;
/// each later one that of the likeliest explanation found so far, until that no longer changes.
final class Search {
  private static final int FIRST_LEAST = 12;
  private static final int FIRST_MOST = 30;
  private static final double FIRST_WITHIN = 30;
  private static final int LATER_LEAST = 6;
  private static final int LATER_MOST = 20;
  private static final double LATER_WITHIN = 12;
  private static final int ROUNDS = 5;
  private static final double NAMED_FROM = Math.log(20);

  private Search() {}

  /// All explanations that were weighed, likeliest first.
  static List<Judged> explain(RowModel rows, Priors priors) {
    return explain(rows, priors, null);
  }

  /// @param expected what the rows but for a few said, so that its own covariance can be used from
  ///   the beginning; null where nothing is known
  static List<Judged> explain(RowModel rows, Priors priors, @Nullable Explanation expected) {
    Judge judge = new Judge(rows, priors);
    Map<List<NamedFault>, Judged> weighed = new HashMap<>();
    Judged best =
        expected == null
            ? weigh(judge, screening(rows), rows, priors, weighed)
            : weighRound(judge, expected, rows, priors, weighed);
    if (expected != null && best.explanation().key().equals(expected.key())) {
      return sorted(withoutIdleSuspects(judge, weighed));
    }
    for (int round = 1; round < ROUNDS; round++) {
      Judged next = weighRound(judge, best.explanation(), rows, priors, weighed);
      if (next.explanation().key().equals(best.explanation().key())) {
        break;
      }
      best = next;
    }
    return sorted(withoutIdleSuspects(judge, weighed));
  }

  /// Drops explanations that call a reading suspect without being 20 times as likely as the same
  /// without that.
  private static Map<List<NamedFault>, Judged> withoutIdleSuspects(
      Judge judge, Map<List<NamedFault>, Judged> weighed) {
    Map<List<NamedFault>, Judged> kept = new HashMap<>();
    for (Judged judged : weighed.values()) {
      Explanation plain = judged.explanation().ofMagnets();
      if (plain.faults().size() < judged.explanation().faults().size()) {
        Judged without = weighed.get(plain.key());
        if (without == null) {
          without = judge.judge(plain);
        }
        kept.put(plain.key(), without);
        if (judged.logWeight() < without.logWeight() + NAMED_FROM) {
          continue;
        }
      }
      kept.put(judged.explanation().key(), judged);
    }
    return kept;
  }

  private static Judged weigh(
      Judge judge,
      Cholesky factor,
      RowModel rows,
      Priors priors,
      Map<List<NamedFault>, Judged> weighed) {
    List<Explanation> screened =
        new Screen(rows, factor, priors).likeliest(FIRST_LEAST, FIRST_MOST, FIRST_WITHIN);
    for (Explanation explanation : screened) {
      weighed.computeIfAbsent(explanation.key(), key -> judge.judge(explanation));
    }
    return sorted(weighed).getFirst();
  }

  /// One more round with the covariance of the best so far. Readings that the best calls suspect
  /// count for nothing in it, so every explanation is also weighed together with them.
  private static Judged weighRound(
      Judge judge,
      Explanation best,
      RowModel rows,
      Priors priors,
      Map<List<NamedFault>, Judged> weighed) {
    Cholesky own = new Cholesky(rows.covariance(best));
    List<Fault> suspects = best.faults().stream().filter(f -> !f.ofMagnet()).toList();
    List<Explanation> all =
        new Screen(rows, own, priors).likeliest(LATER_LEAST, LATER_MOST, LATER_WITHIN);
    for (Explanation screened : all) {
      weighed.computeIfAbsent(screened.key(), key -> judge.judge(screened));
      if (!suspects.isEmpty()) {
        Explanation with = screened.ofMagnets().withAll(suspects);
        weighed.computeIfAbsent(with.key(), key -> judge.judge(with));
      }
    }
    return sorted(weighed).getFirst();
  }

  private static List<Judged> sorted(Map<List<NamedFault>, Judged> weighed) {
    List<Judged> list = new ArrayList<>(weighed.values());
    list.sort(Comparator.comparingDouble((Judged j) -> -j.logWeight()));
    return list;
  }

  /// Covariance for the first screening, factored.
  static Cholesky screening(RowModel rows) {
    return new Cholesky(screeningCovariance(rows));
  }

  /// Covariance for the first screening, upper triangle.
  static double[][] screeningCovariance(RowModel rows) {
    double[][] matrix = rows.covariance(Explanation.NONE);
    double[] plan = rows.singleVariances(Explanation.NONE);
    double[] wide = rows.largestSingleVariances();
    for (int i = 0; i < matrix.length; i++) {
      matrix[i][i] += 0.5 * (wide[i] - plan[i]);
    }
    return matrix;
  }
}
