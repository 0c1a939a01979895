package lodebook.ui.desk.bench;

import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.RingDesign;
import lodebook.assembly.survey.ExpectedReading;
import lodebook.assembly.survey.PlacedMagnet;
import lodebook.db.builds.RotorShown;
import org.jspecify.annotations.Nullable;

/// One step at the bench: a magnet for a slot, and the readings to take there.
///
/// @param rotor the rotor as it stands
/// @param slot where the magnet goes
/// @param step which step it is, from 1
/// @param of how many steps the ring takes
/// @param magnet `LOT/NUMBER`, or `LOT` for an unmeasured magnet
/// @param lot its lot
/// @param tray the tray in which it lies, or null
/// @param cell its cell, or null
/// @param facing the way its north must point
/// @param warning what the builder must mind, empty for nothing
/// @param placed whether it is in already, and only readings are missing
/// @param toRead the probe points still to be read, in order
/// @param expected what they should read once it is in
/// @param survey the survey to which readings belong, or null before the first
/// @param standing the magnets in the ring with this one in
/// @param told whether one of its readings showed which way it faces
public record BenchStep(
    RotorShown rotor,
    int slot,
    int step,
    int of,
    String magnet,
    String lot,
    @Nullable String tray,
    @Nullable String cell,
    Facing facing,
    String warning,
    boolean placed,
    List<ProbePoint> toRead,
    List<ExpectedReading> expected,
    @Nullable String survey,
    Map<Integer, PlacedMagnet> standing,
    boolean told) {
  public BenchStep {
    toRead = List.copyOf(toRead);
    expected = List.copyOf(expected);
    standing = Map.copyOf(standing);
  }

  /// The rotor's number.
  public String code() {
    return rotor.rotor().code();
  }

  /// The ring's design.
  public RingDesign design() {
    return rotor.design();
  }

  /// The step after one of its readings was taken.
  BenchStep afterReading(String surveyCode, boolean tells) {
    return new BenchStep(
        rotor,
        slot,
        step,
        of,
        magnet,
        lot,
        tray,
        cell,
        facing,
        warning,
        true,
        toRead.subList(1, toRead.size()),
        expected.subList(1, expected.size()),
        surveyCode,
        standing,
        told || tells);
  }

  /// The same step with all its readings to be taken once more.
  BenchStep readAgain(List<ProbePoint> points, List<ExpectedReading> readings) {
    return new BenchStep(
        rotor, slot, step, of, magnet, lot, tray, cell, facing, warning, placed, points, readings,
        survey, standing, false);
  }
}
