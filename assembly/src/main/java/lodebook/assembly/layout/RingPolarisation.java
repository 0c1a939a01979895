package lodebook.assembly.layout;

import java.util.List;

/// The polarisation of every slot of a ring, tesla, in each slot's own frame; 0 where a slot is
/// empty.
public final class RingPolarisation {
  private final double[] out;
  private final double[] next;

  RingPolarisation(double[] out, double[] next) {
    this.out = out;
    this.next = next;
  }

  /// Magnets of given remanences and facings, as if none answered to the field of the others.
  ///
  /// @param remanencesTesla one for each slot, slot 1 first; 0 for an empty slot
  /// @param facings one for each slot, slot 1 first
  public static RingPolarisation of(double[] remanencesTesla, List<Facing> facings) {
    if (remanencesTesla.length != facings.size()) {
      throw new IllegalArgumentException(
          remanencesTesla.length + " remanences for " + facings.size() + " facings");
    }
    double[] out = new double[remanencesTesla.length];
    double[] next = new double[remanencesTesla.length];
    for (int i = 0; i < out.length; i++) {
      double radians = facings.get(i).radians();
      out[i] = remanencesTesla[i] * Math.cos(radians);
      next[i] = remanencesTesla[i] * Math.sin(radians);
    }
    return new RingPolarisation(out, next);
  }

  /// Number of slots.
  public int slots() {
    return out.length;
  }

  /// Polarisation of a slot (from 1) along out, tesla.
  public double out(int slot) {
    return out[slot - 1];
  }

  /// Polarisation of a slot (from 1) to next, tesla.
  public double next(int slot) {
    return next[slot - 1];
  }

  /// The difference to another state of the same ring.
  public RingPolarisation minus(RingPolarisation other) {
    double[] dOut = out.clone();
    double[] dNext = next.clone();
    for (int i = 0; i < dOut.length; i++) {
      dOut[i] -= other.out[i];
      dNext[i] -= other.next[i];
    }
    return new RingPolarisation(dOut, dNext);
  }

  double[] outArray() {
    return out;
  }

  double[] nextArray() {
    return next;
  }
}
