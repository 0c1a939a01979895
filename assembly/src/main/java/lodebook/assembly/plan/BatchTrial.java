package lodebook.assembly.plan;

/// One order of a batch under change: what it costs to exchange two pieces is known at once,
/// whether they sit in one ring, in two, or one of them is spare.
final class BatchTrial {
  private final BatchPuzzle puzzle;
  private final int[] order;
  private final int[] holderOf;
  private final double[] s;
  private final double[] gradient;
  private final double[] square;
  private final double[] re;
  private final double[] im;
  private final double[] cost;

  BatchTrial(BatchPuzzle puzzle, int[] order) {
    this.puzzle = puzzle;
    this.order = order.clone();
    int rings = puzzle.forms.length;
    holderOf = new int[order.length];
    s = new double[order.length];
    gradient = new double[puzzle.spares()];
    square = new double[rings];
    re = new double[rings];
    im = new double[rings];
    cost = new double[rings];
    for (int i = 0; i < order.length; i++) {
      s[i] = puzzle.strength[order[i]];
      holderOf[order[i]] = i;
    }
    refresh();
  }

  int[] order() {
    return order.clone();
  }

  int pieceOn(int holder) {
    return order[holder];
  }

  int holderOf(int piece) {
    return holderOf[piece];
  }

  /// Reckons everything anew from the strengths, against the drift of many small changes.
  void refresh() {
    for (int ring = 0; ring < cost.length; ring++) {
      HarmonicForm form = puzzle.forms[ring];
      int first = puzzle.first[ring];
      square[ring] = 0;
      re[ring] = 0;
      im[ring] = 0;
      for (int i = 0; i < form.slots; i++) {
        double row = 0;
        for (int j = 0; j < form.slots; j++) {
          row += form.q[i * form.slots + j] * s[first + j];
        }
        gradient[first + i] = row;
        square[ring] +=
            row * s[first + i] + form.q[i * form.slots + i] * puzzle.variance[order[first + i]];
        re[ring] += form.workingReal[i] * s[first + i];
        im[ring] += form.workingImaginary[i] * s[first + i];
      }
      cost[ring] = costOf(ring, square[ring], re[ring], im[ring]);
    }
  }

  double cost() {
    double sum = 0;
    for (double each : cost) {
      sum += each;
    }
    return sum;
  }

  /// Whether a slot's piece and another holder's may be exchanged.
  boolean mayExchange(int slot, int other) {
    int ring = puzzle.ringOf[slot];
    int otherRing = puzzle.ringOf[other];
    return slot != other
        && (ring == otherRing
            || (puzzle.fits(order[slot], otherRing) && puzzle.fits(order[other], ring)));
  }

  /// Change of the cost when a slot's piece and another holder's are exchanged.
  double change(int slot, int other) {
    double step = s[other] - s[slot];
    double uncertain = puzzle.variance[order[other]] - puzzle.variance[order[slot]];
    int ring = puzzle.ringOf[slot];
    int otherRing = puzzle.ringOf[other];
    if (otherRing == ring) {
      return within(ring, slot, other, step, uncertain) - cost[ring];
    }
    double change = alone(ring, slot, step, uncertain) - cost[ring];
    if (otherRing >= 0) {
      change += alone(otherRing, other, -step, -uncertain) - cost[otherRing];
    }
    return change;
  }

  private double within(int ring, int slot, int other, double step, double uncertain) {
    HarmonicForm form = puzzle.forms[ring];
    int i = slot - puzzle.first[ring];
    int j = other - puzzle.first[ring];
    return costOf(
        ring,
        square[ring] + withinSquare(form, i, j, slot, other, step, uncertain),
        re[ring] + step * (form.workingReal[i] - form.workingReal[j]),
        im[ring] + step * (form.workingImaginary[i] - form.workingImaginary[j]));
  }

  private double withinSquare(
      HarmonicForm form, int i, int j, int slot, int other, double step, double uncertain) {
    double own = form.q[i * form.slots + i];
    double others = form.q[j * form.slots + j];
    double mutual = form.q[i * form.slots + j];
    return step * (2 * (gradient[slot] - gradient[other]) + step * (own + others - 2 * mutual))
        + (own - others) * uncertain;
  }

  private double alone(int ring, int slot, double step, double uncertain) {
    HarmonicForm form = puzzle.forms[ring];
    int i = slot - puzzle.first[ring];
    return costOf(
        ring,
        square[ring] + aloneSquare(form, i, slot, step, uncertain),
        re[ring] + step * form.workingReal[i],
        im[ring] + step * form.workingImaginary[i]);
  }

  private double aloneSquare(HarmonicForm form, int i, int slot, double step, double uncertain) {
    double own = form.q[i * form.slots + i];
    return step * (2 * gradient[slot] + step * own) + own * uncertain;
  }

  /// Exchanges a slot's piece and another holder's.
  void exchange(int slot, int other) {
    double step = s[other] - s[slot];
    double uncertain = puzzle.variance[order[other]] - puzzle.variance[order[slot]];
    int ring = puzzle.ringOf[slot];
    int otherRing = puzzle.ringOf[other];
    if (otherRing == ring) {
      HarmonicForm form = puzzle.forms[ring];
      square[ring] +=
          withinSquare(
              form,
              slot - puzzle.first[ring],
              other - puzzle.first[ring],
              slot,
              other,
              step,
              uncertain);
      shift(ring, slot, step);
      shift(ring, other, -step);
      cost[ring] = costOf(ring, square[ring], re[ring], im[ring]);
    } else {
      settle(ring, slot, step, uncertain);
      if (otherRing >= 0) {
        settle(otherRing, other, -step, -uncertain);
      }
    }
    int piece = order[slot];
    order[slot] = order[other];
    order[other] = piece;
    s[slot] = puzzle.strength[order[slot]];
    s[other] = puzzle.strength[piece];
    holderOf[order[slot]] = slot;
    holderOf[piece] = other;
  }

  private void settle(int ring, int slot, double step, double uncertain) {
    square[ring] +=
        aloneSquare(puzzle.forms[ring], slot - puzzle.first[ring], slot, step, uncertain);
    shift(ring, slot, step);
    cost[ring] = costOf(ring, square[ring], re[ring], im[ring]);
  }

  private void shift(int ring, int slot, double step) {
    HarmonicForm form = puzzle.forms[ring];
    int first = puzzle.first[ring];
    int i = slot - first;
    re[ring] += step * form.workingReal[i];
    im[ring] += step * form.workingImaginary[i];
    int row = i * form.slots;
    for (int j = 0; j < form.slots; j++) {
      gradient[first + j] += step * form.q[row + j];
    }
  }

  private double costOf(int ring, double sum, double real, double imaginary) {
    double working = real * real + imaginary * imaginary;
    double off = Math.sqrt(working) / puzzle.target[ring] - 1;
    return sum / working + BatchPuzzle.PRICE_OF_AMPLITUDE * off * off;
  }
}
