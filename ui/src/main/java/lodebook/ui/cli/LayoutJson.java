package lodebook.ui.cli;

import java.util.Locale;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Probe;
import lodebook.assembly.layout.Spread;
import lodebook.db.layouts.LayoutWords;

/// A layout as JSON, with the keys of its file.
final class LayoutJson {
  private LayoutJson() {}

  static Json of(Layout layout) {
    Probe probe = layout.probe();
    Spread spread = layout.spread();
    return Json.object()
        .put("layout", layout.code())
        .put("revision", layout.revision())
        .put("polePairs", layout.polePairs())
        .put("segmentsPerPolePair", layout.segmentsPerPolePair())
        .put("slots", layout.slots())
        .put("focus", layout.focus().name().toLowerCase(Locale.ROOT))
        .put("numbering", layout.numbering().name().toLowerCase(Locale.ROOT))
        .put("firstSlotClockDegrees", layout.firstSlotClockDegrees())
        .put("firstFacingDegrees", layout.firstFacing().degrees())
        .put("slotRadiusMillimetres", layout.slotRadiusMetres() * 1000)
        .put("magnetType", layout.magnetType())
        .put("sideMagnetType", layout.sideMagnetType())
        .put("workingRadiusMillimetres", layout.workingRadiusMetres() * 1000)
        .put(
            "probe",
            Json.object()
                .put("radiusMillimetres", probe.radiusMetres() * 1000)
                .put("heightMillimetres", probe.heightMetres() * 1000)
                .put("spots", probe.spots().stream().map(LayoutWords::word).toList())
                .put("components", probe.components().stream().map(LayoutWords::word).toList()))
        .put(
            "spread",
            Json.object()
                .put("pocketMillimetres", spread.pocketMetres() * 1000)
                .put("facingDegrees", spread.facingDegrees())
                .put("probeMillimetres", spread.probeMetres() * 1000)
                .put("probeTiltDegrees", spread.probeTiltDegrees()))
        .put("adhesive", layout.adhesive())
        .put("adhesiveWorkingMinutes", layout.adhesiveWorkingMinutes())
        .put("bodyTurns", layout.bodyTurns())
        .put("insertFrom", layout.insertFrom().name().toLowerCase(Locale.ROOT))
        .put(
            "tolerance",
            Json.object().put("workingAmplitudePercent", layout.workingAmplitudeTolerance() * 100));
  }
}
