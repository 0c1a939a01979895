package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.Spread;
import lodebook.assembly.survey.RowAnswers.Of;

/// Mean and covariance of a set of rows for any explanation.
///
/// Readings answer linearly to the polarisation of the magnets. Their covariance has a part of each
/// magnet (strength, facing, pocket), parts common to all (meter gain, shared doubts, unknown
/// temperature) and a part of each row alone (probe position and tilt, floor). The page
/// docs/decisions/survey-model.md explains it.
final class RowModel {
  private static final double UNKNOWN_TEMPERATURE_KELVIN = 3;
  private static final double LEAST_SD_TESLA = 2e-5;

  private final RingModel ring;
  private final List<Row> rows;
  private final RowAnswers answers;
  private final double[] right;
  private final double[] read;
  private final double[][] ownCovariance;
  private final CommonErrors common;

  RowModel(RingModel ring, List<Row> rows) {
    this.ring = ring;
    this.rows = List.copyOf(rows);
    this.answers = new RowAnswers(ring, this.rows);
    this.right = ring.rightPolarisation();
    read = rows.stream().mapToDouble(Row::fluxTesla).toArray();
    ownCovariance = new double[rows.size()][rows.size()];
    for (int slot = 0; slot < ring.slots(); slot++) {
      addOwn(ownCovariance, slot, right[2 * slot], right[2 * slot + 1], 1);
    }
    common = new CommonErrors(this);
  }

  private RowModel(RowModel other, CommonErrors common) {
    ring = other.ring;
    rows = other.rows;
    answers = other.answers;
    right = other.right;
    read = other.read;
    ownCovariance = other.ownCovariance;
    this.common = common;
  }

