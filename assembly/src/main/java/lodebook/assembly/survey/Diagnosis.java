package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/// What a survey shows.
///
/// @param verdict pass, fault or cannot tell
/// @param findings what is wrong by the likeliest explanation, in slot order; may be empty
/// @param measuring what the person measuring did, by the likeliest explanation
/// @param measuringAlternatives other slips that explain the readings equally
/// @param runnerUp next explanation that names other magnets, or null where nothing was read
/// @param measureNext readings that would settle what is open, most useful first
/// @param wholeRing by what gain or distance all readings together would fit, or null
/// @param fitProbability probability of a misfit at least as large, by the likeliest explanation's
///   own covariance; below 1 in 10 000 nothing fits
/// @param reason why the verdict is what it is
/// @param disagreements places at which surveys of the same ring differ by more than their
///   uncertainty
public record Diagnosis(
    Verdict verdict,
    List<Finding> findings,
    Measuring measuring,
    List<Measuring> measuringAlternatives,
    @Nullable RunnerUp runnerUp,
    List<MeasureNext> measureNext,
    @Nullable WholeRing wholeRing,
    double fitProbability,
    Reason reason,
    List<Disagreement> disagreements) {
  public Diagnosis {
    findings = List.copyOf(findings);
    measuringAlternatives = List.copyOf(measuringAlternatives);
    measureNext = List.copyOf(measureNext);
    disagreements = List.copyOf(disagreements);
  }

  /// What one survey shows.
  public Diagnosis(
      Verdict verdict,
      List<Finding> findings,
      Measuring measuring,
      List<Measuring> measuringAlternatives,
      @Nullable RunnerUp runnerUp,
      List<MeasureNext> measureNext,
      @Nullable WholeRing wholeRing,
      double fitProbability,
      Reason reason) {
    this(
        verdict,
        findings,
        measuring,
        measuringAlternatives,
        runnerUp,
        measureNext,
        wholeRing,
        fitProbability,
        reason,
        List.of());
  }

  /// Whether the ring passes only if pockets are filled that would read nearly the same empty:
  /// [#measureNext] asks to look into them.
  public boolean passesIfPocketsAreFilled() {
    return verdict == Verdict.PASS
        && measureNext.stream().anyMatch(n -> n.why() == MeasureNext.Why.EMPTY_POCKET_ALIKE);
  }

  /// The same where the person measuring did something else.
  Diagnosis measured(Measuring otherwise) {
    return new Diagnosis(
        verdict,
        findings,
        otherwise,
        measuringAlternatives,
        runnerUp,
        measureNext,
        wholeRing,
        fitProbability,
        reason,
        disagreements);
  }

  /// The same where surveys disagree: a ring that would pass then does not.
  Diagnosis disagreeing(List<Disagreement> where) {
    List<MeasureNext> next = new ArrayList<>(measureNext);
    where.forEach(
        each -> next.add(new MeasureNext(each.point(), MeasureNext.Why.READ_AGAIN, List.of())));
    boolean fault = verdict == Verdict.FAULT;
    return new Diagnosis(
        fault ? verdict : Verdict.CANNOT_TELL,
        findings,
        measuring,
        measuringAlternatives,
        runnerUp,
        next.stream().distinct().toList(),
        wholeRing,
        fitProbability,
        fault ? reason : Reason.SURVEYS_DISAGREE,
        where);
  }

  /// Why a verdict is what it is.
  public enum Reason {
    /// Right, and the readings show it.
    SHOWN_RIGHT,
    /// The findings are shown.
    FAULT_SHOWN,
    /// Two explanations that name other magnets are too close.
    TOO_CLOSE,
    /// No explanation fits the readings.
    NOTHING_FITS,
    /// All readings are off together.
    WHOLE_RING_OFF,
    /// One reading belongs to nothing.
    SUSPECT_READING,
    /// What was read looks right, but it does not show every magnet.
    NOT_ALL_SHOWN,
    /// Surveys of the same ring differ by more than their uncertainty.
    SURVEYS_DISAGREE,
    /// There is no reading, or no magnet in the ring.
    NOTHING_READ
  }
}
