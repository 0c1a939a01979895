package lodebook.ui.desk.window;

import java.nio.file.Path;
import java.time.Clock;
import java.util.Locale;
import java.util.concurrent.CountDownLatch;
import javafx.application.Platform;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.Scene;
import javafx.stage.Stage;
import lodebook.db.book.BookAddress;
import lodebook.ui.desk.look.Look;
import lodebook.ui.desk.look.Theme;
import lodebook.ui.desk.run.BackgroundRunner;
import lodebook.ui.desk.run.DefectLog;
import lodebook.ui.desk.run.Troubles;
import lodebook.ui.desk.station.Station;
import lodebook.ui.desk.words.DeskWords;

/// Starts the desktop on a book.
public final class Desktop {
  private static final double WIDTH = 1280;
  private static final double HEIGHT = 800;

  private Desktop() {}

  /// What the desktop is started with.
  ///
  /// @param address where the book is
  /// @param station name of this computer
  /// @param clock the one clock, with the station's zone
  /// @param locale the system's language
  /// @param log where defects of the program are written down
  public record Setup(BookAddress address, String station, Clock clock, Locale locale, Path log) {}

  /// Opens the window and waits until it is closed.
  ///
  /// @return the exit code
  public static int run(Setup setup) {
    CountDownLatch closed = new CountDownLatch(1);
    Platform.startup(() -> open(setup, closed));
    try {
      closed.await();
    } catch (InterruptedException leaving) {
      return 0;
    } finally {
      Platform.exit();
    }
    return 0;
  }

  private static void open(Setup setup, CountDownLatch closed) {
    DeskWords words = new DeskWords(setup.locale(), setup.clock().getZone());
    Station station = new Station(setup.address(), setup.station(), setup.clock(), words);
    BackgroundRunner runner =
        new BackgroundRunner(new Troubles(words, new DefectLog(setup.log(), setup.clock())));
    boolean dark =
        Platform.getPreferences().getColorScheme() == javafx.application.ColorScheme.DARK;
    SimpleObjectProperty<Look> look =
        new SimpleObjectProperty<>(new Look(dark ? Theme.DARK : Theme.LIGHT));
    DeskWindow window = new DeskWindow(station, runner, look);
    Stage stage = new Stage();
    stage.setTitle(words.say("window.title"));
    stage.setScene(new Scene(window.root(), WIDTH, HEIGHT));
    stage.setOnHidden(
        _ -> {
          window.end();
          runner.close();
          closed.countDown();
        });
    stage.show();
    window.begin();
  }
}
