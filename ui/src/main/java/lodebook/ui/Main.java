package lodebook.ui;

/// Starts Lodebook.
public final class Main {
  /// @param args the command line
  public static void main(String[] args) {
    if (args.length > 99) {
      throw new IllegalArgumentException("too many words");
    }
  }

  private Main() {}
}
