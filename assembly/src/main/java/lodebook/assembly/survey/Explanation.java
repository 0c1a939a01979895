package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.Comparator;
import java.util.List;

/// A set of faults that is to explain a survey; empty means that the ring is right.
///
/// @param faults at most one per magnet, magnets before readings, each in rising order of place
record Explanation(List<Fault> faults) {
  private static final Comparator<Fault> ORDER =
      Comparator.comparing((Fault f) -> !f.ofMagnet()).thenComparingInt(Fault::place);

  static final Explanation NONE = new Explanation(List.of());

  Explanation {
    faults = faults.stream().sorted(ORDER).toList();
  }

  Explanation with(Fault fault) {
    List<Fault> more = new ArrayList<>(faults);
    more.add(fault);
    return new Explanation(more);
  }

  Explanation withAll(List<Fault> others) {
    List<Fault> more = new ArrayList<>(faults);
    more.addAll(others);
    return new Explanation(more);
  }

  /// Slot indices of the magnets that it names.
  BitSet magnets() {
    BitSet set = new BitSet();
    faults.stream().filter(Fault::ofMagnet).forEach(f -> set.set(f.place()));
    return set;
  }

  /// The same without suspect readings.
  Explanation ofMagnets() {
    return new Explanation(faults.stream().filter(Fault::ofMagnet).toList());
  }

  /// Natural logarithm of the prior odds against a right ring, without the amounts.
  double logPrior(Priors priors) {
    double log = 0;
    boolean company = false;
    for (Fault fault : faults) {
      log += Math.log(company ? fault.priorInCompany(priors) : fault.prior(priors));
      company |= fault.kind() == FaultKind.REVERSED;
    }
    return log;
  }

  boolean namesNoMagnet() {
    return faults.stream().noneMatch(Fault::ofMagnet);
  }

  /// The same explanation whatever the fitted amounts.
  List<NamedFault> key() {
    return faults.stream().map(f -> new NamedFault(f.place(), f.kind())).toList();
  }
}
