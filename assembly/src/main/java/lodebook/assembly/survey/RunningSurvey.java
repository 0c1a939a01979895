package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.RingDesign;
import org.jspecify.annotations.Nullable;

/// A ring that is filled and read position by position, judged after every single reading: right
/// ([Verdict#PASS]: all that stands is shown right), wrong ([Verdict#FAULT]) or open
/// ([Verdict#CANNOT_TELL], with the readings that would settle it).
///
/// Every reading is compared with the ring as far as it was filled then; what was read earlier
/// counts on. Not safe for use by several threads.
public final class RunningSurvey {
  private final RingDesign design;
  private final Priors priors;
  private final ProbeResponses responses;
  private final Map<Integer, PlacedMagnet> magnets = new HashMap<>();
  private final List<Reading> readings = new ArrayList<>();
  private @Nullable Explanation lastSaid;
  private @Nullable SurveyExplainer explainer;

  /// @param design the ring
  /// @param priors what is believed before the first reading
  public RunningSurvey(RingDesign design, Priors priors) {
    this(design, priors, new ProbeResponses(design));
  }

  /// @param design the ring
  /// @param priors what is believed before the first reading
  /// @param responses of the same design, perhaps shared with other rings
  public RunningSurvey(RingDesign design, Priors priors, ProbeResponses responses) {
    this.design = design;
    this.priors = priors;
    this.responses = responses;
  }

  /// Puts a magnet into a slot that is empty.
  public void place(int slot, PlacedMagnet magnet) {
    if (magnets.putIfAbsent(slot, magnet) != null) {
      throw new IllegalArgumentException("slot " + slot + " is filled already");
    }
    explainer = null;
  }

  /// Takes one reading in and judges all that was read so far.
  public Diagnosis read(Reading reading) {
    boolean whole = magnets.size() == design.slots();
    readings.add(whole ? reading : reading.whenFilled(magnets.keySet()));
    SurveyExplainer current = explainer;
    if (current == null) {
      current = new SurveyExplainer(new SurveyedRing(design, magnets), priors, responses);
      explainer = current;
    }
    @Nullable Account account = current.account(readings, lastSaid);
    if (account == null) {
      return SurveyExplainer.NOTHING_READ;
    }
    boolean asSet = account.slip().equals(Slip.NONE);
    lastSaid = asSet && account.fits() ? account.best().explanation() : null;
    return current.diagnosis(List.copyOf(readings), account);
  }
}
