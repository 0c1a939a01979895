package lodebook.ui.files;

import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import lodebook.db.stock.ReadingRow;
import lodebook.db.surveys.FluxUnit;
import org.jspecify.annotations.Nullable;

/// Reads gaussmeter readings of single pieces.
public final class PieceReadingFile {
  private static final List<Column> COLUMNS =
      Column.andOptional(
          Column.required("piece", "tray", "cell", "value", "unit", "standoff_mm", "temperature_C"),
          "meter",
          "by",
          "at");
  private static final double FARTHEST_MILLIMETRES = 1000;

  private final String lot;
  private final boolean again;
  private final Once rows = new Once();
  private final Map<String, Long> pieceOfCell = new HashMap<>();
  private final Map<Long, String> cellOfPiece = new HashMap<>();

  private PieceReadingFile(String lot, boolean again) {
    this.lot = lot;
    this.again = again;
  }

  /// All readings of a file.
  ///
  /// @param lot the shop's number of the lot that the pieces belong to
  /// @param again whether the same row may stand in the file more than once
  /// @throws BadFile where the file is wrong in itself
  public static Rows<ReadingRow> read(Source source, String lot, boolean again) {
    return CsvTable.read(source, COLUMNS, new PieceReadingFile(lot, again)::row);
  }

  private ReadingRow row(Cells cells) {
    long piece = PieceText.numberIn(cells, "piece", lot);
    double value = cells.number("value");
    if (value < 0) {
      cells.problem("value", "piece.south", cells.raw("value"));
    } else if (value == 0) {
      cells.problem("value", "piece.zero");
    }
    FluxUnit unit = Units.of(cells);
    double standoff = cells.notNegative("standoff_mm");
    if (standoff > FARTHEST_MILLIMETRES) {
      cells.problem("standoff_mm", "piece.far", cells.raw("standoff_mm"));
    }
    if (piece > 0) {
      checkCell(cells, piece);
    }
    if (!again) {
      rows.check(
          cells,
          "piece",
          piece + "|" + value + "|" + unit + "|" + standoff + "|" + rest(cells),
          "piece " + cells.raw("piece"));
    }
    return new ReadingRow(
        piece,
        orNull(cells.raw("tray")),
        orNull(cells.raw("cell")),
        unit.tesla(value),
        standoff / 1000,
        cells.celsiusOrNull("temperature_C"),
        orNull(cells.raw("meter")),
        orNull(cells.raw("by")),
        cells.timeOrNull("at"));
  }

  private static String rest(Cells cells) {
    return String.join(
        "|",
        cells.raw("tray"),
        cells.raw("cell"),
        cells.raw("temperature_C"),
        cells.raw("meter"),
        cells.raw("by"),
        cells.raw("at"));
  }

  static @Nullable String orNull(String text) {
    return text.isEmpty() ? null : text;
  }

  private void checkCell(Cells cells, long piece) {
    String tray = cells.raw("tray");
    String cell = cells.raw("cell");
    if (tray.isEmpty() && cell.isEmpty()) {
      return;
    }
    if (tray.isEmpty() || cell.isEmpty()) {
      String absent = tray.isEmpty() ? "tray" : "cell";
      cells.problem(absent, "piece.half-cell", absent, tray.isEmpty() ? "cell" : "tray");
      return;
    }
    if (!Numbers.isCode(tray)) {
      cells.problem("tray", "cell.not-code", "tray", tray);
      return;
    }
    String where = tray + " " + cell;
    Long other = pieceOfCell.putIfAbsent(where.toLowerCase(Locale.ROOT), piece);
    if (other != null && other != piece) {
      cells.problem("cell", "piece.cell-taken", tray, cell, other);
    }
    String before = cellOfPiece.putIfAbsent(piece, where);
    if (before != null && !before.equalsIgnoreCase(where)) {
      cells.problem("cell", "piece.two-cells", piece, before, where);
    }
  }
}
