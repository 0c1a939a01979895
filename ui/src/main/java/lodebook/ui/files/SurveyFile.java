package lodebook.ui.files;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Spot;
import lodebook.db.surveys.SurveyRow;
import org.jspecify.annotations.Nullable;

/// Reads surveys.
public final class SurveyFile {
  private static final List<Column> COLUMNS =
      Column.andOptional(
          Column.required("slot", "spot", "component", "value", "unit"),
          "temperature_C",
          "radius_mm",
          "height_mm",
          "at",
          "by",
          "meter");
  static final Map<String, Spot> SPOTS =
      new TreeMap<>(Map.of("centre", Spot.CENTRE, "to-next", Spot.TO_NEXT));
  static final Map<String, Component> COMPONENTS =
      new TreeMap<>(Map.of("radial", Component.RADIAL, "tangential", Component.TANGENTIAL));

  private final boolean meterNamed;
  private boolean told;

  private SurveyFile(boolean meterNamed) {
    this.meterNamed = meterNamed;
  }

  /// All readings of a file.
  ///
  /// @param meterNamed whether a meter is named beside the file, so that rows need none
  /// @throws BadFile where the file is wrong in itself
  public static Rows<SurveyRow> read(Source source, boolean meterNamed) {
    return CsvTable.read(source, COLUMNS, new SurveyFile(meterNamed)::row);
  }

  private SurveyRow row(Cells cells) {
    if (!meterNamed && !told && !cells.has("meter")) {
      cells.problem("meter", "survey.no-meter");
      told = true;
    }
    return new SurveyRow(
        cells.count("slot"),
        cells.oneOf("spot", SPOTS, Spot.CENTRE),
        cells.oneOf("component", COMPONENTS, Component.RADIAL),
        cells.number("value"),
        Units.of(cells),
        cells.celsiusOrNull("temperature_C"),
        radius(cells),
        metres(cells.numberOrNull("height_mm")),
        cells.timeOrNull("at"),
        PieceReadingFile.orNull(cells.raw("by")),
        PieceReadingFile.orNull(cells.raw("meter")));
  }

  private static @Nullable Double radius(Cells cells) {
    return cells.has("radius_mm") ? metres(cells.positive("radius_mm")) : null;
  }

  private static @Nullable Double metres(@Nullable Double millimetres) {
    return millimetres == null ? null : millimetres / 1000;
  }
}
