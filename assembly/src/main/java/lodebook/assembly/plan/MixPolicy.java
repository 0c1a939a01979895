package lodebook.assembly.plan;

/// Which lots may go together in one rotor.
public enum MixPolicy {
  /// One lot for each magnet type.
  NEVER,
  /// As few lots as can fill the rotor, so that tracing stays sharp.
  FEW,
  /// Any of the lots given.
  FREE
}
