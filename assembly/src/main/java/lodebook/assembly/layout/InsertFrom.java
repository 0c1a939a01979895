package lodebook.assembly.layout;

/// The side from which a magnet goes into its pocket.
public enum InsertFrom {
  /// Along the axis, from the marked face.
  FACE,
  /// Along the radius, from outside.
  OUTSIDE,
  /// Along the radius, from inside.
  INSIDE
}
