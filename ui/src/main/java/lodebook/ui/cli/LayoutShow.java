package lodebook.ui.cli;

import java.util.Locale;
import lodebook.assembly.layout.Focus;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.Probe;
import lodebook.assembly.layout.Spread;
import lodebook.assembly.survey.ProbeReport;
import lodebook.db.book.Book;
import lodebook.db.layouts.LayoutRevision;
import lodebook.db.layouts.LayoutWords;
import lodebook.db.layouts.Layouts;
import lodebook.db.layouts.Released;
import lodebook.db.stock.Grades;
import lodebook.reports.words.FacingWords;
import lodebook.ui.craft.ProbedLayout;
import lodebook.ui.words.Amounts;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Shows a layout.
@Command(
    name = "show",
    description = "Show a layout with every value, defaults too.",
    footer = {"", "Example:", "  lodebook layout show STIR-IN"})
final class LayoutShow extends Verb {
  @Parameters(paramLabel = "LAYOUT", description = "CODE or CODE@REVISION")
  private String name = "";

  LayoutShow(Session session) {
    super(session);
  }

  @Override
  int run() {
    LayoutRevision found = session.read(book -> new Layouts(book).show(name));
    ProbeReport told = found.draft() ? null : session.read(this::told);
    if (!session.json(
        json(found).putIfAny("probeTells", told == null ? null : ProbeJson.brief(told)))) {
      session.say(text(found, told));
    }
    return 0;
  }

  private ProbeReport told(Book book) {
    return ProbedLayout.of(new Layouts(book).design(name), new Grades(book).list()).ofLayout();
  }

  private String text(LayoutRevision found, @Nullable ProbeReport told) {
    Layout layout = found.layout();
    Spread spread = layout.spread();
    FacingWords facings = new FacingWords(session.words().locale());
    Double minutes = layout.adhesiveWorkingMinutes();
    Table table =
        new Table("LAYOUT", shown(layout) + ", " + state(found, session))
            .row(
                "slots",
                layout.slots()
                    + ": "
                    + layout.polePairs()
                    + " pole pairs, "
                    + layout.segmentsPerPolePair()
                    + " magnets each, focus "
                    + word(layout.focus()))
            .row(
                "numbering",
                layout.numbering().name().toLowerCase(Locale.ROOT)
                    + ", slot 1 at "
                    + Amounts.degrees(layout.firstSlotClockDegrees())
                    + " deg from 12 o'clock")
            .row("slot 1", facings.of(layout, 1, layout.firstFacing()))
            .row("slot 2", facings.of(layout, 2, layout.ruleFacing(2)))
            .row("radius", Amounts.millimetres(layout.slotRadiusMetres()) + " mm to the magnets")
            .row(
                "magnets",
                layout.magnetType()
                    + (layout.sideMagnetType() == null
                        ? ""
                        : ", along the ring " + layout.sideMagnetType()))
            .row("working at", Amounts.millimetres(layout.workingRadiusMetres()) + " mm")
            .row("probe", probe(layout.probe()))
            .row(
                "spread",
                "pocket "
                    + Amounts.millimetres(spread.pocketMetres())
                    + " mm, facing "
                    + Amounts.degrees(spread.facingDegrees())
                    + " deg, probe "
                    + Amounts.millimetres(spread.probeMetres())
                    + " mm, tilt "
                    + Amounts.degrees(spread.probeTiltDegrees())
                    + " deg")
            .row(
                "adhesive",
                layout.adhesive() + (minutes == null ? "" : ", " + Amounts.plain(minutes) + " min"))
            .row("bodies turn", layout.bodyTurns() ? "yes" : "no")
            .row("insert from", layout.insertFrom().name().toLowerCase(Locale.ROOT))
            .row(
                "tolerance",
                Amounts.percent(layout.workingAmplitudeTolerance())
                    + " % of the working amplitude");
    if (told != null) {
      table.row("probe tells", new ProbeWords(session.words()).sentence(told));
    }
    return table.text();
  }

  private static String probe(Probe probe) {
    return Amounts.millimetres(probe.radiusMetres())
        + " mm, height "
        + Amounts.millimetres(probe.heightMetres())
        + " mm; "
        + String.join(", ", probe.spots().stream().map(LayoutWords::word).toList())
        + "; "
        + String.join(", ", probe.components().stream().map(LayoutWords::word).toList());
  }

  /// A layout as people see it.
  static String shown(Layout layout) {
    return layout.code() + " rev " + layout.revision();
  }

  static String word(Focus focus) {
    return focus.name().toLowerCase(Locale.ROOT);
  }

  /// Draft, or who released it and when.
  static String state(LayoutRevision revision, Session session) {
    Released released = revision.released();
    return released == null
        ? "draft"
        : "released "
            + released.by()
            + " "
            + Amounts.minute(released.at(), session.zone()).substring(0, 10);
  }

  static Json json(LayoutRevision revision) {
    Layout layout = revision.layout();
    Released released = revision.released();
    return LayoutJson.of(layout)
        .put("state", released == null ? "draft" : "released")
        .put("releasedBy", released == null ? null : released.by())
        .put("releasedAt", released == null ? null : released.at());
  }
}
