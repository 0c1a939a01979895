package lodebook.db.stock;

/// A piece that goes into a cell.
///
/// @param piece the piece
/// @param tray number of the tray, which is made if it is new
/// @param cell name of the cell
public record CellMove(PieceName piece, String tray, String cell) {}
