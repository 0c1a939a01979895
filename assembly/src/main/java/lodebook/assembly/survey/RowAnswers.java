package lodebook.assembly.survey;

import static java.util.Objects.requireNonNull;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import lodebook.assembly.layout.ReadingPlace;

/// How a set of rows answers to the polarisation of every magnet, and how those answers change with
/// the places of probe and magnets.
///
/// Sums over the whole ring are kept for the right ring; an explanation only changes the share of
/// the magnets that it names.
final class RowAnswers {
  /// What is asked of a row.
  enum Of {
    /// The reading, tesla.
    FLUX,
    /// The other component, which a tilted probe sees, tesla.
    ACROSS,
    /// Change per metre that the probe moves away from the axis.
    PROBE_OUT,
    /// Per metre that the probe moves towards the next slot.
    PROBE_NEXT,
    /// Per metre that the probe moves along the axis.
    PROBE_UP,
    /// Per metre that the magnet moves outwards.
    MAGNET_OUT,
    /// Per metre that the magnet moves towards next.
    MAGNET_NEXT;

    private double[] line(ReadingResponse response) {
      return switch (this) {
        case FLUX -> response.flux();
        case ACROSS -> response.across();
        case PROBE_OUT -> response.probeOut();
        case PROBE_NEXT -> response.probeNext();
        case PROBE_UP -> response.probeUp();
        case MAGNET_OUT -> response.magnetOut();
        case MAGNET_NEXT -> response.magnetNext();
      };
    }
  }

  private final RingModel ring;
  private final int count;
  private final double[] right;
  private final Map<Of, double[][]> columns = new EnumMap<>(Of.class);
  private final Map<Of, double[]> rightSums = new EnumMap<>(Of.class);

  RowAnswers(RingModel ring, List<Row> rows) {
    this.ring = ring;
    this.count = rows.size();
    this.right = ring.rightPolarisation();
    for (Of quantity : Of.values()) {
      columns.put(quantity, new double[2 * ring.slots()][count]);
    }
    for (int i = 0; i < count; i++) {
      fill(i, rows.get(i));
    }
    columns.forEach(
        (quantity, all) -> {
          double[] sum = new double[count];
          for (int c = 0; c < right.length; c++) {
            add(sum, right[c], all[c]);
          }
          rightSums.put(quantity, sum);
        });
  }

  private void fill(int i, Row row) {
    ReadingResponse response =
        ring.responseAt(
            ReadingPlace.of(ring.layout(), row.point(), row.radiusMetres(), row.heightMetres()),
            row.filled());
    double[] warm = new double[ring.slots()];
    for (int slot = 0; slot < warm.length; slot++) {
      PlacedMagnet magnet = ring.magnet(slot);
      warm[slot] =
          magnet == null ? 1 : 1 + magnet.remanencePerKelvin() * row.kelvinAboveReference();
    }
    columns.forEach(
        (quantity, to) -> {
          double[] line = quantity.line(response);
          for (int c = 0; c < line.length; c++) {
            to[c][i] = warm[c / 2] * line[c];
          }
        });
  }

  /// Answers to all magnets of a right ring, one number for each row; not to be changed.
  double[] right(Of quantity) {
    return requireNonNull(rightSums.get(quantity));
  }

  /// Answers to all magnets under an explanation, one number for each row.
  double[] under(Of quantity, Explanation explanation) {
    double[] sum = right(quantity).clone();
    for (Fault fault : explanation.faults()) {
      if (fault.ofMagnet()) {
        double[] change = fault.change(right);
        add(sum, change[0], column(quantity, 2 * fault.place()));
        add(sum, change[1], column(quantity, 2 * fault.place() + 1));
      }
    }
    return sum;
  }

  /// Answers to one magnet of a polarisation, one number for each row.
  double[] to(Of quantity, int slot, double out, double next) {
    double[] sum = new double[count];
    add(sum, out, column(quantity, 2 * slot));
    add(sum, next, column(quantity, 2 * slot + 1));
    return sum;
  }

  /// Answers per polarisation of one slot and direction, one number for each row; not to be
  /// changed.
  ///
  /// @param column twice the slot's index from 0, and one more for the direction towards next
  double[] column(Of quantity, int column) {
    return requireNonNull(columns.get(quantity))[column];
  }

  /// Adds a multiple of one vector to another.
  static void add(double[] sum, double factor, double[] vector) {
    if (factor == 0) {
      return;
    }
    for (int i = 0; i < sum.length; i++) {
      sum[i] += factor * vector[i];
    }
  }
}
