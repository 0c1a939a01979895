package lodebook.db.stock;

import lodebook.assembly.magnet.Strength;
import org.jspecify.annotations.Nullable;

/// A piece as it stands.
///
/// @param name its lot and number
/// @param state what may be done with it, as far as the piece itself goes
/// @param strength its estimate, or null while it counts as unmeasured
/// @param lies its tray and cell, or null
/// @param stands the rotor and slot where it was placed, or null
/// @param planned the rotor and slot that a plan keeps it for, or null
public record Piece(
    PieceName name,
    PieceState state,
    @Nullable Strength strength,
    @Nullable Cell lies,
    @Nullable Slot stands,
    @Nullable Slot planned) {

  /// A cell of a tray.
  ///
  /// @param tray number of the tray
  /// @param cell the cell's name
  public record Cell(String tray, String cell) {}

  /// A slot of a rotor.
  ///
  /// @param rotor number of the rotor
  /// @param slot from 1
  public record Slot(String rotor, int slot) {}
}
