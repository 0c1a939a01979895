package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.ProbePoint;
import org.jspecify.annotations.Nullable;

/// Turns an account of a survey into a verdict.
final class Conclusion {
  private static final double LEAST_ODDS = 20;
  private static final int TRIED_WITH_FREE_GAIN = 5;
  private static final double WITHIN_REACH = 10;

  private final RingModel ring;
  private final List<Reading> readings;
  private final Account account;
  private final Priors priors;
  private final ReadingFinder finder;
  private final Set<Integer> notShown;

  Conclusion(RingModel ring, List<Reading> readings, Account account, Priors priors) {
    this.ring = ring;
    this.readings = readings;
    this.account = account;
    this.priors = priors;
    this.finder = new ReadingFinder(ring);
    this.notShown = NotShown.in(account.rows());
  }

  Diagnosis diagnosis() {
    Judged best = account.best();
    Judged second = runnerUp();
    double odds =
        second == null ? Double.POSITIVE_INFINITY : Math.exp(best.logWeight() - second.logWeight());
    WholeRingFit whole = new WholeRingFit(account, priors);
    if (whole.likelierThan(best) || !account.fits()) {
      @Nullable WholeRing off = whole.estimate();
      return new Diagnosis(
          Verdict.CANNOT_TELL,
          List.of(),
          account.slip().measuring(),
          measuringAlternatives(),
          named(second, odds),
          off == null ? partingReadings(best, second) : List.of(),
          off,
          best.fitProbability(),
          off == null ? Diagnosis.Reason.NOTHING_FITS : Diagnosis.Reason.WHOLE_RING_OFF);
    }
    List<Finding> findings = findings(best.explanation());
    List<MeasureNext> next = new ArrayList<>();
    Verdict verdict;
    Diagnosis.Reason reason;
    if (best.explanation().faults().isEmpty() && !notShown.isEmpty()) {
      verdict = Verdict.CANNOT_TELL;
      reason = Diagnosis.Reason.NOT_ALL_SHOWN;
    } else if (odds < LEAST_ODDS || leansOnTheGain(best, whole)) {
      verdict = Verdict.CANNOT_TELL;
      reason = Diagnosis.Reason.TOO_CLOSE;
      next.addAll(partingReadings(best, second));
    } else if (!best.explanation().namesNoMagnet()) {
      verdict = Verdict.FAULT;
      reason = Diagnosis.Reason.FAULT_SHOWN;
      next.addAll(partingReadings(best, strengthBesides(best)));
    } else if (!best.explanation().faults().isEmpty()) {
      verdict = Verdict.CANNOT_TELL;
      reason = Diagnosis.Reason.SUSPECT_READING;
    } else {
      verdict = Verdict.PASS;
      reason = Diagnosis.Reason.SHOWN_RIGHT;
    }
    next.addAll(againReadings(best.explanation()));
    if (verdict != Verdict.PASS) {
      next.addAll(indexReadings(findings));
      for (int slot : notShown) {
        next.add(new MeasureNext(finder.showing(slot), MeasureNext.Why.NOT_YET_SHOWN, List.of()));
      }
    }
    next.addAll(emptyPockets(best));
    return new Diagnosis(
        verdict,
        findings,
        account.slip().measuring(),
        measuringAlternatives(),
        named(second, odds),
        next.stream().distinct().toList(),
        null,
        best.fitProbability(),
        reason);
  }

  private @Nullable Judged runnerUp() {
    Judged best = account.best();
    return account.weighed().stream()
        .filter(j -> saysOther(j.explanation(), best.explanation()))
        .filter(j -> !onlyAdds(j.explanation(), best.explanation()))
        .findFirst()
        .orElse(null);
  }

