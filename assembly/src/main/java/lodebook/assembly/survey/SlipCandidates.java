package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.Component;
import lodebook.assembly.survey.Courses.Course;

/// Expected readings under every slip that a ring allows, compared with the readings quickly.
final class SlipCandidates {
  /// A slip with the explanation as it looks under it.
  ///
  /// @param written expected values as they would be written down under the slip, tesla
  /// @param leftOver share of the readings' energy that stays unexplained
  @SuppressWarnings("ArrayRecordComponent")
  record Candidate(Slip slip, Explanation explanation, double[] written, double leftOver) {}

  private final RingModel ring;
  private final List<Reading> readings;
  private final Courses courses;
  private final List<Slip> slips;
  private final boolean[] tangential;

  SlipCandidates(RingModel ring, List<Reading> readings) {
    this.ring = ring;
    this.readings = readings;
    this.courses = new Courses(ring, readings);
    this.slips = Slip.all(ring.slots());
    tangential = new boolean[readings.size()];
    for (int i = 0; i < tangential.length; i++) {
      tangential[i] = readings.get(i).component() == Component.TANGENTIAL;
    }
  }

  /// Images of an explanation that was found under one slip, under every other that leaves less
  /// than a share of the readings' energy unexplained.
  List<Candidate> like(Slip from, Explanation explanation, double share) {
    List<Candidate> candidates = new ArrayList<>();
    for (Slip slip : slips) {
      Explanation image = from.image(explanation, slip, ring.slots());
      if (!ring.holds(image)) {
        continue;
      }
      double[] mean = mean(courses.of(slip), image);
      double left = leftOver(slip, mean);
      if (left < share) {
        candidates.add(new Candidate(slip, image, written(slip, mean), left));
      }
    }
    return candidates;
  }

  /// Every single fault under every slip but none, where it leaves less than a share of the energy
  /// unexplained.
  ///
  /// Slips that leave so much without a fault that none could mend it are passed over: with the
  /// mean m, what is left r and the change d of a fault, |r| ≤ |d| + √share·(|m| + |d|) is needed.
  ///
  /// @param share share that may be unexplained with the fault
  List<Candidate> withOneFault(double share) {
    List<Candidate> candidates = new ArrayList<>();
    double[] right = ring.rightPolarisation();
    List<Fault> possible = new ArrayList<>();
    for (int slot = 0; slot < ring.slots(); slot++) {
      possible.addAll(Possible.of(ring, slot));
    }
    double[][] changes = new double[possible.size()][];
    for (int f = 0; f < changes.length; f++) {
      changes[f] = possible.get(f).change(right);
    }
    double most = 0;
    for (int f = 0; f < changes.length; f++) {
      most = Math.max(most, courses.mostEnergy(possible.get(f).place(), changes[f]));
    }
    Map<Course, SingleFaultEnergies> energies = new HashMap<>();
    for (Slip slip : slips) {
      Course course = courses.of(slip);
      double energy = Judge.dot(course.mean(), course.mean());
      double change = Math.sqrt(most / energy);
      double mendable = change + Math.sqrt(share) * (1 + change);
      if (slip.equals(Slip.NONE) || !(leftOver(slip, course.mean()) < mendable * mendable)) {
        continue;
      }
      SingleFaultEnergies sums =
          energies.computeIfAbsent(course, c -> new SingleFaultEnergies(c, readings));
      SingleFaultEnergies.Rest rest =
          sums.rest(slip.freeing(Component.RADIAL), slip.freeing(Component.TANGENTIAL));
      for (int f = 0; f < changes.length; f++) {
        double left = rest.leftOver(possible.get(f).place(), changes[f]);
        if (left < share) {
          Explanation explanation = Explanation.NONE.with(possible.get(f));
          candidates.add(
              new Candidate(slip, explanation, written(slip, mean(course, explanation)), left));
        }
      }
    }
    return candidates;
  }

  private double[] mean(Course course, Explanation explanation) {
    if (explanation.namesNoMagnet()) {
      return course.mean();
    }
    double[] right = ring.rightPolarisation();
    double[] mean = course.mean().clone();
    for (Fault fault : explanation.faults()) {
      if (fault.ofMagnet()) {
        double[] change = fault.change(right);
        int at = 2 * fault.place();
        for (int i = 0; i < mean.length; i++) {
          double[] line = course.lines()[i];
          mean[i] += line[at] * change[0] + line[at + 1] * change[1];
        }
      }
    }
    return mean;
  }

  private double leftOver(Slip slip, double[] mean) {
    double radial = slip.freeing(Component.RADIAL);
    double along = slip.freeing(Component.TANGENTIAL);
    double energy = 0;
    double left = 0;
    for (int i = 0; i < mean.length; i++) {
      double freed = readings.get(i).fluxTesla() * (tangential[i] ? along : radial);
      energy += mean[i] * mean[i];
      left += (freed - mean[i]) * (freed - mean[i]);
    }
    return energy > 0 ? left / energy : Double.POSITIVE_INFINITY;
  }

  private double[] written(Slip slip, double[] mean) {
    double[] written = new double[mean.length];
    for (int i = 0; i < mean.length; i++) {
      written[i] = mean[i] / slip.freeing(readings.get(i).component());
    }
    return written;
  }
}
