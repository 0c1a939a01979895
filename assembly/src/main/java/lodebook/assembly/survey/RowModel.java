package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.ReadingPlace;
import lodebook.assembly.layout.Spread;

/// Mean and covariance of a set of rows for any explanation.
///
/// Readings answer linearly to the polarisation of the magnets. Their covariance has a part of each
/// magnet (strength, facing, pocket), parts common to all (meter gain, shared doubts, unknown
/// temperature) and a part of each row alone (probe position and tilt, floor). The page
/// docs/decisions/survey-model.md explains it.
final class RowModel {
  private static final double UNKNOWN_TEMPERATURE_KELVIN = 3;
  private static final double LEAST_SD_TESLA = 2e-5;
  private static final int OWN_COLUMNS = 4;

  private final RingModel ring;
  private final List<Row> rows;
  private final double[] read;
  private final double[][] flux;
  private final double[][] across;
  private final double[][] probeOut;
  private final double[][] probeNext;
  private final double[][] probeUp;
  private final double[][] magnetOut;
  private final double[][] magnetNext;
  private final double[][] ownCovariance;
  private final Map<String, double[]> gains = new LinkedHashMap<>();
  private final double gainSpread;

  RowModel(RingModel ring, List<Row> rows) {
    this(ring, rows, 0);
  }

  /// @param gainSpread further relative gain error common to all rows, a standard deviation; 0 for
  ///   none
  RowModel(RingModel ring, List<Row> rows, double gainSpread) {
    this.ring = ring;
    this.rows = List.copyOf(rows);
    this.gainSpread = gainSpread;
    int count = rows.size();
    int width = 2 * ring.slots();
    read = rows.stream().mapToDouble(Row::fluxTesla).toArray();
    flux = new double[count][width];
    across = new double[count][width];
    probeOut = new double[count][width];
    probeNext = new double[count][width];
    probeUp = new double[count][width];
    magnetOut = new double[count][width];
    magnetNext = new double[count][width];
    for (int i = 0; i < count; i++) {
      fill(i);
      Meter meter = rows.get(i).meter();
      gains.computeIfAbsent(meter.name(), name -> new double[count])[i] = meter.accuracy();
    }
    ownCovariance = new double[count][];
    for (int i = 0; i < count; i++) {
      ownCovariance[i] = new double[i + 1];
    }
    double[] right = ring.rightPolarisation();
    for (int slot = 0; slot < ring.slots(); slot++) {
      if (ring.filled(slot)) {
        addOwn(ownCovariance, slot, right[2 * slot], right[2 * slot + 1], 1);
      }
    }
  }

  private void fill(int i) {
    Row row = rows.get(i);
    ReadingResponse response =
        ring.responseAt(
            ReadingPlace.of(ring.layout(), row.point(), row.radiusMetres(), row.heightMetres()));
    double[][] from = {
      response.flux(),
      response.across(),
      response.probeOut(),
      response.probeNext(),
      response.probeUp(),
      response.magnetOut(),
      response.magnetNext()
    };
    double[][] to = {
      flux[i], across[i], probeOut[i], probeNext[i], probeUp[i], magnetOut[i], magnetNext[i]
    };
    for (int slot = 0; slot < ring.slots(); slot++) {
      PlacedMagnet magnet = ring.magnet(slot);
      double warm =
          magnet == null ? 1 : 1 + magnet.remanencePerKelvin() * row.kelvinAboveReference();
      for (int q = 0; q < to.length; q++) {
        to[q][2 * slot] = warm * from[q][2 * slot];
        to[q][2 * slot + 1] = warm * from[q][2 * slot + 1];
      }
    }
  }

  RingModel ring() {
    return ring;
  }

  List<Row> rows() {
    return rows;
  }

  int count() {
    return rows.size();
  }

  double[] read() {
    return read.clone();
  }

  /// Expected readings, tesla.
  double[] mean(double[] polarisation) {
    return times(flux, polarisation);
  }

