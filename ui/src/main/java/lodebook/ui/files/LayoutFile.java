package lodebook.ui.files;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.InsertFrom;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Numbering;
import lodebook.assembly.layout.Probe;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.layout.Spread;
import org.jspecify.annotations.Nullable;

/// Reads layouts of rings.
public final class LayoutFile {
  private static final List<String> KEYS =
      List.of(
          "layout",
          "revision",
          "polePairs",
          "segmentsPerPolePair",
          "focus",
          "numbering",
          "firstSlotClockDegrees",
          "firstFacingDegrees",
          "slotRadiusMillimetres",
          "magnetType",
          "sideMagnetType",
          "workingRadiusMillimetres",
          "probe",
          "spread",
          "adhesive",
          "adhesiveWorkingMinutes",
          "bodyTurns",
          "insertFrom",
          "tolerance",
          "also");
  private static final List<String> PROBE_KEYS =
      List.of("radiusMillimetres", "heightMillimetres", "spots", "components");
  private static final List<String> SPREAD_KEYS =
      List.of("pocketMillimetres", "facingDegrees", "probeMillimetres", "probeTiltDegrees");
  private static final Map<String, Numbering> NUMBERINGS =
      new TreeMap<>(
          Map.of("clockwise", Numbering.CLOCKWISE, "counterclockwise", Numbering.COUNTERCLOCKWISE));
  private static final Map<String, InsertFrom> INSERTIONS =
      new TreeMap<>(
          Map.of(
              "face", InsertFrom.FACE,
              "outside", InsertFrom.OUTSIDE,
              "inside", InsertFrom.INSIDE));
  private static final Set<Integer> SEGMENTS = Set.of(2, 3, 4, 5, 6, 8);
  private static final int MOST_SLOTS = 1000;
  private static final double DEFAULT_TOLERANCE_PERCENT = 3;

  private LayoutFile() {}

  /// The layouts of a file: the one it states, and those that its key `also` lists.
  ///
  /// @throws BadFile where the file is wrong in itself
  public static Documents<Layout> read(Source source) {
    JsonProblems problems = new JsonProblems(source);
    JsonFields file =
        JsonFields.of(
            problems, JsonText.read(source, problems), source.words().say("json.the-file"), KEYS);
    List<JsonFields> objects = new ArrayList<>(List.of(file));
    objects.addAll(file.objects("also", KEYS));
    Set<String> names = new HashSet<>();
    List<Layout> layouts = objects.stream().map(object -> once(object, names)).toList();
    problems.throwIfAny();
    return new Documents<>(source, layouts, objects);
  }

  private static Layout once(JsonFields file, Set<String> names) {
    Layout layout = layout(file);
    if (!names.add(layout.name().toLowerCase(Locale.ROOT))) {
      file.problem("revision", "layout.twice", layout.name());
    }
    return layout;
  }

  private static Layout layout(JsonFields file) {
    String code = file.text("layout", Numbers::isCode, "json.code");
    String revision = file.text("revision", Numbers::isRevision, "json.revision");
    int polePairs = file.whole("polePairs", x -> x >= 1, "json.count");
    int segments = segments(file);
    if (polePairs * (long) segments > MOST_SLOTS) {
      file.problem(
          "polePairs", "json.not-in", "polePairs", file.shown("polePairs"), file.say("json.slots"));
    }
    Focus focus =
        file.oneOf("focus", new TreeMap<>(Map.of("in", Focus.IN, "out", Focus.OUT)), Focus.OUT);
    double slotRadius = file.number("slotRadiusMillimetres", Bounds::positive, "json.positive");
    return new Layout(
        code,
        revision,
        polePairs,
        segments,
        focus,
        file.oneOf("numbering", NUMBERINGS, Numbering.CLOCKWISE),
        file.number("firstSlotClockDegrees", Bounds::angle, "json.angle"),
        facing(file.number("firstFacingDegrees", Bounds::angle, "json.angle")),
        slotRadius / 1000,
        file.text("magnetType", t -> !t.isBlank(), "json.any-text"),
        side(file),
        workingRadius(file, focus, slotRadius) / 1000,
        probe(file),
        spread(file),
        file.text("adhesive", t -> true, "json.any-text"),
        minutes(file),
        file.truth("bodyTurns"),
        file.has("insertFrom")
            ? file.oneOf("insertFrom", INSERTIONS, InsertFrom.FACE)
            : InsertFrom.FACE,
        tolerance(file));
  }

