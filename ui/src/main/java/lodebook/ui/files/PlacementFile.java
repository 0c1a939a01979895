package lodebook.ui.files;

import java.util.List;
import lodebook.assembly.layout.Facing;
import lodebook.db.stock.PieceName;

/// Reads what was put where.
public final class PlacementFile {
  private static final List<Column> COLUMNS =
      Column.andOptional(Column.required("slot", "piece", "facing_deg"), "at", "by");
  private static final double TURN = 360;

  private PlacementFile() {}

  /// All placements of a file.
  ///
  /// @throws BadFile where the file is wrong in itself
  public static Rows<PlacementRow> read(Source source) {
    Once slots = new Once();
    Once pieces = new Once();
    return CsvTable.read(source, COLUMNS, cells -> row(cells, slots, pieces));
  }

  private static PlacementRow row(Cells cells, Once slots, Once pieces) {
    int slot = cells.count("slot");
    if (cells.has("slot")) {
      slots.check(cells, "slot", Integer.toString(slot), "slot " + slot);
    }
    String text = cells.text("piece");
    PieceName piece = PieceText.parse(text);
    if (piece != null) {
      pieces.check(cells, "piece", PieceText.key(piece), "piece " + piece);
    } else if (!text.isEmpty() && !Numbers.isCode(text)) {
      cells.problem("piece", "cell.not-piece-or-lot", text);
    }
    double facing = cells.number("facing_deg");
    if (Math.abs(facing) > TURN) {
      cells.problem("facing_deg", "placement.facing", cells.raw("facing_deg"));
    }
    return new PlacementRow(
        slot,
        piece == null ? text : piece.lot(),
        piece == null ? null : piece.number(),
        Double.isNaN(facing) ? 0 : new Facing(facing).degrees(),
        cells.timeOrNull("at"),
        PieceReadingFile.orNull(cells.raw("by")));
  }
}
