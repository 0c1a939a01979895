package lodebook.assembly.survey;

/// What the person measuring did.
///
/// @param sign whether all signs are inverted
/// @param startSlot slot at which the row numbered 1 was really taken
/// @param direction whether rows were taken towards falling slot numbers
/// @param unit whether one unit was written for another
public record Measuring(Sign sign, int startSlot, Direction direction, UnitSlip unit) {
  /// Everything done as set.
  public static final Measuring AS_SET =
      new Measuring(Sign.AS_SET, 1, Direction.AS_NUMBERED, UnitSlip.AS_STATED);

  /// Whether nothing slipped.
  public boolean asSet() {
    return equals(AS_SET);
  }

  /// Sign of all readings.
  public enum Sign {
    /// Positive away from the axis and towards the next slot.
    AS_SET("as set"),
    /// The other way round.
    INVERTED("inverted");

    private final String word;

    Sign(String word) {
      this.word = word;
    }

    /// The word in machine-readable output, never translated.
    public String word() {
      return word;
    }
  }

  /// Order in which rows were taken.
  public enum Direction {
    /// Towards rising slot numbers.
    AS_NUMBERED("as numbered"),
    /// Towards falling slot numbers.
    OPPOSITE("opposite");

    private final String word;

    Direction(String word) {
      this.word = word;
    }

    /// The word in machine-readable output, never translated.
    public String word() {
      return word;
    }
  }

  /// Confusion of units.
  public enum UnitSlip {
    /// As the file says.
    AS_STATED("as stated"),
    /// Readings in gauss, written as millitesla: ten times too large.
    GAUSS_AS_MILLITESLA("gauss written as mT"),
    /// Readings in millitesla, written as gauss: ten times too small.
    MILLITESLA_AS_GAUSS("mT written as gauss");

    private final String word;

    UnitSlip(String word) {
      this.word = word;
    }

    /// The word in machine-readable output, never translated.
    public String word() {
      return word;
    }
  }
}
