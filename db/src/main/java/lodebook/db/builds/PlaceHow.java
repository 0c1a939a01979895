package lodebook.db.builds;

/// What placing may change.
///
/// @param change what happens to a slot that is filled
/// @param deviation whether a facing off the layout is meant so; a lead's business
/// @param why the reason; needed for a deviation and for every change
public record PlaceHow(Change change, boolean deviation, String why) {
  /// Empty slots only, facings as the layout says.
  public static final PlaceHow PLAIN = new PlaceHow(Change.NONE, false, "");

  /// What happens to a slot that is filled.
  public enum Change {
    /// It is refused.
    NONE,
    /// The record was wrong from the start.
    CORRECT,
    /// The magnet was changed from now on.
    REWORK
  }
}