  private static int segments(JsonFields file) {
    return file.whole(
        "segmentsPerPolePair",
        x -> x == Math.rint(x) && SEGMENTS.contains((int) x),
        "json.segments");
  }

  private static Facing facing(double degrees) {
    return Double.isNaN(degrees) ? Facing.OUT : new Facing(degrees);
  }

  private static double workingRadius(JsonFields file, Focus focus, double slotRadius) {
    String key = "workingRadiusMillimetres";
    double radius = file.number(key, Bounds::positive, "json.positive");
    if (focus == Focus.OUT && radius <= slotRadius) {
      file.problem(key, "json.not-in", key, file.shown(key), outside("json.outside", file));
    } else if (focus == Focus.IN && radius >= slotRadius) {
      file.problem(key, "json.not-in", key, file.shown(key), outside("json.inside", file));
    }
    return radius;
  }

  private static String outside(String key, JsonFields file) {
    return file.say(key, file.shown("slotRadiusMillimetres"));
  }

  private static @Nullable String side(JsonFields file) {
    return file.has("sideMagnetType")
        ? file.text("sideMagnetType", t -> !t.isBlank(), "json.any-text")
        : null;
  }

  private static @Nullable Double minutes(JsonFields file) {
    return file.has("adhesiveWorkingMinutes")
        ? file.number("adhesiveWorkingMinutes", Bounds::positive, "json.positive")
        : null;
  }

  private static Probe probe(JsonFields file) {
    JsonFields probe = file.object("probe", PROBE_KEYS);
    if (probe == null) {
      return new Probe(1, 0, List.of(Spot.CENTRE), List.of(Component.RADIAL));
    }
    return new Probe(
        probe.number("radiusMillimetres", Bounds::positive, "json.positive") / 1000,
        probe.number("heightMillimetres", Bounds::any, "json.number") / 1000,
        probe.listOf("spots", SurveyFile.SPOTS, Spot.CENTRE),
        probe.listOf("components", SurveyFile.COMPONENTS, Component.RADIAL));
  }

  private static Spread spread(JsonFields file) {
    JsonFields spread = file.object("spread", SPREAD_KEYS);
    if (spread == null) {
      return Spread.DEFAULT;
    }
    Spread usual = Spread.DEFAULT;
    String expected = "json.not-negative";
    return new Spread(
        spread.numberOr("pocketMillimetres", Bounds::notNegative, expected, 0.05) / 1000,
        spread.numberOr("facingDegrees", Bounds::notNegative, expected, usual.facingDegrees()),
        spread.numberOr("probeMillimetres", Bounds::notNegative, expected, 0.15) / 1000,
        spread.numberOr(
            "probeTiltDegrees", Bounds::notNegative, expected, usual.probeTiltDegrees()));
  }

  private static double tolerance(JsonFields file) {
    if (!file.has("tolerance")) {
      return DEFAULT_TOLERANCE_PERCENT / 100;
    }
    JsonFields tolerance = file.object("tolerance", List.of("workingAmplitudePercent"));
    return tolerance == null
        ? DEFAULT_TOLERANCE_PERCENT / 100
        : tolerance.numberOr(
                "workingAmplitudePercent",
                x -> x > 0 && x <= 100,
                "json.percent",
                DEFAULT_TOLERANCE_PERCENT)
            / 100;
  }
}
