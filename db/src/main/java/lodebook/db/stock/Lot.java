package lodebook.db.stock;

/// A lot as it stands.
///
/// @param received what was received; the count as it was last counted
/// @param state what may be done with it
/// @param measured pieces with an estimate of their strength
/// @param placed pieces in a slot
/// @param scrapped pieces scrapped
/// @param held pieces on hold by themselves
public record Lot(
    NewLot received, LotState state, int measured, int placed, int scrapped, int held) {
  /// Its number.
  public String code() {
    return received.lot();
  }

  /// Pieces neither placed nor scrapped.
  public int left() {
    return received.count() - placed - scrapped;
  }
}
