package lodebook.assembly.magnet;

import java.util.List;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.LUDecomposition;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.linear.RealVector;

/// Works out a piece's remanence from its readings; one gauge serves all pieces of a type.
///
/// Each reading gives B / (b(s)·(1 + α(T − 20))), b the flux per remanence at the standoff. They
/// are averaged by generalised least squares (Aitken 1935, Proc. R. Soc. Edinb. 55, 42) with a
/// covariance made of:
/// - the meter's gain, common to all readings of one meter, so that repeating a reading does not
///   average it away;
/// - the meter's floor, fresh at each reading;
/// - the standoff, 0.02 mm fresh at each reading (this project's choice: what a spacer and a hand
///   hold; at 1 mm over a 4 mm face it is worth 0.9 %);
/// - the temperature, 3 K common to all readings without one;
/// - the dimensions, ± tolerance evenly spread (standard deviation tolerance/√3), each dimension of
///   its own, common to all readings of the piece.
public final class RemanenceGauge {
  /// Standard deviation of a standoff, metres.
  public static final double STANDOFF_METRES = 0.02e-3;

  /// Standard deviation of a temperature that nobody noted, kelvin.
  public static final double UNKNOWN_TEMPERATURE_KELVIN = 3;

  private static final double STEP = 1e-6;

  private final Grade grade;
  private final FaceFlux nominal;
  private final List<FaceFlux> grown;
  private final double dimensionMetres;

  /// A gauge for pieces of a type, of its grade.
  public RemanenceGauge(MagnetType type, Grade grade) {
    this.grade = grade;
    nominal = new FaceFlux(type);
    grown = Dimensions.eachGrown(type, STEP).stream().map(FaceFlux::new).toList();
    dimensionMetres = type.toleranceMetres() / Math.sqrt(3);
  }

  /// The remanence that readings of one piece show.
  ///
  /// @param readings one or more
  public RemanenceEstimate estimate(List<Gauging> readings) {
    if (readings.isEmpty()) {
      throw new IllegalArgumentException("a remanence needs at least one reading");
    }
    int count = readings.size();
    double[] remanences = new double[count];
    double mean = 0;
    for (int i = 0; i < count; i++) {
      Gauging reading = readings.get(i);
      remanences[i] =
          reading.fluxTesla()
              / (nominal.perRemanence(reading.standoffMetres()) * temperatureFactor(reading));
      mean += remanences[i] / count;
    }
    RealMatrix own = ownCovariance(readings, mean);
    RealMatrix shared = sharedCovariance(readings, mean);
    RealVector ones = new ArrayRealVector(count, 1);
    RealVector weights = new LUDecomposition(own.add(shared)).getSolver().solve(ones);
    weights.mapMultiplyToSelf(1 / weights.dotProduct(ones));
    double best = weights.dotProduct(new ArrayRealVector(remanences, false));
    double ownPart = weights.dotProduct(own.operate(weights));
    double sharedPart = weights.dotProduct(shared.operate(weights));
    return new RemanenceEstimate(
        new Strength(best, Math.sqrt(ownPart + sharedPart)),
        Math.sqrt(sharedPart),
        Math.sqrt(ownPart));
  }

  private double temperatureFactor(Gauging reading) {
    Double celsius = reading.temperatureCelsius();
    return celsius == null ? 1 : grade.remanenceFactorAt(celsius);
  }

  private RealMatrix sharedCovariance(List<Gauging> readings, double mean) {
    int count = readings.size();
    RealMatrix covariance = new Array2DRowRealMatrix(count, count);
    for (int i = 0; i < count; i++) {
      Instrument meter = readings.get(i).meter();
      for (int j = 0; j < count; j++) {
        if (readings.get(j).meter().code().equals(meter.code())) {
          double gain = meter.accuracy() * mean;
          covariance.setEntry(i, j, gain * gain);
        }
      }
    }
    return covariance;
  }

  private RealMatrix ownCovariance(List<Gauging> readings, double mean) {
    int count = readings.size();
    RealMatrix covariance = new Array2DRowRealMatrix(count, count);
    double[][] slopes = new double[count][];
    for (int i = 0; i < count; i++) {
      slopes[i] = dimensionSlopes(readings.get(i).standoffMetres());
    }
    for (int i = 0; i < count; i++) {
      Gauging reading = readings.get(i);
      double s = reading.standoffMetres();
      double here = nominal.perRemanence(s);
      double standoff =
          mean * STANDOFF_METRES * (nominal.perRemanence(s + STEP) - here) / (STEP * here);
      double floor = reading.meter().floorTesla() / (here * temperatureFactor(reading));
      covariance.addToEntry(i, i, standoff * standoff + floor * floor);
      for (int j = 0; j < count; j++) {
        double common = 0;
        for (int n = 0; n < slopes[i].length; n++) {
          common += slopes[i][n] * slopes[j][n];
        }
        if (reading.temperatureCelsius() == null && readings.get(j).temperatureCelsius() == null) {
          double kelvin = grade.remanencePerKelvin() * UNKNOWN_TEMPERATURE_KELVIN;
          common += kelvin * kelvin;
        }
        covariance.addToEntry(i, j, mean * mean * common);
      }
    }
    return covariance;
  }

  /// Relative change of the flux per remanence for one standard deviation of each dimension.
  private double[] dimensionSlopes(double standoff) {
    double here = nominal.perRemanence(standoff);
    return grown.stream()
        .mapToDouble(flux -> dimensionMetres * (flux.perRemanence(standoff) / here - 1) / STEP)
        .toArray();
  }
}
