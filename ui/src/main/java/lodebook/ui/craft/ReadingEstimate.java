package lodebook.ui.craft;

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
import lodebook.db.stock.StrengthEstimator;
import lodebook.db.stock.TakenReading;
import org.jspecify.annotations.Nullable;

/// How strong a piece is, from its readings: one gauge for each magnet type.
public final class ReadingEstimate implements StrengthEstimator {
  private final Map<MagnetType, RemanenceGauge> gauges = new HashMap<>();

  @Override
  public Strength estimate(MagnetType type, Grade grade, List<TakenReading> readings) {
    return gauges
        .computeIfAbsent(type, t -> new RemanenceGauge(t, grade))
        .estimate(readings.stream().map(ReadingEstimate::gauging).toList())
        .strength();
  }

  private static Gauging gauging(TakenReading reading) {
    return new Gauging(
        reading.fluxTesla(),
        reading.standoffMetres(),
        reading.temperatureCelsius(),
        instrument(reading.meter()));
  }

  private static Instrument instrument(@Nullable Meter meter) {
    return meter == null
        ? Instrument.UNNAMED
        : new Instrument(meter.code(), meter.accuracyRelative(), meter.floorTesla());
  }
}
