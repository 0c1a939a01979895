package lodebook.assembly.layout;

/// What each slot's polarisation does to each reading: a reading is the sum over the slots of
/// `perOut · J_out + perNext · J_next`, J the slot's polarisation (tesla) along out and to next.
///
/// The same form serves for a reading's derivatives with respect to a length; its elements then
/// have the unit 1/m.
public final class FieldMatrix {
  private final int rows;
  private final int slots;
  private final double[] perOut;
  private final double[] perNext;

  FieldMatrix(int rows, int slots) {
    this.rows = rows;
    this.slots = slots;
    perOut = new double[rows * slots];
    perNext = new double[rows * slots];
  }

  void set(int row, int slot, double out, double next) {
    int at = row * slots + slot - 1;
    perOut[at] = out;
    perNext[at] = next;
  }

  /// Number of readings.
  public int rows() {
    return rows;
  }

  /// Number of slots.
  public int slots() {
    return slots;
  }

  /// Reading `row` (from 0) per tesla of polarisation of `slot` (from 1) pointing out.
  public double perOut(int row, int slot) {
    return perOut[row * slots + slot - 1];
  }

  /// Reading `row` (from 0) per tesla of polarisation of `slot` (from 1) pointing to next.
  public double perNext(int row, int slot) {
    return perNext[row * slots + slot - 1];
  }

  /// All readings for given polarisations, in the unit of the elements times tesla.
  public double[] apply(RingPolarisation polarisation) {
    if (polarisation.slots() != slots) {
      throw new IllegalArgumentException(
          "a ring of " + slots + " slots needs as many polarisations, not " + polarisation.slots());
    }
    double[] out = polarisation.outArray();
    double[] next = polarisation.nextArray();
    double[] readings = new double[rows];
    for (int row = 0; row < rows; row++) {
      double sum = 0;
      int at = row * slots;
      for (int i = 0; i < slots; i++) {
        sum += perOut[at + i] * out[i] + perNext[at + i] * next[i];
      }
      readings[row] = sum;
    }
    return readings;
  }
}
