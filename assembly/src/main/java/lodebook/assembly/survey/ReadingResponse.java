package lodebook.assembly.survey;

import java.util.List;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.FieldDerivatives;
import lodebook.assembly.layout.FieldMatrix;
import lodebook.assembly.layout.MutualMagnetisation;
import lodebook.assembly.layout.ReadingPlace;
import lodebook.assembly.layout.RingField;

/// How one reading answers to the remanence of every magnet, and how that changes when probe or
/// magnets move.
///
/// Each quantity has two numbers per slot, index `2·slot + direction`, slot from 0, direction 0
/// outwards and 1 towards next in the magnet's own slot.
final class ReadingResponse {
  private final double[] flux;
  private final double[] across;
  private final double[] probeOut;
  private final double[] probeNext;
  private final double[] probeUp;
  private final double[] magnetOut;
  private final double[] magnetNext;

  /// @param field the ring's field
  /// @param mutual how the magnets answer to each other's field; left out only in the small change
  ///   that a magnet's own displacement makes
  /// @param place where and along which direction
  ReadingResponse(RingField field, MutualMagnetisation mutual, ReadingPlace place) {
    Component other =
        place.component() == Component.RADIAL ? Component.TANGENTIAL : Component.RADIAL;
    ReadingPlace sideways =
        new ReadingPlace(place.radiusMetres(), place.angleRadians(), place.heightMetres(), other);
    FieldMatrix both = mutual.perRemanence(field.at(List.of(place, sideways)));
    FieldDerivatives slopes = field.derivatives(List.of(place));
    flux = line(both, 0);
    across = line(both, 1);
    probeOut = line(mutual.perRemanence(slopes.probeOut()), 0);
    probeNext = line(mutual.perRemanence(slopes.probeNext()), 0);
    probeUp = line(mutual.perRemanence(slopes.probeUp()), 0);
    magnetOut = line(slopes.magnetOut(), 0);
    magnetNext = line(slopes.magnetNext(), 0);
  }

  private static double[] line(FieldMatrix matrix, int row) {
    double[] line = new double[2 * matrix.slots()];
    for (int slot = 0; slot < matrix.slots(); slot++) {
      line[2 * slot] = matrix.perOut(row, slot + 1);
      line[2 * slot + 1] = matrix.perNext(row, slot + 1);
    }
    return line;
  }

  /// Tesla per tesla.
  double[] flux() {
    return flux;
  }

  /// The same along the other component, which a tilted probe sees.
  double[] across() {
    return across;
  }

  /// Per metre that the probe moves away from the axis.
  double[] probeOut() {
    return probeOut;
  }

  /// Per metre that the probe moves towards the next slot.
  double[] probeNext() {
    return probeNext;
  }

  /// Per metre that the probe moves along the axis.
  double[] probeUp() {
    return probeUp;
  }

  /// Per metre that the magnet moves outwards.
  double[] magnetOut() {
    return magnetOut;
  }

  /// Per metre that the magnet moves towards next.
  double[] magnetNext() {
    return magnetNext;
  }
}
