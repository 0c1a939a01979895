package lodebook.assembly.layout;

/// A member of a gear.
public enum Member {
  /// The outer ring.
  OUTER,
  /// The iron pieces.
  MODULATOR,
  /// The inner rotor.
  INNER
}
