package lodebook.assembly.survey;

import java.util.List;
import org.jspecify.annotations.Nullable;

/// Says what a survey shows.
///
/// One explainer serves one ring as built; it keeps the field's response at the points read so far,
/// so further surveys of the same ring are quick. Safe for use by several threads.
public final class SurveyExplainer {
  /// What is said where there is nothing to judge.
  static final Diagnosis NOTHING_READ =
      new Diagnosis(
          Verdict.CANNOT_TELL,
          List.of(),
          Measuring.AS_SET,
          List.of(),
          null,
          List.of(),
          null,
          1,
          Diagnosis.Reason.NOTHING_READ);

  private final RingModel ring;
  private final Priors priors;

  /// @param ring the ring as the record says it was built
  /// @param priors what is believed before the first reading
  public SurveyExplainer(SurveyedRing ring, Priors priors) {
    this(ring, priors, new ProbeResponses(ring.design()));
  }

  /// @param ring the ring as the record says it was built
  /// @param priors what is believed before the first reading
  /// @param responses of the same design, perhaps shared with other rings
  public SurveyExplainer(SurveyedRing ring, Priors priors, ProbeResponses responses) {
    if (!responses.design().equals(ring.design())) {
      throw new IllegalArgumentException(
          "responses of layout "
              + responses.design().layout().name()
              + " do not serve layout "
              + ring.layout().name());
    }
    this.ring = new RingModel(ring, responses);
    this.priors = priors;
  }

  /// Explains readings, which may cover only some slots, repeat points, and come from several
  /// meters.
  ///
  /// @throws IllegalArgumentException if a reading names a slot that the layout does not have
  public Diagnosis explain(List<Reading> readings) {
    @Nullable Account account = account(readings, null);
    return account == null ? NOTHING_READ : diagnosis(readings, account);
  }

  /// The account of readings, or null where there is nothing to judge.
  ///
  /// @param expected what the readings but for the last few said, or null
  @Nullable Account account(List<Reading> readings, @Nullable Explanation expected) {
    for (Reading reading : readings) {
      if (reading.slot() < 1 || reading.slot() > ring.slots()) {
        throw new IllegalArgumentException(
            "layout "
                + ring.layout().name()
                + " has slots 1 to "
                + ring.slots()
                + ", a reading names slot "
                + reading.slot());
      }
    }
    return readings.isEmpty() || ring.empty()
        ? null
        : new Slips(ring, readings, priors, expected).account();
  }

  Diagnosis diagnosis(List<Reading> readings, Account account) {
    return new Conclusion(ring, readings, account, priors).diagnosis();
  }
}
