package lodebook.ui.craft;

import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.magnet.Grade;
import lodebook.assembly.magnet.Strength;
import lodebook.assembly.survey.ExpectedReading;
import lodebook.assembly.survey.ExpectedReadings;
import lodebook.assembly.survey.Meter;
import lodebook.assembly.survey.PlacedMagnet;
import lodebook.assembly.survey.ProbeResponses;
import lodebook.assembly.survey.SurveyedRing;
import lodebook.db.builds.PlannedSlot;

/// What a planned ring reads: when it is finished, and at each slot right after its magnet is in.
///
/// The meter is one of 1 % without a floor, which stands for whichever will be used.
public final class Expectations {
  private static final Meter METER = new Meter("", 0.01, 0);

  private final RingDesign design;
  private final ProbeResponses responses;
  private final Map<String, Grade> grades = new HashMap<>();
  private final Map<Integer, List<ExpectedReading>> finished = new HashMap<>();
  private final Map<Integer, List<ExpectedReading>> whenPlaced = new HashMap<>();

  /// @param design the ring
  /// @param grades the grades that the book knows
  /// @param standing strengths of what stands already, by slot
  /// @param planned the slots that a plan fills
  public Expectations(
      RingDesign design,
      List<Grade> grades,
      Map<Integer, Strength> standing,
      List<PlannedSlot> planned) {
    this.design = design;
    this.responses = new ProbeResponses(design);
    grades.forEach(g -> this.grades.put(g.name(), g));
    Map<Integer, PlacedMagnet> slots = new HashMap<>();
    standing.forEach((slot, strength) -> slots.put(slot, magnet(slot, strength)));
    List<PlannedSlot> inOrder =
        planned.stream().sorted(Comparator.comparingInt(PlannedSlot::fillStep)).toList();
    for (PlannedSlot each : inOrder) {
      slots.put(each.slot(), magnet(each.slot(), each.strength()));
      whenPlaced.put(each.slot(), expected(slots).of(each.slot()));
    }
    ExpectedReadings whole = expected(slots);
    for (int slot = 1; slot <= design.slots(); slot++) {
      finished.put(slot, whole.of(slot));
    }
  }

  private ExpectedReadings expected(Map<Integer, PlacedMagnet> slots) {
    return new ExpectedReadings(new SurveyedRing(design, slots), METER, responses);
  }

  private PlacedMagnet magnet(int slot, Strength strength) {
    Grade grade = grades.get(design.typeAt(slot).grade());
    return new PlacedMagnet(strength, grade == null ? 0 : grade.remanencePerKelvin());
  }

  /// Readings at a slot of the finished ring.
  public List<ExpectedReading> finished(int slot) {
    return finished.getOrDefault(slot, List.of());
  }

  /// Readings at a slot right after its magnet is in; empty where the plan does not fill it.
  public List<ExpectedReading> whenPlaced(int slot) {
    return whenPlaced.getOrDefault(slot, List.of());
  }
}
