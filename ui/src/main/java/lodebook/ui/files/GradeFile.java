package lodebook.ui.files;

import java.util.List;
import lodebook.assembly.magnet.Grade;

/// Reads magnet grades.
public final class GradeFile {
  private static final List<Column> COLUMNS =
      Column.required(
          "grade",
          "br_low_mT",
          "br_high_mT",
          "br_percent_per_K",
          "recoil_permeability",
          "highest_temperature_C",
          "density_kg_m3",
          "source");

  private GradeFile() {}

  /// All grades of a file.
  ///
  /// @throws BadFile where the file is wrong in itself
  public static Rows<Grade> read(Source source) {
    Once names = new Once();
    return CsvTable.read(source, COLUMNS, cells -> row(cells, names));
  }

  private static Grade row(Cells cells, Once names) {
    String name = names.check(cells, "grade");
    double low = cells.positive("br_low_mT");
    double high = cells.positive("br_high_mT");
    if (high < low) {
      cells.problem("br_high_mT", "grade.range", cells.raw("br_high_mT"), cells.raw("br_low_mT"));
    }
    double slope = cells.number("br_percent_per_K");
    if (Math.abs(slope) > 1) {
      cells.problem("br_percent_per_K", "grade.slope", cells.raw("br_percent_per_K"));
    }
    double permeability = cells.number("recoil_permeability");
    if (permeability < 1 || permeability > 2) {
      cells.problem("recoil_permeability", "type.permeability", cells.raw("recoil_permeability"));
    }
    return new Grade(
        name,
        low / 1000,
        high / 1000,
        slope / 100,
        permeability,
        cells.number("highest_temperature_C"),
        cells.positive("density_kg_m3"),
        cells.text("source"));
  }
}
