package lodebook.ui.files;

import java.util.List;
import lodebook.db.stock.CellMove;
import lodebook.db.stock.PieceName;

/// Reads moves of pieces between trays.
public final class MoveFile {
  private static final List<Column> COLUMNS = Column.required("piece", "tray", "cell");

  private MoveFile() {}

  /// All moves of a file.
  ///
  /// @throws BadFile where the file is wrong in itself
  public static Rows<CellMove> read(Source source) {
    Once pieces = new Once();
    Once places = new Once();
    return CsvTable.read(source, COLUMNS, cells -> row(cells, pieces, places));
  }

  private static CellMove row(Cells cells, Once pieces, Once places) {
    PieceName piece = PieceText.of(cells, "piece");
    if (!piece.lot().isEmpty()) {
      pieces.check(cells, "piece", PieceText.key(piece), "piece " + piece);
    }
    String tray = cells.text("tray");
    String cell = cells.text("cell");
    if (!tray.isEmpty() && !Numbers.isCode(tray)) {
      cells.problem("tray", "cell.not-code", "tray", tray);
    } else if (!tray.isEmpty() && !cell.isEmpty()) {
      places.check(cells, "cell", tray + " " + cell, "tray " + tray + " cell " + cell);
    }
    return new CellMove(piece, tray, cell);
  }
}
