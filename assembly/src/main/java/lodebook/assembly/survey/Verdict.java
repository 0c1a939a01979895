package lodebook.assembly.survey;

/// What a survey comes to.
public enum Verdict {
  /// Every placed magnet is shown right.
  PASS("pass"),
  /// The findings name what is wrong.
  FAULT("fault"),
  /// Two or more explanations are too close, or none fits.
  CANNOT_TELL("cannot tell");

  private final String word;

  Verdict(String word) {
    this.word = word;
  }

  /// The word in machine-readable output, never translated.
  public String word() {
    return word;
  }
}
