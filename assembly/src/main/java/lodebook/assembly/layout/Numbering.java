package lodebook.assembly.layout;

/// Which way slot numbers rise, seen on the marked face.
public enum Numbering {
  /// Like the hours of a clock.
  CLOCKWISE,
  /// Against the hours of a clock.
  COUNTERCLOCKWISE
}
