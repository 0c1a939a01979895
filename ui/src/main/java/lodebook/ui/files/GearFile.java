package lodebook.ui.files;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import lodebook.assembly.layout.Member;
import lodebook.db.layouts.GearDraft;
import org.jspecify.annotations.Nullable;

/// Reads the model of a gear.
public final class GearFile {
  private static final List<String> KEYS =
      List.of(
          "gear",
          "revision",
          "inner",
          "outer",
          "modulatorPieces",
          "held",
          "modulatorInnerRadiusMillimetres",
          "modulatorOuterRadiusMillimetres",
          "stackMillimetres",
          "requiredPullOutMilliNewtonMetres");
  private static final Map<String, Member> MEMBERS =
      new TreeMap<>(
          Map.of("outer", Member.OUTER, "modulator", Member.MODULATOR, "inner", Member.INNER));

  private GearFile() {}

  /// The gear model of a file. Whether its pieces fit its layouts' pole pairs, only the book knows.
  ///
  /// @throws BadFile where the file is wrong in itself
  public static Documents<GearDraft> read(Source source) {
    JsonProblems problems = new JsonProblems(source);
    JsonFields file =
        JsonFields.of(
            problems, JsonText.read(source, problems), source.words().say("json.the-file"), KEYS);
    GearDraft gear = gear(file);
    problems.throwIfAny();
    return new Documents<>(source, List.of(gear), List.of(file));
  }

  private static GearDraft gear(JsonFields file) {
    Double inside = positiveOrNull(file, "modulatorInnerRadiusMillimetres");
    Double outside = positiveOrNull(file, "modulatorOuterRadiusMillimetres");
    if (inside != null && outside != null && outside <= inside) {
      file.problem(
          "modulatorOuterRadiusMillimetres",
          "json.not-in",
          "modulatorOuterRadiusMillimetres",
          file.shown("modulatorOuterRadiusMillimetres"),
          file.say("json.above-inner", file.shown("modulatorInnerRadiusMillimetres")));
    }
    return new GearDraft(
        file.text("gear", Numbers::isCode, "json.code"),
        file.text("revision", Numbers::isRevision, "json.revision"),
        file.text("inner", Numbers::isLayoutName, "json.layout-name"),
        file.text("outer", Numbers::isLayoutName, "json.layout-name"),
        file.whole("modulatorPieces", x -> x >= 1, "json.count"),
        file.oneOf("held", MEMBERS, Member.OUTER),
        scaled(inside),
        scaled(outside),
        file.number("stackMillimetres", x -> x > 0, "json.positive") / 1000,
        scaled(positiveOrNull(file, "requiredPullOutMilliNewtonMetres")));
  }

  private static @Nullable Double positiveOrNull(JsonFields file, String key) {
    return file.has(key) ? file.number(key, x -> x > 0, "json.positive") : null;
  }

  private static @Nullable Double scaled(@Nullable Double thousandths) {
    return thousandths == null ? null : thousandths / 1000;
  }
}
