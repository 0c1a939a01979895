package lodebook.assembly.survey;

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
public record Diagnosis(
    Verdict verdict,
    List<Finding> findings,
    Measuring measuring,
    List<Measuring> measuringAlternatives,
    @Nullable RunnerUp runnerUp,
    List<MeasureNext> measureNext,
    @Nullable WholeRing wholeRing,
    double fitProbability,
    Reason reason) {
  public Diagnosis {
    findings = List.copyOf(findings);
    measuringAlternatives = List.copyOf(measuringAlternatives);
    measureNext = List.copyOf(measureNext);
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
    /// There is no reading, or no magnet in the ring.
    NOTHING_READ
  }
}
