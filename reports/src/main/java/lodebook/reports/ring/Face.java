package lodebook.reports.ring;

/// Which face of the ring a picture looks at.
public enum Face {
  /// The marked face.
  MARKED,
  /// The other face: the picture is mirrored.
  OTHER
}
