package lodebook.assembly.plan;

/// Pieces that are short for a plan.
///
/// @param type code of the magnet type
/// @param needed how many empty slots want this type
/// @param available how many may be used under the mix policy
public record Shortage(String type, int needed, int available) {
  /// How many are missing.
  public int missing() {
    return needed - available;
  }
}
