package lodebook.assembly.plan;

import java.util.Arrays;
import java.util.List;

/// A batch in bare numbers: the slots of all rings in a row, then holders of spare pieces.
///
/// Piece h is the one that sits on holder h as they come.
final class BatchPuzzle {
  /// What a relative deviation of the amplitude costs, squared, beside the square of the unwanted
  /// harmonics: one part in a thousand of the one weighs as much as of the other.
  static final double PRICE_OF_AMPLITUDE = 1;

  final HarmonicForm[] forms;

  /// First holder of each ring, and behind the last one the first spare.
  final int[] first;

  final int[] ringOf;
  final double[] strength;
  final double[] variance;

  /// For each piece the ring that must have it, or −1.
  final int[] home;

  /// Holders that may exchange their pieces.
  final int[][] pools;

  /// Wanted |w·s| of each ring, tesla.
  final double[] target;

  BatchPuzzle(
      HarmonicForm[] forms, List<Source> holders, int[] home, int[][] pools, double[] target) {
    this.forms = forms;
    this.home = home;
    this.pools = pools;
    this.target = target;
    strength = holders.stream().mapToDouble(Source::remanence).toArray();
    variance = holders.stream().mapToDouble(Source::variance).toArray();
    first = new int[forms.length + 1];
    ringOf = new int[strength.length];
    Arrays.fill(ringOf, -1);
    for (int ring = 0; ring < forms.length; ring++) {
      first[ring + 1] = first[ring] + forms[ring].slots;
      Arrays.fill(ringOf, first[ring], first[ring + 1], ring);
    }
  }

  /// Whether a piece may be in a ring, or spare for −1.
  boolean fits(int piece, int ring) {
    return home[piece] < 0 || home[piece] == ring;
  }

  int spares() {
    return first[forms.length];
  }
}
