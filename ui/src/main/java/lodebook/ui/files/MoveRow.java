package lodebook.ui.files;

/// A piece that goes to a cell of a tray.
///
/// @param piece the piece
/// @param tray the tray
/// @param cell the cell
public record MoveRow(PieceName piece, String tray, String cell) {}
