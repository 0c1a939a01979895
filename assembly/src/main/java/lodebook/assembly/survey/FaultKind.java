package lodebook.assembly.survey;

/// What can be wrong with a magnet, or with a reading.
public enum FaultKind {
  /// North points the other way.
  REVERSED("reversed"),
  /// The facing is 90° more than it should be.
  QUARTER_TURN_FORWARD("quarter turn forward"),
  /// The facing is 90° less than it should be.
  QUARTER_TURN_BACK("quarter turn back"),
  /// Turned by some other angle; only for magnets that can stand so.
  TURNED("turned"),
  /// No magnet, or one with less than a fifth of its strength.
  MISSING("missing"),
  /// Strength below 0.9 of the piece's own.
  WEAK("weak"),
  /// Strength above 1.1 of the piece's own.
  STRONG("strong"),
  /// One reading that nothing explains.
  SUSPECT_READING("suspect reading");

  private final String word;

  FaultKind(String word) {
    this.word = word;
  }

  /// The word in machine-readable output, never translated.
  public String word() {
    return word;
  }
}