  /// Whether another explanation would win if all readings could be off together: a meter or probe
  /// beyond its stated accuracy must not make a fault.
  private boolean leansOnTheGain(Judged best, WholeRingFit whole) {
    return !best.explanation().namesNoMagnet()
        && account.weighed().stream()
            .filter(j -> saysOther(j.explanation(), best.explanation()))
            .filter(j -> !onlyAdds(j.explanation(), best.explanation()))
            .limit(TRIED_WITH_FREE_GAIN)
            .filter(j -> j.logWeight() > best.logWeight() - WITHIN_REACH)
            .anyMatch(j -> whole.logOddsFreed(best, j) < 0);
  }

  /// Whether two explanations name other magnets, or say of the same magnets what cannot be a
  /// matter of degree: weak shades into missing, reversed does not.
  private static boolean saysOther(Explanation one, Explanation other) {
    return !family(one).equals(family(other));
  }

  /// Whether an explanation says the same and only adds what does not contradict it: faults of
  /// magnets of which nothing was read yet, which are as likely before the readings as after them,
  /// or magnets that may be off in strength besides.
  private boolean onlyAdds(Explanation more, Explanation found) {
    Map<Integer, FaultKind> known = family(found);
    return !known.isEmpty()
        && family(more).entrySet().containsAll(known.entrySet())
        && more.faults().stream()
            .filter(f -> f.ofMagnet() && !known.containsKey(f.place()))
            .allMatch(f -> ofStrength(f) || notShown.contains(f.place() + 1));
  }

  private static boolean ofStrength(Fault fault) {
    return fault.name() == FaultKind.WEAK || fault.name() == FaultKind.STRONG;
  }

  /// The likeliest explanation that adds a weak or strong magnet to what was found, unless the odds
  /// against it are over 20 to 1.
  private @Nullable Judged strengthBesides(Judged best) {
    double bar = best.logWeight() - Math.log(LEAST_ODDS);
    return account.weighed().stream()
        .filter(j -> j.logWeight() > bar)
        .filter(j -> saysOther(j.explanation(), best.explanation()))
        .filter(j -> onlyAdds(j.explanation(), best.explanation()))
        .filter(j -> j.explanation().faults().stream().anyMatch(Conclusion::ofStrength))
        .findFirst()
        .orElse(null);
  }

  private static Map<Integer, FaultKind> family(Explanation explanation) {
    Map<Integer, FaultKind> family = new HashMap<>();
    for (Fault fault : explanation.faults()) {
      if (fault.ofMagnet()) {
        family.put(
            fault.place(), fault.kind() == FaultKind.WEAK ? FaultKind.MISSING : fault.name());
      }
    }
    return family;
  }

  private static @Nullable RunnerUp named(@Nullable Judged judged, double odds) {
    if (judged == null) {
      return null;
    }
    return new RunnerUp(names(judged.explanation()), odds);
  }

  private static List<NamedFault> names(Explanation explanation) {
    return explanation.faults().stream()
        .filter(Fault::ofMagnet)
        .map(f -> new NamedFault(f.place() + 1, f.name()))
        .toList();
  }

  private List<Measuring> measuringAlternatives() {
    return account.alternatives().stream()
        .map(Slip::measuring)
        .distinct()
        .filter(m -> !m.equals(account.slip().measuring()))
        .toList();
  }

  private List<Finding> findings(Explanation explanation) {
    double[] right = account.rows().mean(Explanation.NONE);
    double[][] covariance = account.rows().covariance(Explanation.NONE);
    List<Finding> findings = new ArrayList<>();
    for (Fault fault : explanation.faults()) {
      List<Evidence> evidence = new ArrayList<>();
      int slot =
          fault.ofMagnet()
              ? fault.place() + 1
              : account.rows().rows().get(fault.place()).point().slot();
      for (int i = 0; i < right.length; i++) {
        ProbePoint point = account.rows().rows().get(i).point();
        if (fault.ofMagnet() ? point.slot() == slot : i == fault.place()) {
          evidence.add(
              new Evidence(
                  point,
                  right[i],
                  2 * Math.sqrt(covariance[i][i]),
                  account.rows().rows().get(i).fluxTesla()));
        }
      }
      findings.add(finding(fault, slot, evidence));
    }
    return findings;
  }

