package lodebook.assembly.layout;

/// Where round the ring a probe is held.
public enum Spot {
  /// Over the middle of the slot.
  CENTRE,
  /// Midway between the slot and the next higher one.
  TO_NEXT
}
