package lodebook.assembly.layout;

/// Which part of the flux density a reading is.
public enum Component {
  /// Positive away from the axis.
  RADIAL,
  /// Positive towards the next higher slot number.
  TANGENTIAL
}
