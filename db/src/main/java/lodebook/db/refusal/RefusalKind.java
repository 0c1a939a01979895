package lodebook.db.refusal;

/// Why something was not done, which decides the exit code of the command line.
public enum RefusalKind {
  /// What was handed in is wrong in itself.
  WRONG_INPUT(3),
  /// The book's contents do not allow it.
  REFUSED(4),
  /// The book cannot be opened or read.
  CANNOT_OPEN(5);

  private final int exitCode;

  RefusalKind(int exitCode) {
    this.exitCode = exitCode;
  }

  /// Exit code of a command that ends so.
  public int exitCode() {
    return exitCode;
  }
}
