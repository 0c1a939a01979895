package lodebook.assembly.plan;

/// What a magnet does when the hand lets go.
public enum Behaviour {
  /// Nothing to speak of.
  HOLDS,
  /// Presses on a wall of its pocket and stays.
  PRESSES,
  /// Is pushed out of its pocket, on the last bit of the way or on the way in.
  LIFTS
}
