package lodebook.ui.cli;

import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Clock;
import java.time.ZoneId;
import java.util.Locale;
import java.util.Map;
import lodebook.db.book.BookAddress;

/// What both faces find around themselves: the book that is meant, the computer, the language.
///
/// @param address the book that is meant when none is named on a command line
/// @param station name of this computer
/// @param clock the one clock, with the station's zone
/// @param locale the system's language
/// @param log the file that defects are logged in
/// @param screen whether there is a screen to open a window on
public record Here(
    BookAddress address, String station, Clock clock, Locale locale, Path log, boolean screen) {
  /// What an environment says.
  public static Here of(Map<String, String> env) {
    PrintStream nowhere =
        new PrintStream(OutputStream.nullOutputStream(), false, StandardCharsets.UTF_8);
    Clock clock = Clock.system(ZoneId.systemDefault());
    Surroundings around = new Surroundings(env, nowhere, nowhere, clock);
    String named = around.variable("LODEBOOK_BOOK");
    boolean linux = System.getProperty("os.name", "").toLowerCase(Locale.ROOT).contains("linux");
    boolean screen =
        !linux || around.variable("DISPLAY") != null || around.variable("WAYLAND_DISPLAY") != null;
    return new Here(
        named == null ? new BookAddress.Folder(around.defaultBook()) : BookAddress.of(named),
        around.station(),
        clock,
        around.locale(),
        around.defectLog(),
        screen);
  }
}
