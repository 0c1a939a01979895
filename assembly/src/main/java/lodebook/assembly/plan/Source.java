package lodebook.assembly.plan;

import lodebook.assembly.layout.Facing;
import lodebook.assembly.magnet.Strength;
import org.jspecify.annotations.Nullable;

/// A magnet that is used or may be used.
///
/// @param piece the piece's name, or null for any magnet of the lot
/// @param lot code of the lot
/// @param strength its strength, or its lot's mean and spread
/// @param facing the way it faces where it is in place already, else null
record Source(@Nullable String piece, String lot, Strength strength, @Nullable Facing facing) {
  static Source of(Candidate each) {
    return new Source(each.piece(), each.lot(), each.strength(), null);
  }

  static Source of(LotSupply each) {
    return new Source(null, each.lot(), each.strength(), null);
  }

  static Source of(Kept each) {
    return new Source(each.piece(), each.lot(), each.strength(), each.facing());
  }

  double remanence() {
    return strength.remanenceTesla();
  }

  /// Variance of a single piece about its stated strength, tesla²; 0 for measured pieces.
  double variance() {
    double sigma = strength.standardUncertaintyTesla();
    return piece == null ? sigma * sigma : 0;
  }

  /// This magnet in a slot.
  ///
  /// @param rule the facing where it is not in place already
  Placement in(int slot, Facing rule) {
    return new Placement(
        slot, piece, lot, facing != null ? facing : rule, strength, facing != null);
  }
}
