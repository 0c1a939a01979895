package lodebook.ui.files;

import java.nio.file.Path;
import java.time.ZoneId;
import java.util.function.Consumer;
import lodebook.ui.words.Words;

/// A file to read, and how to speak of it.
///
/// @param path the file as the person named it
/// @param words language of what is said about it
/// @param zone the station's zone, for times without an offset
/// @param warn takes what is odd but not wrong
public record Source(Path path, Words words, ZoneId zone, Consumer<String> warn) {
  /// A problem at a place of this file.
  Problem problem(Place place, String key, Object... arguments) {
    return new Problem(path.toString(), place.line(), place.column(), words.say(key, arguments));
  }

  /// A refusal of this file for one problem.
  BadFile bad(Place place, String key, Object... arguments) {
    return new BadFile(problem(place, key, arguments));
  }
}
