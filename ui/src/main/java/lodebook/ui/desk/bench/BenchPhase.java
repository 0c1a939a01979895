package lodebook.ui.desk.bench;

/// What the bench shows.
public enum BenchPhase {
  /// Which rotor?
  CHOOSE,
  /// A step, and the field for its reading.
  STEP,
  /// A reading that is not as it should be: what is likely wrong, and what to do.
  DOUBT,
  /// The ring is full.
  FULL,
  /// There is no plan.
  UNPLANNED,
  /// The plan lost pieces.
  SPOILT
}
