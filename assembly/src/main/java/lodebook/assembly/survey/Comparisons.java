package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import lodebook.assembly.layout.ProbePoint;
import org.hipparchus.special.Erf;

/// The explanations that readings ought to tell apart, two by two.
final class Comparisons {
  /// Φ(−d/2) = 1 in 1000.
  private static final double SINGLES_APART = square(2 * 3.0902);

  /// Φ(−d/2) = 1 in 100.
  private static final double PAIRS_APART = square(2 * 2.3263);

  private static final int NEAR_SLOTS = 2;

  /// @param least square of the separation that is wanted
  private record Two(List<Fault> one, List<Fault> other, double least) {}

  private final List<Two> singles;
  private final List<Two> pairs;

  Comparisons(RingModel ring) {
    this(new ArrayList<>(), new ArrayList<>());
    List<Fault> faults = new ArrayList<>();
    for (int slot = 0; slot < ring.slots(); slot++) {
      Possible.of(ring, slot).stream().filter(f -> !f.fitted()).forEach(faults::add);
    }
    for (int e = 0; e < faults.size(); e++) {
      singles.add(new Two(List.of(), List.of(faults.get(e)), SINGLES_APART));
      for (int f = e + 1; f < faults.size(); f++) {
        singles.add(new Two(List.of(faults.get(e)), List.of(faults.get(f)), SINGLES_APART));
      }
    }
    List<Fault> reversals = faults.stream().filter(f -> f.kind() == FaultKind.REVERSED).toList();
    for (int i = 0; i < reversals.size(); i++) {
      for (int j = i + 1; j < reversals.size(); j++) {
        addPair(reversals, i, j, faults, ring.slots());
      }
    }
  }

  private Comparisons(List<Two> singles, List<Two> pairs) {
    this.singles = singles;
    this.pairs = pairs;
  }

  private void addPair(List<Fault> reversals, int i, int j, List<Fault> faults, int slots) {
    List<Fault> pair = List.of(reversals.get(i), reversals.get(j));
    pairs.add(new Two(List.of(), pair, PAIRS_APART));
    for (Fault fault : faults) {
      if (near(fault, pair.getFirst(), slots) || near(fault, pair.getLast(), slots)) {
        pairs.add(new Two(List.of(fault), pair, PAIRS_APART));
      }
    }
    for (int k = 0; k < reversals.size(); k++) {
      for (int l = k + 1; l < reversals.size(); l++) {
        boolean later = k > i || (k == i && l > j);
        boolean straight =
            near(reversals.get(k), pair.getFirst(), slots)
                && near(reversals.get(l), pair.getLast(), slots);
        boolean crossed =
            near(reversals.get(l), pair.getFirst(), slots)
                && near(reversals.get(k), pair.getLast(), slots);
        if (later && (straight || crossed)) {
          pairs.add(new Two(pair, List.of(reversals.get(k), reversals.get(l)), PAIRS_APART));
        }
      }
    }
  }

  private static boolean near(Fault one, Fault other, int slots) {
    int steps = Math.floorMod(one.place() - other.place(), slots);
    return Math.min(steps, slots - steps) <= NEAR_SLOTS;
  }

  /// The same without what even these separations do not tell: no reading could be asked for it.
  Comparisons without(Separations all) {
    return new Comparisons(
        singles.stream().filter(two -> lack(two, all) == 0).toList(),
        pairs.stream().filter(two -> lack(two, all) == 0).toList());
  }

  /// How much is missing until everything is told apart; 0 if nothing is.
  double lack(Separations separations) {
    double sum = 0;
    for (Two two : singles) {
      sum += lack(two, separations);
    }
    for (Two two : pairs) {
      sum += lack(two, separations);
    }
    return sum;
  }

  private static double lack(Two two, Separations separations) {
    return Math.max(0, 1 - separations.square(two.one(), two.other()) / two.least());
  }

  ProbeReport report(List<ProbePoint> points, Separations separations) {
    List<ToldApart> single = told(singles, separations);
    List<ToldApart> pair = told(pairs, separations);
    return new ProbeReport(
        points,
        single.getFirst(),
        pair.getFirst(),
        single.stream().filter(t -> t.errorRate() > errorRate(SINGLES_APART)).toList(),
        pair.stream().filter(t -> t.errorRate() > errorRate(PAIRS_APART)).toList());
  }

  private static List<ToldApart> told(List<Two> twos, Separations separations) {
    return twos.stream()
        .map(
            two ->
                new ToldApart(
                    named(two.one()),
                    named(two.other()),
                    errorRate(separations.square(two.one(), two.other()))))
        .sorted(Comparator.comparingDouble(t -> -t.errorRate()))
        .toList();
  }

  private static List<NamedFault> named(List<Fault> faults) {
    return faults.stream().map(f -> new NamedFault(f.place() + 1, f.name())).toList();
  }

  private static double errorRate(double square) {
    return 0.5 * Erf.erfc(Math.sqrt(square) / (2 * Math.sqrt(2)));
  }

  private static double square(double value) {
    return value * value;
  }
}
