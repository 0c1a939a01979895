package lodebook.assembly.layout;

import java.util.BitSet;
import java.util.HashMap;
import java.util.Map;
import lodebook.assembly.field.Body;
import lodebook.assembly.field.VolumeAverage;
import lodebook.assembly.magnet.MagnetBody;
import lodebook.assembly.magnet.MagnetType;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.LUDecomposition;
import org.hipparchus.linear.MatrixUtils;
import org.hipparchus.linear.RealMatrix;

/// How the magnets of a ring answer to their own field and to each other's: the recoil
/// permeability.
///
/// Every magnet is taken as uniformly polarised, with J = Br·û + (µ − 1)·µ0·H, H averaged over its
/// volume; so the polarisations of a ring solve (I − χN)·J = Br·û, where N holds the averages
/// (demagnetising factors, the magnet's own included) and χ = µ − 1 of each magnet's type. Empty
/// slots take no part. A type with µ = 1 keeps its polarisation.
///
/// Error: at µ = 1.05 the polarisation varies inside a magnet by a few percent; against magnets cut
/// into cells, each with its own polarisation, readings 1 mm over the faces of a ring of blocks
/// differ by 0.5 % of the greatest, where the mutual magnetisation as a whole is worth 2 % (a test
/// holds it). Farther away both shrink.
public final class MutualMagnetisation {
  private final int slots;
  private final RealMatrix factors;
  private final double[] susceptibility;
  private final BitSet filled;
  private final RealMatrix answer;

  private record PairKey(MagnetType at, double turnAt, MagnetType of, double turnOf, int apart) {}

  private MutualMagnetisation(
      int slots, RealMatrix factors, double[] susceptibility, BitSet filled) {
    this.slots = slots;
    this.factors = factors;
    this.susceptibility = susceptibility;
    this.filled = filled;
    answer = solve();
  }

  /// A ring with a magnet in every slot.
  public static MutualMagnetisation of(RingDesign design) {
    int slots = design.slots();
    double[] susceptibility = new double[slots];
    boolean answers = false;
    for (int i = 0; i < slots; i++) {
      susceptibility[i] = design.typeAt(i + 1).recoilPermeability() - 1;
      answers |= susceptibility[i] != 0;
    }
    RealMatrix factors = answers ? factors(design) : new Array2DRowRealMatrix(2 * slots, 2 * slots);
    BitSet filled = new BitSet(slots);
    filled.set(0, slots);
    return new MutualMagnetisation(slots, factors, susceptibility, filled);
  }

  /// The same ring with magnets in some slots only.
  ///
  /// @param filledSlots slot numbers, from 1
  public MutualMagnetisation withOnly(Iterable<Integer> filledSlots) {
    BitSet set = new BitSet(slots);
    filledSlots.forEach(slot -> set.set(slot - 1));
    return new MutualMagnetisation(slots, factors, susceptibility, set);
  }

  /// The polarisations that come of remanences and facings.
  ///
  /// @param remanence each slot's remanence as a vector, tesla; what stands for an empty slot does
  ///   not count
  public RingPolarisation answerTo(RingPolarisation remanence) {
    double[] both = new double[2 * slots];
    System.arraycopy(remanence.outArray(), 0, both, 0, slots);
    System.arraycopy(remanence.nextArray(), 0, both, slots, slots);
    double[] result = answer.operate(both);
    double[] out = new double[slots];
    double[] next = new double[slots];
    System.arraycopy(result, 0, out, 0, slots);
    System.arraycopy(result, slots, next, 0, slots);
    return new RingPolarisation(out, next);
  }

