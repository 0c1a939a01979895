package lodebook.assembly.survey;

/// One deviation from a right ring, as the computation handles it.
///
/// @param place slot index from 0; for a suspect reading the row's index
/// @param kind what is wrong
/// @param amount share of the strength (weak, strong), angle in radians (turned), otherwise 0
record Fault(int place, FaultKind kind, double amount) {
  static final double WEAKEST = 0.05;
  static final double WEAK_BELOW = 0.9;
  static final double STRONG_ABOVE = 1.1;
  static final double STRONGEST = 1.5;
  static final double MISSING_BELOW = 0.2;
  static final double LEAST_TURN = Math.toRadians(15);
  private static final double NEARLY_DEGREES = 15;

  static Fault of(int place, FaultKind kind) {
    return new Fault(place, kind, 0);
  }

  static Fault suspect(int row) {
    return new Fault(row, FaultKind.SUSPECT_READING, 0);
  }

  /// What people are told: a magnet with hardly any strength is missing, one turned by nearly a
  /// quarter or a half is called so.
  FaultKind name() {
    if (kind == FaultKind.WEAK && amount < MISSING_BELOW) {
      return FaultKind.MISSING;
    }
    if (kind == FaultKind.TURNED) {
      double degrees = Math.toDegrees(amount);
      if (Math.abs(degrees) > 180 - NEARLY_DEGREES) {
        return FaultKind.REVERSED;
      }
      if (Math.abs(Math.abs(degrees) - 90) < NEARLY_DEGREES) {
        return degrees > 0 ? FaultKind.QUARTER_TURN_FORWARD : FaultKind.QUARTER_TURN_BACK;
      }
    }
    return kind;
  }

  boolean ofMagnet() {
    return kind != FaultKind.SUSPECT_READING;
  }

  /// Whether the amount is fitted to the readings.
  boolean fitted() {
    return kind == FaultKind.WEAK || kind == FaultKind.STRONG || kind == FaultKind.TURNED;
  }

  Fault withAmount(double value) {
    return new Fault(place, kind, value);
  }

  /// Polarisation of the faulty magnet from that of the right one: outwards into `into[at]`,
  /// towards next into `into[at + 1]`.
  void polarise(double out, double next, double[] into, int at) {
    switch (kind) {
      case REVERSED -> set(into, at, -out, -next);
      case QUARTER_TURN_FORWARD -> set(into, at, -next, out);
      case QUARTER_TURN_BACK -> set(into, at, next, -out);
      case MISSING -> set(into, at, 0, 0);
      case WEAK, STRONG -> set(into, at, amount * out, amount * next);
      case TURNED -> {
        double cos = Math.cos(amount);
        double sin = Math.sin(amount);
        set(into, at, cos * out - sin * next, sin * out + cos * next);
      }
      case SUSPECT_READING -> set(into, at, out, next);
    }
  }

  /// Change of the magnet's polarisation that the fault is, for a right ring's polarisation.
  double[] change(double[] right) {
    int at = 2 * place;
    double[] into = new double[2];
    polarise(right[at], right[at + 1], into, 0);
    into[0] -= right[at];
    into[1] -= right[at + 1];
    return into;
  }

  private static void set(double[] into, int at, double out, double next) {
    into[at] = out;
    into[at + 1] = next;
  }

  /// Lowest amount that the kind allows.
  double lowest() {
    return switch (kind) {
      case WEAK -> WEAKEST;
      case STRONG -> STRONG_ABOVE;
      default -> -Math.PI;
    };
  }

  /// Highest amount that the kind allows.
  double highest() {
    return switch (kind) {
      case WEAK -> WEAK_BELOW;
      case STRONG -> STRONGEST;
      default -> Math.PI;
    };
  }

  /// Prior density of the share of a weak or strong magnet's strength: it rises with the square of
  /// the deviation, since a damaged or mistaken magnet is seldom off by only a little.
  double shareDensity(double share) {
    double far = Math.max(Math.abs(1 - lowest()), Math.abs(highest() - 1));
    double near = Math.min(Math.abs(1 - lowest()), Math.abs(highest() - 1));
    return 3 * (1 - share) * (1 - share) / (far * far * far - near * near * near);
  }

  /// The same where another magnet is reversed already.
  double priorInCompany(Priors priors) {
    return kind == FaultKind.REVERSED ? priors.furtherReversed() : prior(priors);
  }

  double prior(Priors priors) {
    return switch (kind) {
      case REVERSED -> priors.reversed();
      case QUARTER_TURN_FORWARD, QUARTER_TURN_BACK -> priors.quarterTurn();
      case TURNED -> priors.turned();
      case MISSING -> priors.missing();
      case WEAK -> priors.weak();
      case STRONG -> priors.strong();
      case SUSPECT_READING -> priors.wildReading();
    };
  }
}
