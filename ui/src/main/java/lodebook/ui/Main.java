package lodebook.ui;

import lodebook.ui.cli.Here;
import lodebook.ui.cli.Lodebook;
import lodebook.ui.desk.window.Desktop;

/// Starts Lodebook: the desktop where nothing is asked for and there is a screen, else the command
/// line.
public final class Main {
  /// @param args the command line
  public static void main(String[] args) {
    if (args.length == 0) {
      Here here = Here.of(System.getenv());
      if (here.screen()) {
        System.exit(
            Desktop.run(
                new Desktop.Setup(
                    here.address(), here.station(), here.clock(), here.locale(), here.log())));
      }
    }
    System.exit(Lodebook.run(args));
  }

  private Main() {}
}
