package lodebook.db.layouts;

import lodebook.assembly.layout.Layout;
import lodebook.db.chain.Line;

/// What history says of an imported layout: every field of it, SI.
final class LayoutLines {
  private LayoutLines() {}

  static void write(Line line, Layout layout) {
    line.subject(layout.code())
        .field("layout", layout.code())
        .field("revision", layout.revision())
        .field("polePairs", layout.polePairs())
        .field("segmentsPerPolePair", layout.segmentsPerPolePair())
        .field("focus", layout.focus())
        .field("numbering", layout.numbering())
        .field("firstSlotClockDegrees", layout.firstSlotClockDegrees())
        .field("firstFacingDegrees", layout.firstFacing().degrees())
        .field("slotRadiusMetres", layout.slotRadiusMetres())
        .field("magnetType", layout.magnetType())
        .field("sideMagnetType", layout.sideMagnetType())
        .field("workingRadiusMetres", layout.workingRadiusMetres())
        .field("probeRadiusMetres", layout.probe().radiusMetres())
        .field("probeHeightMetres", layout.probe().heightMetres())
        .field("probeSpots", layout.probe().spots())
        .field("probeComponents", layout.probe().components())
        .field("pocketMetres", layout.spread().pocketMetres())
        .field("facingDegrees", layout.spread().facingDegrees())
        .field("probeMetres", layout.spread().probeMetres())
        .field("probeTiltDegrees", layout.spread().probeTiltDegrees())
        .field("adhesive", layout.adhesive())
        .field("adhesiveWorkingMinutes", layout.adhesiveWorkingMinutes())
        .field("bodyTurns", layout.bodyTurns())
        .field("insertFrom", layout.insertFrom())
        .field("workingAmplitudeTolerance", layout.workingAmplitudeTolerance());
  }
}
