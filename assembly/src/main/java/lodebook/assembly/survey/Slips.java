package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.jspecify.annotations.Nullable;

/// Decides what the person measuring did.
///
/// Everything as set wins where it explains the readings, unless a slip is a thousand times as
/// probable. Look-alikes are not listed anywhere: every slip is tried on the ring's own expected
/// readings.
final class Slips {
  private static final double EQUAL = Math.log(20);
  private static final double AS_SET_WINS_BY = Math.log(1000);
  private static final double ROUGHLY_LIKE = 0.1;
  private static final double WITH_A_FAULT = 2;
  private static final int STRAINED_FAULTS = 3;
  private static final double STRAINED_FIT = 1e-3;

  private final RingModel ring;
  private final List<Reading> readings;
  private final Priors priors;

  Slips(RingModel ring, List<Reading> readings, Priors priors) {
    this.ring = ring;
    this.readings = readings;
    this.priors = priors;
  }

  private record Tried(Slip slip, RowModel rows, Judged judged) {
    double logWeight(Priors priors) {
      return judged.logWeight() + slip.logPrior(priors, rows.ring().slots());
    }
  }

  Account account() {
    RowModel asSet = rows(Slip.NONE);
    Account plain = new Account(Slip.NONE, asSet, Search.explain(asSet, priors), List.of());
    List<Tried> tried = new ArrayList<>(tried(Slip.NONE, Explanation.NONE, ROUGHLY_LIKE));
    if (isStrained(plain)) {
      tried.addAll(triedWithOneFault());
    }
    Tried slipped = likeliest(tried);
    boolean slipWins =
        slipped != null
            && (!plain.fits()
                || slipped.logWeight(priors) > plain.best().logWeight() + AS_SET_WINS_BY);
    return withAlternatives(slipWins && slipped != null ? searched(slipped.slip()) : plain);
  }

  /// Whether an explanation needs so much that a slip with one fault might do better.
  private static boolean isStrained(Account account) {
    return !account.fits()
        || account.best().explanation().faults().size() >= STRAINED_FAULTS
        || account.best().fitProbability() < STRAINED_FIT;
  }

  private @Nullable Tried likeliest(List<Tried> tried) {
    return tried.stream()
        .filter(t -> t.judged().fitProbability() >= Account.LEAST_FIT)
        .max(Comparator.comparingDouble(t -> t.logWeight(priors)))
        .orElse(null);
  }

  private Account searched(Slip slip) {
    RowModel rows = rows(slip);
    return new Account(slip, rows, Search.explain(rows, priors), List.of());
  }

  /// Every slip with every single fault that leaves little of the readings' energy unexplained.
  private List<Tried> triedWithOneFault() {
    double[] right = ring.rightPolarisation();
    List<Tried> tried = new ArrayList<>();
    for (Slip slip : Slip.all(ring.slots())) {
      if (slip.equals(Slip.NONE)) {
        continue;
      }
      List<Row> rows = slip.rows(readings, ring.layout());
      double[] rest = new double[rows.size()];
      double energy = 0;
      double left = 0;
      for (int i = 0; i < rest.length; i++) {
        double expected = ring.expected(rows.get(i), right);
        rest[i] = rows.get(i).fluxTesla() - expected;
        energy += expected * expected;
        left += rest[i] * rest[i];
      }
      if (left > WITH_A_FAULT * energy) {
        continue;
      }
      for (int slot = 0; slot < ring.slots(); slot++) {
        for (Fault fault : Possible.of(ring, slot)) {
          if (afterFault(rows, rest, fault, right) < ROUGHLY_LIKE * energy) {
            RowModel model = new RowModel(ring, rows);
            Explanation single = Explanation.NONE.with(fault);
            tried.add(new Tried(slip, model, new Judge(model, priors).judge(single)));
          }
        }
      }
    }
    return tried;
  }

  private double afterFault(List<Row> rows, double[] rest, Fault fault, double[] right) {
    int at = 2 * fault.place();
    double[] change = new double[2];
    fault.polarise(right[at], right[at + 1], change, 0);
    change[0] -= right[at];
    change[1] -= right[at + 1];
    double left = 0;
    for (int i = 0; i < rest.length; i++) {
      double[] flux = ring.fluxOf(rows.get(i));
      double value = rest[i] - flux[at] * change[0] - flux[at + 1] * change[1];
      left += value * value;
    }
    return left;
  }

  private Account withAlternatives(Account chosen) {
    Explanation explanation = chosen.best().explanation();
    List<Tried> equal = new ArrayList<>(tried(chosen.slip(), explanation, ROUGHLY_LIKE));
    if (!explanation.faults().isEmpty()) {
      equal.addAll(tried(chosen.slip(), Explanation.NONE, ROUGHLY_LIKE));
    }
    double bar = chosen.best().logWeight() - EQUAL;
    List<Slip> alternatives =
        equal.stream()
            .filter(t -> t.judged().fitProbability() >= Account.LEAST_FIT)
            .filter(t -> t.judged().logWeight() >= bar)
            .filter(t -> !t.slip().equals(chosen.slip()))
            .sorted(Comparator.comparingDouble(t -> -t.logWeight(priors)))
            .map(Tried::slip)
            .distinct()
            .toList();
    return new Account(chosen.slip(), chosen.rows(), chosen.weighed(), alternatives);
  }

  /// Weighs the image of an explanation under every slip that leaves less than a share of the
  /// readings' energy unexplained.
  private List<Tried> tried(Slip from, Explanation explanation, double share) {
    List<Tried> tried = new ArrayList<>();
    double[] polarisation = new double[0];
    for (Slip slip : Slip.all(ring.slots())) {
      if (slip.equals(Slip.NONE) && from.equals(Slip.NONE)) {
        continue;
      }
      Explanation image = from.image(explanation, slip, ring.slots());
      if (!standsOnMagnets(image)) {
        continue;
      }
      polarisation = ring.polarisation(image);
      if (leftOver(slip, polarisation) < share) {
        RowModel rows = rows(slip);
        tried.add(new Tried(slip, rows, new Judge(rows, priors).judge(image)));
      }
    }
    return tried;
  }

  private boolean standsOnMagnets(Explanation explanation) {
    return explanation.faults().stream().allMatch(f -> !f.ofMagnet() || ring.filled(f.place()));
  }

  private double leftOver(Slip slip, double[] polarisation) {
    double energy = 0;
    double left = 0;
    for (Reading reading : readings) {
      Row row = slip.row(reading, ring.layout());
      double expected = ring.expected(row, polarisation);
      energy += Math.max(expected * expected, 0);
      left += (row.fluxTesla() - expected) * (row.fluxTesla() - expected);
    }
    return energy > 0 ? left / energy : Double.POSITIVE_INFINITY;
  }

  private RowModel rows(Slip slip) {
    return new RowModel(ring, slip.rows(readings, ring.layout()));
  }
}