  /// Readings per tesla of remanence instead of per tesla of polarisation.
  public FieldMatrix perRemanence(FieldMatrix perPolarisation) {
    if (rigid()) {
      return perPolarisation;
    }
    int rows = perPolarisation.rows();
    double[][] both = new double[rows][2 * slots];
    for (int row = 0; row < rows; row++) {
      for (int slot = 1; slot <= slots; slot++) {
        both[row][slot - 1] = perPolarisation.perOut(row, slot);
        both[row][slots + slot - 1] = perPolarisation.perNext(row, slot);
      }
    }
    FieldMatrix result = new FieldMatrix(rows, slots);
    if (rows == 0) {
      return result;
    }
    RealMatrix product = new Array2DRowRealMatrix(both, false).multiply(answer);
    for (int row = 0; row < rows; row++) {
      for (int slot = 1; slot <= slots; slot++) {
        result.set(
            row, slot, product.getEntry(row, slot - 1), product.getEntry(row, slots + slot - 1));
      }
    }
    return result;
  }

  private boolean rigid() {
    for (double chi : susceptibility) {
      if (chi != 0) {
        return false;
      }
    }
    return filled.cardinality() == slots;
  }

  /// (I − χN)⁻¹ over the filled slots, zero elsewhere.
  private RealMatrix solve() {
    int size = 2 * slots;
    RealMatrix system = MatrixUtils.createRealIdentityMatrix(size);
    for (int i = 0; i < size; i++) {
      for (int j = 0; j < size; j++) {
        if (filled.get(i % slots) && filled.get(j % slots)) {
          system.addToEntry(i, j, -susceptibility[i % slots] * factors.getEntry(i, j));
        }
      }
    }
    RealMatrix inverse = new LUDecomposition(system).getSolver().getInverse();
    for (int i = 0; i < size; i++) {
      if (!filled.get(i % slots)) {
        inverse.setEntry(i, i, 0);
      }
    }
    return inverse;
  }

  /// Averages of µ0·H over each magnet per tesla of each other's polarisation, in the slots' own
  /// frames; rows and columns: all out, then all next.
  private static RealMatrix factors(RingDesign design) {
    int slots = design.slots();
    Layout layout = design.layout();
    RealMatrix factors = new Array2DRowRealMatrix(2 * slots, 2 * slots);
    Map<PairKey, double[]> known = new HashMap<>();
    for (int i = 0; i < slots; i++) {
      double turnAt = design.bodyTurnRadians(i + 1, layout.ruleFacing(i + 1));
      for (int j = 0; j < slots; j++) {
        double turnOf = design.bodyTurnRadians(j + 1, layout.ruleFacing(j + 1));
        PairKey key =
            new PairKey(
                design.typeAt(i + 1),
                turnAt,
                design.typeAt(j + 1),
                turnOf,
                Math.floorMod(i - j, slots));
        double[] pair = known.computeIfAbsent(key, k -> pair(k, slots, layout.slotRadiusMetres()));
        factors.setEntry(i, j, pair[0]);
        factors.setEntry(i, slots + j, pair[1]);
        factors.setEntry(slots + i, j, pair[2]);
        factors.setEntry(slots + i, slots + j, pair[3]);
      }
    }
    return factors;
  }

  /// Average over one magnet of another's field: out per out, out per next, next per out, next per
  /// next.
  private static double[] pair(PairKey key, int slots, double slotRadius) {
    Body at = MagnetBody.of(key.at());
    Body of = MagnetBody.of(key.of());
    double angle = 2 * Math.PI * key.apart() / slots;
    double x = slotRadius * (Math.cos(angle) - 1);
    double y = slotRadius * Math.sin(angle);
    double[] mean = new double[3];
    double[] f = new double[3];
    double cAt = Math.cos(angle + key.turnAt());
    double sAt = Math.sin(angle + key.turnAt());
    VolumeAverage.over(
        at,
        (u, v, w, weight) -> {
          SlotTensor.at(of, key.turnOf(), x + cAt * u - sAt * v, y + sAt * u + cAt * v, w, f);
          for (int n = 0; n < 3; n++) {
            mean[n] += weight * f[n];
          }
        });
    if (key.apart() == 0) {
      mean[0] -= 1;
      mean[1] -= 1;
    }
    double c = Math.cos(angle);
    double s = Math.sin(angle);
    return new double[] {
      c * mean[0] + s * mean[2],
      c * mean[2] + s * mean[1],
      c * mean[2] - s * mean[0],
      c * mean[1] - s * mean[2]
    };
  }
}
