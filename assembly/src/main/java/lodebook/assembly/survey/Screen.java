package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/// Ranks explanations with one common covariance.
///
/// In whitened space a fault shifts the readings by a fixed vector, so the score of a set of faults
/// needs only the inner products of those vectors. None, every single fault and every pair are
/// scored; triples and quadruples grow from the best pairs and triples. Scores are logarithms of
/// prior times likelihood up to a constant.
final class Screen {
  private static final int GROWN_FROM = 200;
  private static final int MOST_FAULTS = 4;
  private static final double SHARE_STRETCH = 0.15;
  private static final double TURN_STRETCH = 0.05;
  private static final int SUSPECTS_FROM = 12;

  private final RowModel rows;
  private final Cholesky factor;
  private final Priors priors;
  private final List<Fault> faults = new ArrayList<>();
  private final double[] alone;
  private final double[][] overlap;
  private final double[] residual;
  private final double[] inverseDiagonal;
  private final double company;
  private final boolean[] reversed;
  private final int[] places;

  Screen(RowModel rows, Cholesky factor, Priors priors) {
    this.rows = rows;
    this.factor = factor;
    this.priors = priors;
    company = Math.log(priors.furtherReversed() / priors.reversed());
    RingModel ring = rows.ring();
    for (int slot = 0; slot < ring.slots(); slot++) {
      faults.addAll(Possible.of(ring, slot));
    }
    double[] right = ring.rightPolarisation();
    residual = rows.residual(Explanation.NONE);
    inverseDiagonal = factor.inverseDiagonal();
    int width = 2 * ring.slots();
    double[][] white = rows.responses();
    factor.whitenAll(white);
    double[][] product = new double[width][width];
    double[] against = new double[width];
    double[] whiteResidual = factor.whiten(residual);
    for (int i = 0; i < white.length; i++) {
      double[] line = white[i];
      RowAnswers.add(against, whiteResidual[i], line);
      for (int c = 0; c < width; c++) {
        RowAnswers.add(product[c], line[c], line);
      }
    }
    double[][] change = new double[faults.size()][];
    reversed = new boolean[change.length];
    places = new int[change.length];
    for (int e = 0; e < change.length; e++) {
      change[e] = faults.get(e).change(right);
      reversed[e] = faults.get(e).kind() == FaultKind.REVERSED;
      places[e] = faults.get(e).place();
    }
    alone = new double[change.length];
    overlap = new double[change.length][change.length];
    for (int e = 0; e < change.length; e++) {
      int at = 2 * places[e];
      double[] shifted = new double[width];
      RowAnswers.add(shifted, change[e][0], product[at]);
      RowAnswers.add(shifted, change[e][1], product[at + 1]);
      for (int f = 0; f < change.length; f++) {
        int to = 2 * places[f];
        overlap[e][f] = shifted[to] * change[f][0] + shifted[to + 1] * change[f][1];
      }
      alone[e] =
          logPrior(faults.get(e))
              + change[e][0] * against[at]
              + change[e][1] * against[at + 1]
              - 0.5 * overlap[e][e];
    }
  }

  /// Prior of a fault; for a step of an amount, of roughly the stretch that its readings could
  /// mean.
  private double logPrior(Fault fault) {
    double prior = fault.prior(priors);
    return switch (fault.kind()) {
      case WEAK, STRONG -> Math.log(prior * SHARE_STRETCH * fault.shareDensity(fault.amount()));
      case TURNED -> Math.log(prior * TURN_STRETCH);
      default -> Math.log(prior);
    };
  }

  /// The likeliest explanations, likeliest first; the ring being right is always among them.
  ///
  /// @param least how many at least, even where they are far less likely than the first
  /// @param most how many at most
  /// @param within natural logarithm of how many times less likely than the first they may be
  List<Explanation> likeliest(int least, int most, double within) {
    List<Best.Scored<int[]>> ranked = new ArrayList<>();
    ranked.add(new Best.Scored<>(0, new int[0]));
    List<Best.Scored<int[]>> level = ranked;
    for (int size = 1; size <= MOST_FAULTS; size++) {
      level = size == 2 ? pairs() : grown(level);
      ranked.addAll(level);
    }
    ranked.sort(Comparator.comparingDouble((Best.Scored<int[]> s) -> -s.score()));
    List<Best.Scored<Explanation>> found = new ArrayList<>();
    int rank = 0;
    int singles = 0;
    for (Best.Scored<int[]> scored : ranked) {
      boolean small =
          scored.what().length == 0 || (scored.what().length == 1 && singles++ < SUSPECTS_FROM);
      boolean leading = rank++ < 2 * most;
      if (!small && !leading) {
        continue;
      }
      Explanation explanation =
          new Explanation(Arrays.stream(scored.what()).mapToObj(faults::get).toList());
      found.add(new Best.Scored<>(scored.score(), explanation));
      if (small || rank <= SUSPECTS_FROM) {
        found.addAll(withSuspects(scored, explanation));
      }
    }
    found.sort(Comparator.comparingDouble((Best.Scored<Explanation> s) -> -s.score()));
    return different(found, least, most, within);
  }

