package lodebook.assembly.survey;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.ReadingPlace;
import lodebook.assembly.layout.Spot;
import org.jspecify.annotations.Nullable;

/// Where the rows of a survey were really taken, for every start and direction, and what a ring
/// reads there. Slips that differ only in sign or unit share a course.
///
/// Rows of a ring that was not full yet answer to the magnets that stood then; that these were less
/// magnetised by each other than all would be is left out here.
final class Courses {
  /// Kind of place over or beside any slot.
  private record Kind(Spot spot, Component component, double radiusMetres, double heightMetres) {}

  /// One start and direction.
  ///
  /// @param lines responses of every row, two numbers for each slot
  /// @param mean what a right ring reads, tesla
  @SuppressWarnings("ArrayRecordComponent")
  record Course(double[][] lines, double[] mean) {}

  private final RingModel ring;
  private final List<Reading> readings;
  private final List<Kind> kinds = new ArrayList<>();
  private final Map<Kind, double[][]> lines = new HashMap<>();
  private final Map<Kind, double[]> means = new HashMap<>();
  private final @Nullable Course[] courses;

  Courses(RingModel ring, List<Reading> readings) {
    this.ring = ring;
    this.readings = readings;
    this.courses = new Course[2 * ring.slots()];
    for (Reading reading : readings) {
      Row row = Slip.NONE.row(reading, ring.layout());
      kinds.add(
          new Kind(reading.spot(), reading.component(), row.radiusMetres(), row.heightMetres()));
    }
  }

  Course of(Slip slip) {
    boolean opposite = slip.measuring().direction() == Measuring.Direction.OPPOSITE;
    int index = slip.measuring().startSlot() - 1 + (opposite ? ring.slots() : 0);
    Course course = courses[index];
    if (course == null) {
      course = course(slip);
      courses[index] = course;
    }
    return course;
  }

  /// An upper bound of the energy by which one magnet's change can move the readings, whatever the
  /// course: as if every kind of row stood over every slot, as often as over the busiest.
  ///
  /// @param slot slot index from 0
  /// @param change change of its polarisation, outwards and towards next, tesla
  double mostEnergy(int slot, double[] change) {
    double sum = 0;
    for (Map.Entry<Kind, Integer> kind : busiest().entrySet()) {
      for (double[] line : linesOf(kind.getKey())) {
        double shift = line[2 * slot] * change[0] + line[2 * slot + 1] * change[1];
        sum += kind.getValue() * shift * shift;
      }
    }
    return sum;
  }

  /// How many rows of each kind stand over the slot that has most of them.
  private Map<Kind, Integer> busiest() {
    Map<Kind, int[]> counts = new HashMap<>();
    Map<Kind, Integer> most = new HashMap<>();
    for (int i = 0; i < readings.size(); i++) {
      Kind kind = kinds.get(i);
      int[] count = counts.computeIfAbsent(kind, k -> new int[ring.slots()]);
      most.merge(kind, ++count[readings.get(i).slot() - 1], Math::max);
    }
    return most;
  }

  private Course course(Slip slip) {
    Layout layout = ring.layout();
    double[][] byRow = new double[readings.size()][];
    double[] mean = new double[readings.size()];
    for (int i = 0; i < byRow.length; i++) {
      Reading reading = readings.get(i);
      int slot = slip.realPoint(reading, layout).slot();
      Kind kind = kinds.get(i);
      double[] line = linesOf(kind)[slot - 1];
      Set<Integer> filled = reading.filled();
      if (filled == null) {
        byRow[i] = line;
        mean[i] = means.computeIfAbsent(kind, this::meansOf)[slot - 1];
      } else {
        byRow[i] = onlyFrom(filled, line);
        mean[i] = Judge.dot(byRow[i], ring.rightPolarisation());
      }
    }
    return new Course(byRow, mean);
  }

  private double[][] linesOf(Kind kind) {
    return lines.computeIfAbsent(
        kind,
        k -> {
          double[][] bySlot = new double[ring.slots()][];
          for (int slot = 1; slot <= bySlot.length; slot++) {
            ProbePoint point = new ProbePoint(slot, k.spot(), k.component());
            bySlot[slot - 1] =
                ring.fluxAt(
                    ReadingPlace.of(ring.layout(), point, k.radiusMetres(), k.heightMetres()));
          }
          return bySlot;
        });
  }

  private double[] meansOf(Kind kind) {
    double[] right = ring.rightPolarisation();
    double[][] bySlot = linesOf(kind);
    double[] mean = new double[bySlot.length];
    for (int slot = 0; slot < mean.length; slot++) {
      mean[slot] = Judge.dot(bySlot[slot], right);
    }
    return mean;
  }

  private static double[] onlyFrom(Set<Integer> filled, double[] line) {
    double[] some = new double[line.length];
    for (int slot : filled) {
      some[2 * slot - 2] = line[2 * slot - 2];
      some[2 * slot - 1] = line[2 * slot - 1];
    }
    return some;
  }
}
