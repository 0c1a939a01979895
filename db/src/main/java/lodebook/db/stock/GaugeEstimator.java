package lodebook.db.stock;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.magnet.Gauging;
import lodebook.assembly.magnet.Grade;
import lodebook.assembly.magnet.Instrument;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.RemanenceGauge;
import lodebook.assembly.magnet.Strength;
import lodebook.db.meters.Meter;

/// Estimates strengths with one gauge for each type.
final class GaugeEstimator implements StrengthEstimator {
  private final Map<MagnetType, RemanenceGauge> gauges = new HashMap<>();

  @Override
  public Strength estimate(MagnetType type, Grade grade, List<TakenReading> readings) {
    return gauges
        .computeIfAbsent(type, t -> new RemanenceGauge(t, grade))
        .estimate(readings.stream().map(GaugeEstimator::gauging).toList())
        .strength();
  }

  private static Gauging gauging(TakenReading reading) {
    Meter meter = reading.meter();
    return new Gauging(
        reading.fluxTesla(),
        reading.standoffMetres(),
        reading.temperatureCelsius(),
        meter == null
            ? Instrument.UNNAMED
            : new Instrument(meter.code(), meter.accuracyRelative(), meter.floorTesla()));
  }
}
