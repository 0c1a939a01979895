package lodebook.ui.files;

/// A place in a text file.
///
/// @param line line, from 1
/// @param column column in characters, from 1
public record Place(int line, int column) {
  /// The beginning of a file.
  static final Place START = new Place(1, 1);
}
