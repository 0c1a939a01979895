package lodebook.ui.files;

import java.util.List;
import lodebook.db.stock.NewLot;

/// Reads lots.
public final class LotFile {
  private static final List<Column> COLUMNS =
      Column.andOptional(
          Column.required(
              "lot",
              "type",
              "supplier",
              "received",
              "count",
              "certificate",
              "certificate_br_mT",
              "location"),
          "supplier_lot");
  private static final double STRONGEST_MILLITESLA = 2000;

  private LotFile() {}

  /// All lots of a file.
  ///
  /// @throws BadFile where the file is wrong in itself
  public static Rows<NewLot> read(Source source) {
    Once numbers = new Once();
    return CsvTable.read(source, COLUMNS, cells -> row(cells, numbers));
  }

  private static NewLot row(Cells cells, Once numbers) {
    String lot = Numbers.check(cells, "lot", numbers);
    Double remanence = cells.numberOrNull("certificate_br_mT");
    if (remanence != null && (remanence <= 0 || remanence > STRONGEST_MILLITESLA)) {
      cells.problem("certificate_br_mT", "lot.remanence", cells.raw("certificate_br_mT"));
    }
    return new NewLot(
        lot,
        cells.text("type"),
        cells.text("supplier"),
        cells.raw("supplier_lot"),
        cells.day("received"),
        cells.count("count"),
        cells.raw("certificate"),
        remanence == null ? null : remanence / 1000,
        cells.raw("location"));
  }
}