  /// The same rows with a further relative gain error common to all of them, a standard deviation.
  RowModel withGainSpread(double gainSpread) {
    return new RowModel(this, common.withGainSpread(gainSpread));
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

  /// Expected readings under an explanation, tesla.
  double[] mean(Explanation explanation) {
    return answers.under(Of.FLUX, explanation);
  }

  /// What was read less what an explanation expects, tesla.
  double[] residual(Explanation explanation) {
    double[] residual = read.clone();
    RowAnswers.add(residual, -1, mean(explanation));
    return residual;
  }

  /// Change of the readings per change of one slot's polarisation.
  double[] answer(int slot, double out, double next) {
    return answers.to(Of.FLUX, slot, out, next);
  }

  /// Responses of all rows, one line for each row, two numbers for each slot.
  double[][] responses() {
    double[][] lines = new double[rows.size()][2 * ring.slots()];
    for (int c = 0; c < 2 * ring.slots(); c++) {
      double[] column = answers.column(Of.FLUX, c);
      for (int i = 0; i < lines.length; i++) {
        lines[i][c] = column[i];
      }
    }
    return lines;
  }

  /// Change of the readings per metre that the probe moves away from the axis.
  double[] probeSlope(Explanation explanation) {
    return answers.under(Of.PROBE_OUT, explanation);
  }

  /// Covariance of the readings under an explanation, upper triangle.
  double[][] covariance(Explanation explanation) {
    double[][] matrix = new double[rows.size()][];
    for (int i = 0; i < matrix.length; i++) {
      matrix[i] = ownCovariance[i].clone();
    }
    double[] p = ring.polarisation(explanation);
    for (Fault fault : explanation.faults()) {
      int slot = fault.place();
      if (fault.ofMagnet() && fault.kind() != FaultKind.REVERSED) {
        addOwn(matrix, slot, right[2 * slot], right[2 * slot + 1], -1);
        addOwn(matrix, slot, p[2 * slot], p[2 * slot + 1], 1);
      }
    }
    for (double[] column : common.columns(explanation)) {
      addOuter(matrix, column, 1);
    }
    double[] single = singleVariances(explanation);
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
    for (double value : answers.right(Of.FLUX)) {
      largest = Math.max(largest, Math.abs(value));
    }
    for (double value : read) {
      largest = Math.max(largest, Math.abs(value));
    }
    return largest * largest;
  }

  /// Variances of the rows' own errors: fresh probe position and tilt, floor.
  double[] singleVariances(Explanation explanation) {
    Spread spread = ring.layout().spread();
    double probe = spread.probeMetres() * spread.probeMetres();
    double tilt = Math.toRadians(spread.probeTiltDegrees());
    double[] out = answers.under(Of.PROBE_OUT, explanation);
    double[] next = answers.under(Of.PROBE_NEXT, explanation);
    double[] up = answers.under(Of.PROBE_UP, explanation);
    double[] across = answers.under(Of.ACROSS, explanation);
    double[] variances = new double[rows.size()];
    for (int i = 0; i < variances.length; i++) {
      double floor = rows.get(i).meter().floorTesla();
      variances[i] =
          probe * (out[i] * out[i] + next[i] * next[i] + up[i] * up[i])
              + tilt * tilt * across[i] * across[i]
              + floor * floor
              + LEAST_SD_TESLA * LEAST_SD_TESLA;
    }
    return variances;
  }

  /// Like [#singleVariances] of a right ring but the largest that any one reversed magnet makes of
  /// it.
  double[] largestSingleVariances() {
    double[] largest = singleVariances(Explanation.NONE);
    for (int slot = 0; slot < ring.slots(); slot++) {
      double[] here = singleVariances(Explanation.NONE.with(Fault.of(slot, FaultKind.REVERSED)));
      for (int i = 0; i < here.length; i++) {
        largest[i] = Math.max(largest[i], here[i]);
      }
    }
    return largest;
  }

  private void addOwn(double[][] matrix, int slot, double out, double next, int sign) {
    PlacedMagnet magnet = ring.magnet(slot);
    if (magnet == null) {
      return;
    }
    Spread spread = ring.layout().spread();
    double strength =
        magnet.strength().standardUncertaintyTesla() / magnet.strength().remanenceTesla();
    double facing = Math.toRadians(spread.facingDegrees());
    double pocket = spread.pocketMetres();
    addOuter(matrix, answers.to(Of.FLUX, slot, strength * out, strength * next), sign);
    addOuter(matrix, answers.to(Of.FLUX, slot, -facing * next, facing * out), sign);
    addOuter(matrix, answers.to(Of.MAGNET_OUT, slot, pocket * out, pocket * next), sign);
    addOuter(matrix, answers.to(Of.MAGNET_NEXT, slot, pocket * out, pocket * next), sign);
  }

  private static void addOuter(double[][] matrix, double[] column, int sign) {
    for (int i = 0; i < matrix.length; i++) {
      double factor = sign * column[i];
      if (factor == 0) {
        continue;
      }
      double[] line = matrix[i];
      for (int j = i; j < line.length; j++) {
        line[j] += factor * column[j];
      }
    }
  }

  /// Errors that many rows share: meter gains, an unknown temperature, doubts about whole lots.
  private static final class CommonErrors {
    private final RowModel model;
    private final double gainSpread;
    private final Map<String, double[]> gains;
    private final boolean unknownTemperature;
    private final double[] warm;
    private final Map<String, double[]> shared;

    CommonErrors(RowModel model) {
      this.model = model;
      gainSpread = 0;
      gains = new LinkedHashMap<>();
      for (int i = 0; i < model.count(); i++) {
        Meter meter = model.rows.get(i).meter();
        gains.computeIfAbsent(meter.name(), name -> new double[model.count()])[i] =
            meter.accuracy();
      }
      unknownTemperature = model.rows.stream().anyMatch(row -> !row.temperatureKnown());
      warm = new double[model.count()];
      shared = new LinkedHashMap<>();
      for (int slot = 0; slot < model.ring.slots(); slot++) {
        add(slot, model.right[2 * slot], model.right[2 * slot + 1], warm, shared);
      }
    }

    private CommonErrors(CommonErrors other, double gainSpread) {
      this.gainSpread = gainSpread;
      model = other.model;
      gains = other.gains;
      unknownTemperature = other.unknownTemperature;
      warm = other.warm;
      shared = other.shared;
    }

    CommonErrors withGainSpread(double spread) {
      return new CommonErrors(this, spread);
    }

    List<double[]> columns(Explanation explanation) {
      double[] mean = model.mean(explanation);
      List<double[]> columns = new ArrayList<>();
      for (double[] gain : gains.values()) {
        double[] column = mean.clone();
        for (int i = 0; i < column.length; i++) {
          column[i] *= gain[i];
        }
        columns.add(column);
      }
      if (gainSpread > 0) {
        double[] column = new double[mean.length];
        RowAnswers.add(column, gainSpread, mean);
        columns.add(column);
      }
      double[] warmHere = warm.clone();
      Map<String, double[]> sharedHere = new LinkedHashMap<>();
      shared.forEach((name, column) -> sharedHere.put(name, column.clone()));
      for (Fault fault : explanation.faults()) {
        if (fault.ofMagnet()) {
          double[] change = fault.change(model.right);
          add(fault.place(), change[0], change[1], warmHere, sharedHere);
        }
      }
      if (unknownTemperature) {
        columns.add(warmHere);
      }
      columns.addAll(sharedHere.values());
      return columns;
    }

    private void add(
        int slot, double out, double next, double[] warmTo, Map<String, double[]> sharedTo) {
      PlacedMagnet magnet = model.ring.magnet(slot);
      if (magnet == null || (!unknownTemperature && magnet.shared() == null)) {
        return;
      }
      double[] own = model.answer(slot, out, next);
      if (unknownTemperature) {
        double perKelvin = magnet.remanencePerKelvin() * UNKNOWN_TEMPERATURE_KELVIN;
        for (int i = 0; i < own.length; i++) {
          warmTo[i] += model.rows.get(i).temperatureKnown() ? 0 : perKelvin * own[i];
        }
      }
      SharedDoubt doubt = magnet.shared();
      if (doubt != null) {
        double share = doubt.standardUncertaintyTesla() / magnet.strength().remanenceTesla();
        RowAnswers.add(
            sharedTo.computeIfAbsent(doubt.name(), n -> new double[own.length]), share, own);
      }
    }
  }
}
