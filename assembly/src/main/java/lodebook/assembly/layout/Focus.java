package lodebook.assembly.layout;

/// The side of the ring on which the field is to be strong.
public enum Focus {
  /// Strong inside the ring, as an outer ring of a gear needs it.
  IN,
  /// Strong outside the ring, as an inner rotor of a gear needs it.
  OUT
}
