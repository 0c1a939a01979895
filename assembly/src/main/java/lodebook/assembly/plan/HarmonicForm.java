package lodebook.assembly.plan;

/// Assembly error of a ring as a quadratic form of its strengths, and its working wave.
///
/// With s the strengths (tesla) slot by slot, the mean square of the unwanted harmonics is 2·sᵀQs
/// and that of the working wave 2·|w·s|². Unwanted is every harmonic that no ideal ring has, after
/// the harmonics of the same ring by the rule with equal pieces (each type's mean in this ring) are
/// subtracted; that subtraction is part of Q.
final class HarmonicForm {
  final int slots;

  /// Q row by row, symmetric, no negative eigenvalue.
  final double[] q;

  final double[] workingReal;
  final double[] workingImaginary;

  private HarmonicForm(int slots, double[] q, double[] workingReal, double[] workingImaginary) {
    this.slots = slots;
    this.q = q;
    this.workingReal = workingReal;
    this.workingImaginary = workingImaginary;
  }

  /// @param asPlaced harmonics with the facings that the magnets have or are to have
  /// @param byRule harmonics with every facing by the rule
  /// @param pool for each slot the index of its magnet type, from 0
  static HarmonicForm of(SlotHarmonics asPlaced, SlotHarmonics byRule, int[] pool) {
    int n = asPlaced.slots();
    double[] q = new double[n * n];
    double[] working = new double[n];
    double[] workingImaginary = new double[n];
    for (int h = 0; h <= asPlaced.highestOrder(); h++) {
      if (h == asPlaced.workingOrder()) {
        for (int i = 0; i < n; i++) {
          working[i] = asPlaced.real(h, i);
          workingImaginary[i] = asPlaced.imaginary(h, i);
        }
      }
      if (!asPlaced.ideal(h)) {
        double[] re = new double[n];
        double[] im = new double[n];
        for (int i = 0; i < n; i++) {
          re[i] = asPlaced.real(h, i);
          im[i] = asPlaced.imaginary(h, i);
        }
        subtractIdeal(byRule, h, pool, re, im);
        addSquares(q, re, im, h == 0 ? 0.5 : 1.0);
      }
    }
    return new HarmonicForm(n, q, working, workingImaginary);
  }

  private static void subtractIdeal(
      SlotHarmonics byRule, int h, int[] pool, double[] re, double[] im) {
    int n = pool.length;
    int pools = 0;
    for (int each : pool) {
      pools = Math.max(pools, each + 1);
    }
    double[] sumReal = new double[pools];
    double[] sumImaginary = new double[pools];
    int[] members = new int[pools];
    for (int i = 0; i < n; i++) {
      sumReal[pool[i]] += byRule.real(h, i);
      sumImaginary[pool[i]] += byRule.imaginary(h, i);
      members[pool[i]]++;
    }
    for (int i = 0; i < n; i++) {
      re[i] -= sumReal[pool[i]] / members[pool[i]];
      im[i] -= sumImaginary[pool[i]] / members[pool[i]];
    }
  }

  private static void addSquares(double[] q, double[] re, double[] im, double weight) {
    int n = re.length;
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        q[i * n + j] += weight * (re[i] * re[j] + im[i] * im[j]);
      }
    }
  }

  /// Unwanted harmonics over the working wave, a ratio of root mean squares.
  double unwanted(double[] strength) {
    return Math.sqrt(Math.max(0, square(strength)) / workingSquare(strength));
  }

  /// Unwanted harmonics to be expected where single strengths are uncertain.
  ///
  /// @param variance variance of each strength, tesla²
  double unwanted(double[] strength, double[] variance) {
    double sum = Math.max(0, square(strength));
    for (int i = 0; i < slots; i++) {
      sum += q[i * slots + i] * variance[i];
    }
    return Math.sqrt(sum / workingSquare(strength));
  }

  /// Amplitude 2|c_p| of the working wave, tesla.
  double workingAmplitude(double[] strength) {
    return 2 * Math.sqrt(workingSquare(strength));
  }

  /// sᵀQs.
  double square(double[] strength) {
    double sum = 0;
    for (int i = 0; i < slots; i++) {
      double row = 0;
      for (int j = 0; j < slots; j++) {
        row += q[i * slots + j] * strength[j];
      }
      sum += row * strength[i];
    }
    return sum;
  }

  private double workingSquare(double[] strength) {
    double re = 0;
    double im = 0;
    for (int i = 0; i < slots; i++) {
      re += workingReal[i] * strength[i];
      im += workingImaginary[i] * strength[i];
    }
    return re * re + im * im;
  }
}
