package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/// Expected readings under every slip that a ring allows, compared with the readings quickly.
final class SlipCandidates {
  /// Where rows were really taken; slips that differ in sign or unit share it.
  private record Course(int startSlot, Measuring.Direction direction) {}

  /// A slip with the explanation as it looks under it.
  ///
  /// @param written expected values as they would be written down under the slip, tesla
  /// @param leftOver share of the readings' energy that stays unexplained
  @SuppressWarnings("ArrayRecordComponent")
  record Candidate(Slip slip, Explanation explanation, double[] written, double leftOver) {}

  private final RingModel ring;
  private final List<Reading> readings;
  private final Map<Course, double[][]> responses = new HashMap<>();

  SlipCandidates(RingModel ring, List<Reading> readings) {
    this.ring = ring;
    this.readings = readings;
  }

  /// Images of an explanation that was found under one slip, under every other that leaves less
  /// than a share of the readings' energy unexplained.
  List<Candidate> like(Slip from, Explanation explanation, double share) {
    List<Candidate> candidates = new ArrayList<>();
    Map<Course, double[]> means = new HashMap<>();
    for (Slip slip : Slip.all(ring.slots())) {
      Explanation image = from.image(explanation, slip, ring.slots());
      if (!ring.holds(image)) {
        continue;
      }
      double[] mean =
          means.computeIfAbsent(
              course(slip), course -> times(response(slip), ring.polarisation(image)));
      Candidate candidate = candidate(slip, image, mean);
      if (candidate.leftOver() < share) {
        candidates.add(candidate);
      }
    }
    return candidates;
  }

  /// Every single fault under every slip but none, where it leaves less than a share of the energy
  /// unexplained.
  ///
  /// @param before share that may be unexplained without the fault
  /// @param after share that may be unexplained with it
  List<Candidate> withOneFault(double before, double after) {
    List<Candidate> candidates = new ArrayList<>();
    double[] right = ring.rightPolarisation();
    double[] changed = new double[readings.size()];
    List<Fault> possible = new ArrayList<>();
    for (int slot = 0; slot < ring.slots(); slot++) {
      possible.addAll(Possible.of(ring, slot));
    }
    for (Candidate without : like(Slip.NONE, Explanation.NONE, before)) {
      if (without.slip().equals(Slip.NONE)) {
        continue;
      }
      double[][] response = response(without.slip());
      double[] mean = times(response, right);
      Sums sums = new Sums(response, mean, freed(without.slip()));
      for (Fault fault : possible) {
        double[] change = fault.change(right);
        if (sums.leftOver(fault.place(), change) < after) {
          int at = 2 * fault.place();
          for (int i = 0; i < mean.length; i++) {
            changed[i] = mean[i] + response[i][at] * change[0] + response[i][at + 1] * change[1];
          }
          candidates.add(candidate(without.slip(), Explanation.NONE.with(fault), changed));
        }
      }
    }
    return candidates;
  }

  /// Inner products from which the energies with any one fault follow.
  private static final class Sums {
    private final double[] byMean;
    private final double[] byRest;
    private final double[] squares;
    private final double[] crossed;
    private final double energy;
    private final double rest;

    Sums(double[][] response, double[] mean, double[] freed) {
      int width = response[0].length;
      byMean = new double[width];
      byRest = new double[width];
      squares = new double[width];
      crossed = new double[width / 2];
      double meanSquare = 0;
      double restSquare = 0;
      for (int i = 0; i < mean.length; i++) {
        double[] line = response[i];
        double m = mean[i];
        double r = freed[i] - m;
        meanSquare += m * m;
        restSquare += r * r;
        for (int c = 0; c < width; c++) {
          byMean[c] += line[c] * m;
          byRest[c] += line[c] * r;
          squares[c] += line[c] * line[c];
        }
        for (int slot = 0; slot < crossed.length; slot++) {
          crossed[slot] += line[2 * slot] * line[2 * slot + 1];
        }
      }
      energy = meanSquare;
      rest = restSquare;
    }

    double leftOver(int slot, double[] change) {
      int a = 2 * slot;
      int b = a + 1;
      double square =
          change[0] * change[0] * squares[a]
              + 2 * change[0] * change[1] * crossed[slot]
              + change[1] * change[1] * squares[b];
      double whole = energy + 2 * (change[0] * byMean[a] + change[1] * byMean[b]) + square;
      double left = rest - 2 * (change[0] * byRest[a] + change[1] * byRest[b]) + square;
      return whole > 0 ? left / whole : Double.POSITIVE_INFINITY;
    }
  }

  private double[] freed(Slip slip) {
    double[] freed = new double[readings.size()];
    for (int i = 0; i < freed.length; i++) {
      freed[i] = slip.freed(readings.get(i));
    }
    return freed;
  }

  private Candidate candidate(Slip slip, Explanation explanation, double[] mean) {
    double energy = 0;
    double left = 0;
    double[] written = new double[mean.length];
    for (int i = 0; i < mean.length; i++) {
      Reading reading = readings.get(i);
      double freed = slip.freed(reading);
      written[i] = mean[i] / slip.freeing(reading);
      energy += mean[i] * mean[i];
      left += (freed - mean[i]) * (freed - mean[i]);
    }
    double share = energy > 0 ? left / energy : Double.POSITIVE_INFINITY;
    return new Candidate(slip, explanation, written, share);
  }

  private double[][] response(Slip slip) {
    return responses.computeIfAbsent(
        course(slip),
        course -> {
          double[][] lines = new double[readings.size()][];
          for (int i = 0; i < lines.length; i++) {
            lines[i] = ring.fluxOf(slip.row(readings.get(i), ring.layout()));
          }
          return lines;
        });
  }

  private static Course course(Slip slip) {
    return new Course(slip.measuring().startSlot(), slip.measuring().direction());
  }

  private static double[] times(double[][] matrix, double[] vector) {
    double[] result = new double[matrix.length];
    for (int i = 0; i < result.length; i++) {
      result[i] = Judge.dot(matrix[i], vector);
    }
    return result;
  }
}