  private static List<Explanation> different(
      List<Best.Scored<Explanation>> found, int least, int most, double within) {
    double bar = found.getFirst().score() - within;
    List<Explanation> list = new ArrayList<>();
    Set<List<NamedFault>> seen = new HashSet<>();
    for (Best.Scored<Explanation> scored : found) {
      int wanted = scored.score() > bar ? most : least;
      if (list.size() < wanted && seen.add(scored.what().key())) {
        list.add(scored.what());
      }
    }
    if (seen.add(List.of())) {
      list.add(Explanation.NONE);
    }
    return list;
  }

  private List<Best.Scored<int[]>> pairs() {
    Best<int[]> best = new Best<>(GROWN_FROM);
    double[] gain = new double[alone.length];
    for (int e = 0; e < alone.length; e++) {
      int[] one = {e};
      gainsBeside(one, gain);
      double bar = best.bar() - alone[e];
      for (int f = e + 1; f < gain.length; f++) {
        if (gain[f] > bar && free(one, f)) {
          best.offer(alone[e] + gain[f], new int[] {e, f});
          bar = best.bar() - alone[e];
        }
      }
    }
    return best.sorted();
  }

  private List<Best.Scored<int[]>> grown(List<Best.Scored<int[]>> from) {
    Best<int[]> best = new Best<>(GROWN_FROM);
    Set<Long> seen = new HashSet<>();
    double[] gain = new double[alone.length];
    for (Best.Scored<int[]> scored : from) {
      int[] members = scored.what();
      gainsBeside(members, gain);
      double bar = best.bar() - scored.score();
      for (int e = 0; e < gain.length; e++) {
        if (gain[e] > bar && free(members, e)) {
          int[] more = Arrays.copyOf(members, members.length + 1);
          more[members.length] = e;
          if (seen.add(key(more))) {
            best.offer(scored.score() + gain[e], more);
            bar = best.bar() - scored.score();
          }
        }
      }
    }
    return best.sorted();
  }

  /// What every fault adds to the score of others.
  private void gainsBeside(int[] members, double[] gain) {
    System.arraycopy(alone, 0, gain, 0, gain.length);
    boolean among = false;
    for (int member : members) {
      RowAnswers.add(gain, -1, overlap[member]);
      among |= reversed[member];
    }
    for (int e = 0; e < gain.length; e++) {
      gain[e] += among && reversed[e] ? company : 0;
    }
  }

  /// One number for a set of at most four faults, whatever their order.
  private static long key(int[] members) {
    int[] ordered = members.clone();
    Arrays.sort(ordered);
    long key = 0;
    for (int member : ordered) {
      key = (key << 16) + member + 1;
    }
    return key;
  }

  private boolean free(int[] members, int candidate) {
    for (int member : members) {
      if (places[member] == places[candidate]) {
        return false;
      }
    }
    return true;
  }

  /// The explanation with each row in turn taken as belonging to nothing, where that helps.
  private List<Best.Scored<Explanation>> withSuspects(
      Best.Scored<int[]> scored, Explanation explanation) {
    double[] rest = residual.clone();
    double[] right = rows.ring().rightPolarisation();
    for (int e : scored.what()) {
      double[] change = faults.get(e).change(right);
      double[] shift = rows.answer(faults.get(e).place(), change[0], change[1]);
      for (int i = 0; i < rest.length; i++) {
        rest[i] -= shift[i];
      }
    }
    double[] solved = factor.solve(rest);
    double wild = rows.wildVariance();
    List<Best.Scored<Explanation>> found = new ArrayList<>();
    for (int i = 0; i < rest.length; i++) {
      double gain =
          0.5
              * (solved[i] * solved[i] / (inverseDiagonal[i] + 1 / wild)
                  - Math.log1p(wild * inverseDiagonal[i]));
      double change = gain + Math.log(priors.wildReading());
      if (change > -6) {
        found.add(new Best.Scored<>(scored.score() + change, explanation.with(Fault.suspect(i))));
      }
    }
    return found;
  }
}
