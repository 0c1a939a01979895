package lodebook.ui.files;

/// One thing that is wrong in a file.
///
/// @param file the file as the person named it
/// @param line line, from 1
/// @param column column in characters, from 1
/// @param sentence what is wrong and what was expected
public record Problem(String file, int line, int column, String sentence) {
  Problem(String file, Place place, String sentence) {
    this(file, place.line(), place.column(), sentence);
  }

  /// The problem as `file:line:column: sentence`.
  @Override
  public String toString() {
    return file + ":" + line + ":" + column + ": " + sentence;
  }
}
