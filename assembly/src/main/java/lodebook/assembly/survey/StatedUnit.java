package lodebook.assembly.survey;

/// The family of units in which a person wrote a reading down: needed to see that one was taken for
/// the other.
public enum StatedUnit {
  /// Tesla or millitesla.
  TESLA,
  /// Gauss or kilogauss.
  GAUSS
}
