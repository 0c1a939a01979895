package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import lodebook.assembly.layout.ProbePoint;
import org.hipparchus.special.Erf;

/// The explanations that readings ought to tell apart, two by two.
final class Comparisons {
  /// Φ(−d/2) = 1 in 1000.
  private static final double SINGLES_APART = square(2 * 3.0902);

  /// Φ(−d/2) = 1 in 100.
  private static final double PAIRS_APART = square(2 * 2.3263);

  private static final int NEAR_SLOTS = 2;
  private static final int[] NOTHING = {};

  /// Two explanations by the numbers of their faults.
  @SuppressWarnings("ArrayRecordComponent")
  private record Two(int[] one, int[] other) {}

  private final List<Fault> faults;
  private final List<Two> singles;
  private final List<Two> pairs;

  Comparisons(RingModel ring) {
    this(new ArrayList<>(), new ArrayList<>(), new ArrayList<>());
    int[] reversalAt = new int[ring.slots()];
    Arrays.fill(reversalAt, -1);
    for (int slot = 0; slot < ring.slots(); slot++) {
      for (Fault fault : Possible.of(ring, slot)) {
        if (!fault.fitted()) {
          if (fault.kind() == FaultKind.REVERSED) {
            reversalAt[slot] = faults.size();
          }
          faults.add(fault);
        }
      }
    }
    for (int e = 0; e < faults.size(); e++) {
      singles.add(new Two(NOTHING, new int[] {e}));
      for (int f = e + 1; f < faults.size(); f++) {
        singles.add(new Two(new int[] {e}, new int[] {f}));
      }
    }
    for (int i = 0; i < ring.slots(); i++) {
      for (int j = i + 1; j < ring.slots(); j++) {
        if (reversalAt[i] >= 0 && reversalAt[j] >= 0) {
          addPair(reversalAt, i, j);
        }
      }
    }
  }

  private Comparisons(List<Fault> faults, List<Two> singles, List<Two> pairs) {
    this.faults = faults;
    this.singles = singles;
    this.pairs = pairs;
  }

  private void addPair(int[] reversalAt, int i, int j) {
    int[] pair = {reversalAt[i], reversalAt[j]};
    int slots = reversalAt.length;
    pairs.add(new Two(NOTHING, pair));
    for (int f = 0; f < faults.size(); f++) {
      int place = faults.get(f).place();
      if (near(place, i, slots) || near(place, j, slots)) {
        pairs.add(new Two(new int[] {f}, pair));
      }
    }
    Set<Integer> seen = new HashSet<>();
    for (int di = -NEAR_SLOTS; di <= NEAR_SLOTS; di++) {
      for (int dj = -NEAR_SLOTS; dj <= NEAR_SLOTS; dj++) {
        int k = Math.floorMod(i + di, slots);
        int l = Math.floorMod(j + dj, slots);
        int first = Math.min(k, l);
        int last = Math.max(k, l);
        boolean later = first > i || (first == i && last > j);
        boolean there = first != last && reversalAt[first] >= 0 && reversalAt[last] >= 0;
        if (later && there && seen.add(first * slots + last)) {
          pairs.add(new Two(pair, new int[] {reversalAt[first], reversalAt[last]}));
        }
      }
    }
  }

  private static boolean near(int one, int other, int slots) {
    int steps = Math.floorMod(one - other, slots);
    return Math.min(steps, slots - steps) <= NEAR_SLOTS;
  }

  /// The faults that are compared, by their numbers.
  List<Fault> faults() {
    return List.copyOf(faults);
  }

  /// The same without what even these separations do not tell: no reading could be asked for it.
  Comparisons without(Separations all) {
    return new Comparisons(
        faults,
        singles.stream().filter(two -> lack(two, SINGLES_APART, all) == 0).toList(),
        pairs.stream().filter(two -> lack(two, PAIRS_APART, all) == 0).toList());
  }

  /// How much is missing until everything is told apart; 0 if nothing is.
  double lack(Separations separations) {
    double sum = 0;
    for (Two two : singles) {
      sum += lack(two, SINGLES_APART, separations);
    }
    for (Two two : pairs) {
      sum += lack(two, PAIRS_APART, separations);
    }
    return sum;
  }

  /// Whether everything is told apart.
  boolean allTold(Separations separations) {
    for (Two two : singles) {
      if (lack(two, SINGLES_APART, separations) > 0) {
        return false;
      }
    }
    for (Two two : pairs) {
      if (lack(two, PAIRS_APART, separations) > 0) {
        return false;
      }
    }
    return true;
  }

  private static double lack(Two two, double least, Separations separations) {
    return Math.max(0, 1 - separations.square(two.one(), two.other()) / least);
  }

  ProbeReport report(List<ProbePoint> points, Separations separations) {
    return new ProbeReport(
        points,
        worst(singles, separations),
        worst(pairs, separations),
        alike(singles, SINGLES_APART, separations),
        alike(pairs, PAIRS_APART, separations));
  }

  private ToldApart worst(List<Two> twos, Separations separations) {
    Two nearest = twos.getFirst();
    double least = Double.POSITIVE_INFINITY;
    for (Two two : twos) {
      double square = separations.square(two.one(), two.other());
      if (square < least) {
        least = square;
        nearest = two;
      }
    }
    return told(nearest, least);
  }

  private List<ToldApart> alike(List<Two> twos, double least, Separations separations) {
    List<ToldApart> alike = new ArrayList<>();
    for (Two two : twos) {
      double square = separations.square(two.one(), two.other());
      if (square < least) {
        alike.add(told(two, square));
      }
    }
    alike.sort(Comparator.comparingDouble(t -> -t.errorRate()));
    return alike;
  }

  private ToldApart told(Two two, double square) {
    return new ToldApart(
        named(two.one()), named(two.other()), 0.5 * Erf.erfc(Math.sqrt(square / 8)));
  }

  private List<NamedFault> named(int[] numbers) {
    return Arrays.stream(numbers)
        .mapToObj(faults::get)
        .map(f -> new NamedFault(f.place() + 1, f.name()))
        .toList();
  }

  private static double square(double value) {
    return value * value;
  }
}
