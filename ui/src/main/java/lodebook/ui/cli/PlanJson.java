package lodebook.ui.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import lodebook.assembly.plan.Arranged;
import lodebook.assembly.plan.RingFigures;
import lodebook.assembly.plan.RotorPlan;
import lodebook.assembly.survey.ExpectedReading;
import lodebook.db.builds.Plan;
import lodebook.db.builds.PlannedSlot;
import lodebook.db.layouts.LayoutWords;
import lodebook.ui.craft.Expectations;
import lodebook.ui.craft.Planned;
import lodebook.ui.craft.PlannedRing;
import lodebook.ui.craft.WhatIf;
import org.jspecify.annotations.Nullable;

/// A plan as JSON.
final class PlanJson {
  private PlanJson() {}

  /// A rotor's plan.
  ///
  /// @param computed what only the planner knows, or null for a plan that was stored before
  static Json of(PlannedRing ring, @Nullable RotorPlan computed) {
    Plan plan = ring.plan();
    Expectations expectations = ring.expectations();
    Json json =
        Json.object()
            .put("rotor", plan.rotor())
            .put("seed", plan.seed())
            .put("unwantedHarmonics", plan.unwantedHarmonics())
            .put("lowerBound", plan.lowerBound())
            .put("asTheyCome", plan.asTheyCome())
            .put("workingAmplitudeMilliTesla", plan.workingAmplitudeTesla() * 1000)
            .put("settings", plan.settings())
            .put("programVersion", plan.programVersion())
            .put("stockLine", plan.stockLine())
            .put("by", plan.by())
            .put("at", plan.at());
    if (computed != null) {
      json.put("lots", computed.lots())
          .put("freelyMixed", computed.freelyMixed())
          .put("targetAmplitudeMilliTesla", computed.targetAmplitudeTesla() * 1000)
          .put("withinTolerance", computed.withinTolerance());
    }
    return json.put(
        "placements", plan.slots().stream().map(s -> placement(expectations, s)).toList());
  }

  /// The plans of several rotors and what concerns them together.
  static Json together(List<PlannedRing> rings, Planned planned) {
    List<Json> spreads = new ArrayList<>();
    planned
        .amplitudeSpread()
        .forEach(
            (layout, spread) ->
                spreads.add(Json.object().put("layout", layout).put("percent", spread * 100)));
    return Json.object()
        .put(
            "plans",
            rings.stream()
                .map(ring -> of(ring, planned.computed().get(ring.plan().rotor())))
                .toList())
        .put("amplitudeSpread", spreads)
        .put("freelyMixed", planned.freelyMixed())
        .put("leftOver", planned.leftOver());
  }

  /// Arrangements side by side.
  static Json of(WhatIf whatIf) {
    List<Json> rotors = new ArrayList<>();
    whatIf
        .rotors()
        .forEach(
            rotor -> {
              Json json = Json.object().put("rotor", rotor.code());
              for (Arranged how : Arranged.values()) {
                json.put(key(how), figures(whatIf.figures().get(how), rotor.code()));
              }
              rotors.add(json);
            });
    Json spread = Json.object();
    for (Arranged how : Arranged.values()) {
      Double share = whatIf.pullOutSpread(how);
      spread.put(key(how), share == null ? null : share * 100);
    }
    return Json.object()
        .put("compared", rotors)
        .put("pullOutSpreadPercent", spread)
        .put("stored", false);
  }

  private static @Nullable Json figures(@Nullable Map<String, RingFigures> figures, String rotor) {
    RingFigures each = figures == null ? null : figures.get(rotor);
    return each == null
        ? null
        : Json.object()
            .put("unwantedHarmonics", each.unwantedHarmonics())
            .put("workingAmplitudeMilliTesla", each.workingAmplitudeTesla() * 1000);
  }

  private static String key(Arranged how) {
    return switch (how) {
      case AS_THEY_COME -> "asTheyCome";
      case SORTED -> "sorted";
      case PLANNED -> "planned";
    };
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
        .put("state", slot.state())
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