  private Finding finding(Fault fault, int slot, List<Evidence> evidence) {
    Facing should = ring.layout().ruleFacing(slot);
    FaultKind kind = fault.name();
    @Nullable Facing faces =
        switch (kind) {
          case REVERSED -> should.reversed();
          case QUARTER_TURN_FORWARD -> should.turned(90);
          case QUARTER_TURN_BACK -> should.turned(-90);
          case TURNED -> should.turned(Math.toDegrees(fault.amount()));
          case WEAK, STRONG -> should;
          case MISSING, SUSPECT_READING -> null;
        };
    return new Finding(
        fault.ofMagnet() ? slot : readings.get(fault.place()).slot(),
        kind,
        should,
        faces,
        kind == FaultKind.TURNED ? Double.valueOf(Math.toDegrees(fault.amount())) : null,
        fault.kind() == FaultKind.WEAK || fault.kind() == FaultKind.STRONG
            ? Double.valueOf(fault.amount())
            : null,
        probability(fault),
        evidence,
        fault.ofMagnet() ? alsoPossible(slot) : List.of());
  }

  private double probability(Fault fault) {
    double top = account.best().logWeight();
    double with = 0;
    double all = 0;
    for (Judged judged : account.weighed()) {
      double weight = Math.exp(judged.logWeight() - top);
      all += weight;
      boolean names =
          judged.explanation().faults().stream()
              .anyMatch(f -> f.place() == fault.place() && f.name() == fault.name());
      if (names) {
        with += weight;
      }
    }
    return with / all;
  }

  private List<Integer> alsoPossible(int slot) {
    TreeSet<Integer> slots = new TreeSet<>();
    int written = account.slip().writtenSlot(slot, ring.slots());
    for (Slip slip : account.alternatives()) {
      slots.add(slip.realSlot(written, ring.slots()));
    }
    slots.remove(slot);
    return List.copyOf(slots);
  }

  private List<MeasureNext> partingReadings(Judged best, @Nullable Judged second) {
    if (second == null) {
      return List.of();
    }
    List<NamedFault> named = new ArrayList<>(names(best.explanation()));
    named.addAll(names(second.explanation()));
    return finder.parting(best.explanation(), second.explanation(), 2).stream()
        .map(point -> new MeasureNext(point, MeasureNext.Why.PARTS_EXPLANATIONS, named))
        .toList();
  }

  private List<MeasureNext> againReadings(Explanation explanation) {
    return explanation.faults().stream()
        .filter(f -> !f.ofMagnet())
        .map(
            f ->
                new MeasureNext(
                    account.rows().rows().get(f.place()).point(),
                    MeasureNext.Why.READ_AGAIN,
                    List.of()))
        .toList();
  }

  private List<MeasureNext> emptyPockets(Judged best) {
    return new EmptyPockets(account.rows(), priors)
        .alike(best).stream()
            .filter(slot -> !notShown.contains(slot))
            .map(this::emptyPocket)
            .toList();
  }

  private MeasureNext emptyPocket(int slot) {
    Fault missing = Fault.of(slot - 1, FaultKind.MISSING);
    List<Fault> others =
        account.best().explanation().faults().stream()
            .filter(f -> f.ofMagnet() && f.place() != slot - 1)
            .toList();
    ProbePoint point =
        finder
            .parting(account.best().explanation(), new Explanation(others).with(missing), 1)
            .getFirst();
    return new MeasureNext(
        point,
        MeasureNext.Why.EMPTY_POCKET_ALIKE,
        List.of(new NamedFault(slot, FaultKind.MISSING)));
  }

  private List<MeasureNext> indexReadings(List<Finding> findings) {
    return findings.stream()
        .filter(f -> !f.alsoPossibleSlots().isEmpty())
        .map(
            f ->
                new MeasureNext(
                    finder.showing(f.slot()),
                    MeasureNext.Why.AGAINST_INDEX_MARK,
                    List.of(new NamedFault(f.slot(), f.kind()))))
        .toList();
  }
}
