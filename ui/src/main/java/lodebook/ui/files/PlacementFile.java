package lodebook.ui.files;

import java.util.List;
import lodebook.assembly.layout.Facing;
import lodebook.db.builds.PlaceRow;
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
  public static Rows<PlaceRow> read(Source source) {
    Once slots = new Once();
    Once pieces = new Once();
    return CsvTable.read(source, COLUMNS, cells -> row(cells, slots, pieces));
  }

  private static PlaceRow row(Cells cells, Once slots, Once pieces) {
    int slot = cells.count("slot");
    if (cells.has("slot")) {
      slots.check(cells, "slot", Integer.toString(slot), "slot " + slot);
    }
    String magnet = cells.text("piece");
    PieceName piece = PieceText.parse(magnet);
    if (piece != null) {
      pieces.check(cells, "piece", PieceText.key(piece), "piece " + piece);
    } else if (!magnet.isEmpty() && !Numbers.isCode(magnet)) {
      cells.problem("piece", "cell.not-piece-or-lot", magnet);
    }
    double facing = cells.number("facing_deg");
    if (Math.abs(facing) > TURN) {
      cells.problem("facing_deg", "placement.facing", cells.raw("facing_deg"));
    }
    return new PlaceRow(
        slot,
        magnet,
        Double.isNaN(facing) ? 0 : new Facing(facing).degrees(),
        cells.timeOrNull("at"),
        PieceReadingFile.orNull(cells.raw("by")));
  }
}
