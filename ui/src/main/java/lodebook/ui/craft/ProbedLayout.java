package lodebook.ui.craft;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.magnet.Grade;
import lodebook.assembly.magnet.Strength;
import lodebook.assembly.survey.Meter;
import lodebook.assembly.survey.PlacedMagnet;
import lodebook.assembly.survey.ProbeDesign;
import lodebook.assembly.survey.SurveyedRing;
import org.jspecify.annotations.Nullable;

/// A layout with magnets as they usually come, to judge its probe points before anything is built:
/// every magnet of the middle of its grade's range, measured to 1 %, read with a meter of 1 %.
public final class ProbedLayout {
  private static final Meter METER = new Meter("", 0.01, 0);
  private static final double STRENGTH_UNCERTAINTY = 0.01;

  private ProbedLayout() {}

  /// The judgement of a layout's probe points.
  ///
  /// @param design the layout with its magnet types
  /// @param grades the grades that the book knows
  public static ProbeDesign of(RingDesign design, List<Grade> grades) {
    return new ProbeDesign(new SurveyedRing(design, magnets(design, grades)), METER);
  }

  /// Magnets as they usually come, by slot.
  ///
  /// @param design the layout with its magnet types
  /// @param grades the grades that the book knows
  public static Map<Integer, PlacedMagnet> magnets(RingDesign design, List<Grade> grades) {
    Map<String, Grade> byName = new HashMap<>();
    grades.forEach(grade -> byName.put(grade.name(), grade));
    Map<Integer, PlacedMagnet> magnets = new HashMap<>();
    for (int slot = 1; slot <= design.slots(); slot++) {
      magnets.put(slot, magnet(byName.get(design.typeAt(slot).grade()), design, slot));
    }
    return magnets;
  }

  private static PlacedMagnet magnet(@Nullable Grade grade, RingDesign design, int slot) {
    if (grade == null) {
      throw new IllegalStateException(
          "type " + design.typeAt(slot).code() + " is of a grade that the book does not know");
    }
    double tesla = 0.5 * (grade.remanenceLowTesla() + grade.remanenceHighTesla());
    return new PlacedMagnet(
        new Strength(tesla, STRENGTH_UNCERTAINTY * tesla), grade.remanencePerKelvin());
  }
}
