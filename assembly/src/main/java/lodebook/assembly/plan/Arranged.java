package lodebook.assembly.plan;

/// Ways of putting the same stock into a ring, to compare.
public enum Arranged {
  /// Piece after piece in the order of their numbers, slot after slot.
  AS_THEY_COME,
  /// The strongest piece into the first slot, the next into the second, and so on.
  SORTED,
  /// As the plan has it.
  PLANNED
}
