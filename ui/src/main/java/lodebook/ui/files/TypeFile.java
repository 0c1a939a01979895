package lodebook.ui.files;

import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.magnet.Shape;

/// Reads magnet types.
public final class TypeFile {
  private static final List<Column> COLUMNS =
      Column.andOptional(
          Column.required(
              "type",
              "shape",
              "thickness_mm",
              "width_mm",
              "length_mm",
              "diameter_mm",
              "inner_diameter_mm",
              "arc_deg",
              "grade",
              "tolerance_mm",
              "coating"),
          "recoil_permeability",
          "magnetisation_deg");
  private static final Map<String, Shape> SHAPES =
      new TreeMap<>(
          Map.of("block", Shape.BLOCK, "disc", Shape.DISC, "rod", Shape.ROD, "arc", Shape.ARC));
  private static final List<String> DIMENSIONS =
      List.of(
          "thickness_mm", "width_mm", "length_mm", "diameter_mm", "inner_diameter_mm", "arc_deg");
  private static final Map<Shape, Set<String>> NEEDED =
      new EnumMap<>(
          Map.of(
              Shape.BLOCK, Set.of("thickness_mm", "width_mm", "length_mm"),
              Shape.DISC, Set.of("thickness_mm", "diameter_mm"),
              Shape.ROD, Set.of("length_mm", "diameter_mm"),
              Shape.ARC, Set.of("length_mm", "diameter_mm", "inner_diameter_mm", "arc_deg")));

  private TypeFile() {}

  /// All types of a file; a recoil permeability that is not stated is 0 and stands for the grade's.
  ///
  /// @throws BadFile where the file is wrong in itself
  public static Rows<MagnetType> read(Source source) {
    Once codes = new Once();
    return CsvTable.read(source, COLUMNS, cells -> row(cells, codes));
  }

  private static MagnetType row(Cells cells, Once codes) {
    codes.check(cells, "type");
    Shape shape = cells.oneOf("shape", SHAPES, Shape.BLOCK);
    boolean known = SHAPES.containsKey(cells.raw("shape"));
    double[] size = new double[DIMENSIONS.size()];
    for (int i = 0; known && i < size.length; i++) {
      size[i] = dimension(cells, shape, DIMENSIONS.get(i));
    }
    checkArc(cells, shape, size);
    Double permeability = cells.numberOrNull("recoil_permeability");
    if (permeability != null && !(permeability >= 1 && permeability <= 2)) {
      cells.problem("recoil_permeability", "type.permeability", cells.raw("recoil_permeability"));
    }
    Double magnetisation = cells.numberOrNull("magnetisation_deg");
    return new MagnetType(
        cells.raw("type"),
        shape,
        size[0] / 1000,
        size[1] / 1000,
        size[2] / 1000,
        size[3] / 1000,
        size[4] / 1000,
        size[5],
        cells.text("grade"),
        cells.notNegative("tolerance_mm") / 1000,
        cells.raw("coating"),
        permeability == null ? 0 : permeability,
        magnetisation == null ? 0 : magnetisation);
  }

  private static double dimension(Cells cells, Shape shape, String column) {
    String word = shape.name().toLowerCase(Locale.ROOT);
    if (NEEDED.getOrDefault(shape, Set.of()).contains(column)) {
      if (!cells.has(column)) {
        cells.problem(column, "type.needs", word, column);
        return 1;
      }
      return cells.positive(column);
    }
    Double given = cells.numberOrNull(column);
    if (given != null && given != 0) {
      cells.problem(column, "type.has-no", word, column, cells.raw(column));
    }
    return 0;
  }

  private static void checkArc(Cells cells, Shape shape, double[] size) {
    if (shape != Shape.ARC) {
      return;
    }
    if (size[4] >= size[3] && size[3] > 0) {
      cells.problem(
          "inner_diameter_mm",
          "type.arc-inner",
          cells.raw("inner_diameter_mm"),
          cells.raw("diameter_mm"));
    }
    if (size[5] >= 360) {
      cells.problem("arc_deg", "type.arc-angle", cells.raw("arc_deg"));
    }
  }
}
