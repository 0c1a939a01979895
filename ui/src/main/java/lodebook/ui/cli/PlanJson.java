package lodebook.ui.cli;

import java.util.List;
import lodebook.assembly.survey.ExpectedReading;
import lodebook.db.builds.Plan;
import lodebook.db.builds.PlannedSlot;
import lodebook.db.layouts.LayoutWords;
import lodebook.ui.craft.Expectations;
import lodebook.ui.craft.PlannedRing;

/// A plan as JSON.
final class PlanJson {
  private PlanJson() {}

  static Json of(PlannedRing ring) {
    Plan plan = ring.plan();
    Expectations expectations = ring.expectations();
    return Json.object()
        .put("rotor", plan.rotor())
        .put("seed", plan.seed())
        .put("unwantedHarmonics", plan.unwantedHarmonics())
        .put("lowerBound", plan.lowerBound())
        .put("asTheyCome", plan.asTheyCome())
        .put("workingAmplitudeMilliTesla", plan.workingAmplitudeTesla() * 1000)
        .put("placements", plan.slots().stream().map(s -> placement(expectations, s)).toList());
  }

  private static Json placement(Expectations expectations, PlannedSlot slot) {
    return Json.object()
        .put("slot", slot.slot())
        .put("piece", slot.magnet())
        .put("facingDegrees", slot.facing().degrees())
        .put("fillStep", slot.fillStep())
        .put("remark", slot.remark())
        .put("tray", slot.tray())
        .put("cell", slot.cell())
        .put("expected", readings(expectations.finished(slot.slot())))
        .put("expectedWhenPlaced", readings(expectations.whenPlaced(slot.slot())));
  }

  private static List<Json> readings(List<ExpectedReading> readings) {
    return readings.stream()
        .map(
            r ->
                Json.object()
                    .put("spot", LayoutWords.word(r.point().spot()))
                    .put("component", LayoutWords.word(r.point().component()))
                    .put("valueMilliTesla", r.valueTesla() * 1000)
                    .put("bandMilliTesla", r.bandTesla() * 1000))
        .toList();
  }
}
