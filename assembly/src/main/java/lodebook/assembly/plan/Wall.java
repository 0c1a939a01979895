package lodebook.assembly.plan;

/// The wall of a pocket on which a magnet presses.
public enum Wall {
  /// Away from the ring's axis.
  OUTER,
  /// Towards the ring's axis.
  INNER,
  /// Towards the next slot.
  NEXT,
  /// Towards the previous slot.
  PREVIOUS
}
