package lodebook.assembly.plan;

/// One order of a puzzle under change, with what it costs to exchange two pieces known at once.
///
/// The gradient Qs is kept up to date, so trying an exchange takes a fixed time and making it takes
/// time in proportion to the slots.
final class Trial {
  private final Puzzle puzzle;
  private final int n;
  private final double[] q;
  private final int[] order;
  private final double[] s;
  private final double[] gradient;
  private double square;
  private double re;
  private double im;
  private double cost;

  Trial(Puzzle puzzle, int[] order) {
    this.puzzle = puzzle;
    this.n = puzzle.form.slots;
    this.q = puzzle.form.q;
    this.order = order.clone();
    this.s = new double[order.length];
    this.gradient = new double[n];
    restart(order);
  }

  /// Takes up another order.
  void restart(int[] from) {
    System.arraycopy(from, 0, order, 0, order.length);
    for (int i = 0; i < order.length; i++) {
      s[i] = puzzle.strength[order[i]];
    }
    refresh();
  }

  /// Reckons everything anew from the strengths, against the drift of many small changes.
  void refresh() {
    square = 0;
    re = 0;
    im = 0;
    for (int i = 0; i < n; i++) {
      double row = 0;
      for (int j = 0; j < n; j++) {
        row += q[i * n + j] * s[j];
      }
      gradient[i] = row;
      square += row * s[i] + q[i * n + i] * puzzle.variance[order[i]];
      re += puzzle.form.workingReal[i] * s[i];
      im += puzzle.form.workingImaginary[i] * s[i];
    }
    cost = costOf(square, re, im);
  }

  double cost() {
    return cost;
  }

  int[] order() {
    return order.clone();
  }

  /// Whether the pieces of a slot and another holder may be exchanged: wished ones stay in slots.
  boolean mayExchange(int slot, int other) {
    return slot != other && (other < n || !puzzle.wished[order[slot]]);
  }

  /// Cost after the pieces of a slot and another holder of its pool were exchanged.
  double costWith(int slot, int other) {
    double step = s[other] - s[slot];
    double newSquare = square + squareChange(slot, other, step);
    double newRe = re + step * puzzle.form.workingReal[slot];
    double newIm = im + step * puzzle.form.workingImaginary[slot];
    if (other < n) {
      newRe -= step * puzzle.form.workingReal[other];
      newIm -= step * puzzle.form.workingImaginary[other];
    }
    return costOf(newSquare, newRe, newIm);
  }

  /// Exchanges the pieces of a slot and another holder of its pool.
  void exchange(int slot, int other) {
    double step = s[other] - s[slot];
    square += squareChange(slot, other, step);
    re += step * puzzle.form.workingReal[slot];
    im += step * puzzle.form.workingImaginary[slot];
    int slotRow = slot * n;
    if (other < n) {
      int otherRow = other * n;
      re -= step * puzzle.form.workingReal[other];
      im -= step * puzzle.form.workingImaginary[other];
      for (int i = 0; i < n; i++) {
        gradient[i] += step * (q[slotRow + i] - q[otherRow + i]);
      }
    } else {
      for (int i = 0; i < n; i++) {
        gradient[i] += step * q[slotRow + i];
      }
    }
    cost = costOf(square, re, im);
    int piece = order[slot];
    order[slot] = order[other];
    order[other] = piece;
    s[other] = puzzle.strength[piece];
    s[slot] = puzzle.strength[order[slot]];
  }

  private double squareChange(int slot, int other, double step) {
    double ownSlot = q[slot * n + slot];
    double uncertain = puzzle.variance[order[other]] - puzzle.variance[order[slot]];
    if (other >= n) {
      return step * (2 * gradient[slot] + step * ownSlot) + ownSlot * uncertain;
    }
    double ownOther = q[other * n + other];
    return step
            * (2 * (gradient[slot] - gradient[other])
                + step * (ownSlot + ownOther - 2 * q[slot * n + other]))
        + (ownSlot - ownOther) * uncertain;
  }

  private double costOf(double sum, double real, double imaginary) {
    double working = real * real + imaginary * imaginary;
    double cost = sum / working;
    double ratio = working / (puzzle.target * puzzle.target);
    double low = 1 - puzzle.tolerance;
    double high = 1 + puzzle.tolerance;
    if (ratio < low * low || ratio > high * high) {
      cost += puzzle.priceOfAmplitude(Math.sqrt(working));
    }
    return cost;
  }
}
