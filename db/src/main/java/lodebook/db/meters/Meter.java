package lodebook.db.meters;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;

/// An instrument.
///
/// @param code its number
/// @param kind what it measures
/// @param accuracyRelative standard deviation of its gain, relative (0.01 is 1 %)
/// @param floorTesla standard deviation of a reading near zero, tesla
/// @param sensingDepthMetres depth of the sensing element below the probe's tip, metres
/// @param calibrationDue the day until which its calibration holds, or null where none is known
/// @param retired whether it is used no more
public record Meter(
    String code,
    MeterKind kind,
    double accuracyRelative,
    double floorTesla,
    double sensingDepthMetres,
    @Nullable LocalDate calibrationDue,
    boolean retired) {}
