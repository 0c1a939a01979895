package lodebook.ui.cli;

import java.io.Console;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.Locale;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/// What the program finds around itself when it runs.
///
/// @param env environment variables
/// @param out where answers go
/// @param err where people's text goes that is no answer
/// @param clock the one clock, with the station's zone
record Surroundings(Map<String, String> env, PrintStream out, PrintStream err, Clock clock) {
  /// An environment variable; an empty one counts as absent.
  @Nullable String variable(String name) {
    String content = env.get(name);
    return content == null || content.isBlank() ? null : content;
  }

  /// Whether a person watches a terminal while a command of the whole process runs.
  @SuppressWarnings("SystemConsoleNull") // without a terminal some runtimes have none
  boolean watched() {
    Console console = System.console();
    return variable("TERM") != null && console != null && console.isTerminal();
  }

  /// The language of the system, by the variables that POSIX names.
  Locale locale() {
    for (String name : new String[] {"LC_ALL", "LC_MESSAGES", "LANG"}) {
      String content = variable(name);
      if (content != null) {
        String language = content.split("[._@-]", 2)[0];
        return language.equals("C") || language.equals("POSIX") ? Locale.ROOT : Locale.of(language);
      }
    }
    return Locale.ROOT;
  }

  /// Name of this computer.
  String station() {
    for (String name : new String[] {"LODEBOOK_STATION", "COMPUTERNAME", "HOSTNAME"}) {
      String content = variable(name);
      if (content != null) {
        return content.strip();
      }
    }
    try {
      String host = Files.readString(Path.of("/etc/hostname")).strip();
      return host.isEmpty() ? "station" : host;
    } catch (IOException absent) {
      return "station";
    }
  }

  /// The user's data folder by the platform's convention.
  Path dataFolder() {
    String xdg = variable("XDG_DATA_HOME");
    String windows = variable("LOCALAPPDATA");
    Path home = Path.of(env.getOrDefault("HOME", System.getProperty("user.home", ".")));
    if (xdg != null) {
      return Path.of(xdg).resolve("lodebook");
    }
    if (windows != null) {
      return Path.of(windows).resolve("Lodebook");
    }
    if (Files.isDirectory(home.resolve("Library/Application Support"))) {
      return home.resolve("Library/Application Support/Lodebook");
    }
    return home.resolve(".local/share/lodebook");
  }

  /// The book that is meant when none is named.
  Path defaultBook() {
    return dataFolder().resolve("book");
  }

  /// The file that defects are logged in.
  Path defectLog() {
    return dataFolder().resolve("defects.log");
  }
}
