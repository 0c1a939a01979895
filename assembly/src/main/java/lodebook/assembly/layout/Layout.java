package lodebook.assembly.layout;

import org.jspecify.annotations.Nullable;

/// The design of one ring, one revision of it.
///
/// Radii in metres. Slots are numbered from 1 to polePairs × segmentsPerPolePair.
///
/// @param code the shop's number for the layout
/// @param revision letter or number of the revision
/// @param polePairs pole pairs p of the working wave
/// @param segmentsPerPolePair magnets k per pole pair: 2, 3, 4, 5, 6 or 8
/// @param focus side on which the field is to be strong
/// @param numbering which way slot numbers rise on the marked face
/// @param firstSlotClockDegrees clock angle of slot 1 on the marked face: 0 is 12 o'clock, 90 is 3
///   o'clock
/// @param firstFacing facing of slot 1
/// @param slotRadiusMetres axis to magnet centre
/// @param magnetType code of the magnet type
/// @param sideMagnetType code of the type for magnets lying along the ring, or null for the same
/// @param workingRadiusMetres radius of the working circle
/// @param probe how the ring is read
/// @param spread how well things stand where they should
/// @param adhesive adhesive in words, empty if none is named
/// @param adhesiveWorkingMinutes minutes until the adhesive sets, or null where the layout does not
///   say
/// @param bodyTurns whether a magnet's body turns with its facing
/// @param insertFrom the side from which a magnet goes in
/// @param workingAmplitudeTolerance allowed relative deviation of the working amplitude (0.03 is 3
///   %)
public record Layout(
    String code,
    String revision,
    int polePairs,
    int segmentsPerPolePair,
    Focus focus,
    Numbering numbering,
    double firstSlotClockDegrees,
    Facing firstFacing,
    double slotRadiusMetres,
    String magnetType,
    @Nullable String sideMagnetType,
    double workingRadiusMetres,
    Probe probe,
    Spread spread,
    String adhesive,
    @Nullable Double adhesiveWorkingMinutes,
    boolean bodyTurns,
    InsertFrom insertFrom,
    double workingAmplitudeTolerance) {

  /// Number of slots, N = k·p.
  public int slots() {
    return polePairs * segmentsPerPolePair;
  }

  /// Angle from slot 1 to a slot, radians, positive towards rising slot numbers.
  public double angleFromFirstRadians(int slot) {
    return 2 * Math.PI * (slot - 1) / slots();
  }

  /// The next higher slot number, 1 after the last.
  public int next(int slot) {
    return slot % slots() + 1;
  }

  /// The next lower slot number, the last before 1.
  public int previous(int slot) {
    return (slot + slots() - 2) % slots() + 1;
  }

  /// Facing of a slot by the Halbach rule f_i = f_1 + s·(i−1)·360°/k, s = +1 for focus in and −1
  /// for focus out.
  ///
  /// Source: Halbach 1980, Nucl. Instr. Meth. 169, 1; the signs are those of this project's slot
  /// frame.
  public Facing ruleFacing(int slot) {
    if (slot < 1 || slot > slots()) {
      throw new IllegalArgumentException(
          "layout " + code + " has slots 1 to " + slots() + ", not " + slot);
    }
    int sign = focus == Focus.IN ? 1 : -1;
    return firstFacing.turned(
        sign * ((slot - 1) % segmentsPerPolePair) * 360.0 / segmentsPerPolePair);
  }

  /// Whether the rule lays the magnet of a slot along the ring: within 45° of to-next or
  /// to-previous, 45° itself not.
  public boolean liesAlong(int slot) {
    double radians = ruleFacing(slot).radians();
    return Math.abs(Math.sin(radians)) > Math.abs(Math.cos(radians)) + 1e-9;
  }

  /// Code of the magnet type that belongs into a slot.
  public String typeAt(int slot) {
    return sideMagnetType != null && liesAlong(slot) ? sideMagnetType : magnetType;
  }

  /// The layout's name with its revision, `CODE@REVISION`.
  public String name() {
    return code + "@" + revision;
  }

  /// The same layout with other numbering and place of slot 1.
  ///
  /// @param firstClockDegrees clock angle of slot 1, 0 to below 360
  public Layout numbered(Numbering other, double firstClockDegrees) {
    return new Layout(
        code,
        revision,
        polePairs,
        segmentsPerPolePair,
        focus,
        other,
        firstClockDegrees,
        firstFacing,
        slotRadiusMetres,
        magnetType,
        sideMagnetType,
        workingRadiusMetres,
        probe,
        spread,
        adhesive,
        adhesiveWorkingMinutes,
        bodyTurns,
        insertFrom,
        workingAmplitudeTolerance);
  }

  /// The same layout with its magnets at another distance from the axis, metres.
  Layout withSlotRadius(double metres) {
    return new Layout(
        code,
        revision,
        polePairs,
        segmentsPerPolePair,
        focus,
        numbering,
        firstSlotClockDegrees,
        firstFacing,
        metres,
        magnetType,
        sideMagnetType,
        workingRadiusMetres,
        probe,
        spread,
        adhesive,
        adhesiveWorkingMinutes,
        bodyTurns,
        insertFrom,
        workingAmplitudeTolerance);
  }
}