  /// Change of the readings per change of one slot's polarisation.
  double[] answer(int slot, double out, double next) {
    double[] change = new double[rows.size()];
    for (int i = 0; i < change.length; i++) {
      change[i] = flux[i][2 * slot] * out + flux[i][2 * slot + 1] * next;
    }
    return change;
  }

  double answer(int row, int column) {
    return flux[row][column];
  }

  /// Change of the readings per metre that the probe moves away from the axis.
  double[] probeSlope(double[] polarisation) {
    return times(probeOut, polarisation);
  }

  /// Covariance of the readings under an explanation, lower triangle.
  double[][] covariance(Explanation explanation) {
    double[] p = ring.polarisation(explanation);
    double[][] matrix = new double[rows.size()][];
    for (int i = 0; i < matrix.length; i++) {
      matrix[i] = ownCovariance[i].clone();
    }
    double[] right = ring.rightPolarisation();
    for (Fault fault : explanation.faults()) {
      int slot = fault.place();
      if (fault.ofMagnet() && fault.kind() != FaultKind.REVERSED) {
        addOwn(matrix, slot, right[2 * slot], right[2 * slot + 1], -1);
        addOwn(matrix, slot, p[2 * slot], p[2 * slot + 1], 1);
      }
    }
    for (double[] column : commonColumns(p)) {
      addOuter(matrix, column, 1);
    }
    double[] single = singleVariances(p);
    for (int i = 0; i < matrix.length; i++) {
      matrix[i][i] += single[i];
    }
    for (Fault fault : explanation.faults()) {
      if (!fault.ofMagnet()) {
        matrix[fault.place()][fault.place()] += wildVariance();
      }
    }
    return matrix;
  }

  /// Variance given to a reading that belongs to nothing: it may be anything as large as the ring's
  /// own readings and as this one is.
  double wildVariance() {
    double largest = 1e-3;
    for (double value : mean(ring.rightPolarisation())) {
      largest = Math.max(largest, Math.abs(value));
    }
    for (double value : read) {
      largest = Math.max(largest, Math.abs(value));
    }
    return largest * largest;
  }

  /// Variances of the rows' own errors: fresh probe position and tilt, floor.
  double[] singleVariances(double[] polarisation) {
    return singles(
        times(probeOut, polarisation),
        times(probeNext, polarisation),
        times(probeUp, polarisation),
        times(across, polarisation));
  }

  /// Like [#singleVariances] but the largest that any one reversed magnet makes of it.
  double[] largestSingleVariances(double[] polarisation) {
    double[][] all = {
      times(probeOut, polarisation),
      times(probeNext, polarisation),
      times(probeUp, polarisation),
      times(across, polarisation)
    };
    double[][][] responses = {probeOut, probeNext, probeUp, across};
    double[] largest = singles(all[0], all[1], all[2], all[3]);
    for (int slot = 0; slot < ring.slots(); slot++) {
      double[][] turned = new double[4][rows.size()];
      for (int q = 0; q < 4; q++) {
        for (int i = 0; i < rows.size(); i++) {
          double[] line = responses[q][i];
          turned[q][i] =
              all[q][i]
                  - 2
                      * (line[2 * slot] * polarisation[2 * slot]
                          + line[2 * slot + 1] * polarisation[2 * slot + 1]);
        }
      }
      double[] here = singles(turned[0], turned[1], turned[2], turned[3]);
      for (int i = 0; i < here.length; i++) {
        largest[i] = Math.max(largest[i], here[i]);
      }
    }
    return largest;
  }

  private double[] singles(double[] radial, double[] tangential, double[] axial, double[] other) {
    Spread spread = ring.layout().spread();
    double probe = spread.probeMetres() * spread.probeMetres();
    double tilt = Math.toRadians(spread.probeTiltDegrees());
    double[] variances = new double[rows.size()];
    for (int i = 0; i < variances.length; i++) {
      double floor = rows.get(i).meter().floorTesla();
      variances[i] =
          probe * (radial[i] * radial[i] + tangential[i] * tangential[i] + axial[i] * axial[i])
              + tilt * tilt * other[i] * other[i]
              + floor * floor
              + LEAST_SD_TESLA * LEAST_SD_TESLA;
    }
    return variances;
  }

