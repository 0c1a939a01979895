package lodebook.ui;

import lodebook.ui.cli.Lodebook;

/// Starts Lodebook.
public final class Main {
  /// @param args the command line
  public static void main(String[] args) {
    System.exit(Lodebook.run(args));
  }

  private Main() {}
}
