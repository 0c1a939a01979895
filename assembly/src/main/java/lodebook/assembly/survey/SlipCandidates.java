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
    for (Candidate without : like(Slip.NONE, Explanation.NONE, before)) {
      if (without.slip().equals(Slip.NONE)) {
        continue;
      }
      double[][] response = response(without.slip());
      double[] mean = times(response, right);
      for (int slot = 0; slot < ring.slots(); slot++) {
        for (Fault fault : Possible.of(ring, slot)) {
          double[] changed = mean.clone();
          double[] change = fault.change(right);
          for (int i = 0; i < changed.length; i++) {
            changed[i] += response[i][2 * slot] * change[0] + response[i][2 * slot + 1] * change[1];
          }
          Candidate candidate = candidate(without.slip(), Explanation.NONE.with(fault), changed);
          if (candidate.leftOver() < after) {
            candidates.add(candidate);
          }
        }
      }
    }
    return candidates;
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
