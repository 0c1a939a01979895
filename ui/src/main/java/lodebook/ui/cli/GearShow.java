package lodebook.ui.cli;

import java.util.Locale;
import lodebook.assembly.layout.GearModel;
import lodebook.db.layouts.GearRevision;
import lodebook.db.layouts.Gears;
import lodebook.ui.words.Amounts;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Shows a gear model.
@Command(
    name = "show",
    description = "Show a gear model: rings, ratio, smoothness.",
    footer = {"", "Example:", "  lodebook gear show STIR"})
final class GearShow extends Verb {
  @Parameters(paramLabel = "GEAR", description = "CODE or CODE@REVISION")
  private String name = "";

  GearShow(Session session) {
    super(session);
  }

  @Override
  int run() {
    GearRevision found = session.read(book -> new Gears(book).show(name));
    if (!session.json(json(found))) {
      session.say(text(found));
    }
    return 0;
  }

  private static String text(GearRevision found) {
    GearModel model = found.model();
    Double torque = model.requiredPullOutNewtonMetres();
    return new Table("GEAR", model.spoken() + ", " + (found.draft() ? "draft" : "released"))
        .row("inner", model.inner().layout().name())
        .row("outer", model.outer().layout().name())
        .row("modulator", model.modulatorPieces() + " pieces")
        .row("held", word(model))
        .row("ratio", Amounts.plain(model.ratio()))
        .row(
            "cogging factor",
            "inner "
                + cogging(model, true)
                + ", outer "
                + cogging(model, false)
                + " (1 is smoothest)")
        .row("stack", Amounts.millimetres(model.stackMetres()) + " mm")
        .row("pull-out", torque == null ? "-" : Amounts.plain(torque * 1000) + " mN m required")
        .text();
  }

  private static int cogging(GearModel model, boolean inner) {
    int polePairs = (inner ? model.inner() : model.outer()).layout().polePairs();
    return GearModel.coggingFactor(polePairs, model.modulatorPieces());
  }

  private static String word(GearModel model) {
    return model.held().name().toLowerCase(Locale.ROOT);
  }

  static Json json(GearRevision found) {
    GearModel model = found.model();
    return Json.object()
        .put("gear", model.code())
        .put("revision", model.revision())
        .put("state", found.draft() ? "draft" : "released")
        .put("inner", model.inner().layout().name())
        .put("outer", model.outer().layout().name())
        .put("modulatorPieces", model.modulatorPieces())
        .put("held", word(model))
        .put("ratio", model.ratio())
        .put("coggingFactorInner", cogging(model, true))
        .put("coggingFactorOuter", cogging(model, false))
        .put("modulatorInnerRadiusMillimetres", thousand(model.modulatorInnerRadiusMetres()))
        .put("modulatorOuterRadiusMillimetres", thousand(model.modulatorOuterRadiusMetres()))
        .put("stackMillimetres", model.stackMetres() * 1000)
        .put("requiredPullOutMilliNewtonMetres", thousand(model.requiredPullOutNewtonMetres()));
  }

  private static @Nullable Double thousand(@Nullable Double amount) {
    return amount == null ? null : amount * 1000;
  }
}