  private void addOwn(double[][] matrix, int slot, double out, double next, int sign) {
    PlacedMagnet magnet = ring.magnet(slot);
    if (magnet == null) {
      return;
    }
    for (double[] column : ownColumns(slot, magnet, out, next)) {
      addOuter(matrix, column, sign);
    }
  }

  private double[][] ownColumns(int slot, PlacedMagnet magnet, double out, double next) {
    Spread spread = ring.layout().spread();
    double strength =
        magnet.strength().standardUncertaintyTesla() / magnet.strength().remanenceTesla();
    double facing = Math.toRadians(spread.facingDegrees());
    double pocket = spread.pocketMetres();
    double[][] columns = new double[OWN_COLUMNS][rows.size()];
    int a = 2 * slot;
    int b = a + 1;
    for (int i = 0; i < rows.size(); i++) {
      columns[0][i] = strength * (flux[i][a] * out + flux[i][b] * next);
      columns[1][i] = facing * (flux[i][b] * out - flux[i][a] * next);
      columns[2][i] = pocket * (magnetOut[i][a] * out + magnetOut[i][b] * next);
      columns[3][i] = pocket * (magnetNext[i][a] * out + magnetNext[i][b] * next);
    }
    return columns;
  }

  private List<double[]> commonColumns(double[] p) {
    double[] mean = mean(p);
    List<double[]> columns = new ArrayList<>();
    for (double[] gain : gains.values()) {
      columns.add(product(mean, gain));
    }
    if (gainSpread > 0) {
      double[] column = mean.clone();
      for (int i = 0; i < column.length; i++) {
        column[i] *= gainSpread;
      }
      columns.add(column);
    }
    Map<String, double[]> shared = new LinkedHashMap<>();
    double[] warm = new double[mean.length];
    boolean unknown = rows.stream().anyMatch(row -> !row.temperatureKnown());
    for (int slot = 0; slot < ring.slots(); slot++) {
      PlacedMagnet magnet = ring.magnet(slot);
      if (magnet == null) {
        continue;
      }
      SharedDoubt doubt = magnet.shared();
      if (!unknown && doubt == null) {
        continue;
      }
      double[] own = answer(slot, p[2 * slot], p[2 * slot + 1]);
      for (int i = 0; i < own.length; i++) {
        if (!rows.get(i).temperatureKnown()) {
          warm[i] += own[i] * magnet.remanencePerKelvin() * UNKNOWN_TEMPERATURE_KELVIN;
        }
      }
      if (doubt != null) {
        double share = doubt.standardUncertaintyTesla() / magnet.strength().remanenceTesla();
        double[] column = shared.computeIfAbsent(doubt.name(), n -> new double[own.length]);
        for (int i = 0; i < own.length; i++) {
          column[i] += own[i] * share;
        }
      }
    }
    if (unknown) {
      columns.add(warm);
    }
    columns.addAll(shared.values());
    return columns;
  }

  private static double[] product(double[] left, double[] right) {
    double[] result = new double[left.length];
    for (int i = 0; i < result.length; i++) {
      result[i] = left[i] * right[i];
    }
    return result;
  }

  private static void addOuter(double[][] matrix, double[] column, int sign) {
    for (int i = 0; i < matrix.length; i++) {
      double factor = sign * column[i];
      if (factor == 0) {
        continue;
      }
      double[] line = matrix[i];
      for (int j = 0; j <= i; j++) {
        line[j] += factor * column[j];
      }
    }
  }

  private static double[] times(double[][] matrix, double[] vector) {
    double[] result = new double[matrix.length];
    for (int i = 0; i < result.length; i++) {
      double[] line = matrix[i];
      double sum = 0;
      for (int j = 0; j < vector.length; j++) {
        sum += line[j] * vector[j];
      }
      result[i] = sum;
    }
    return result;
  }
}
