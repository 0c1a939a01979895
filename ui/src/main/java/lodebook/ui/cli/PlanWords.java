package lodebook.ui.cli;

import java.util.Comparator;
import java.util.List;
import lodebook.assembly.layout.Layout;
import lodebook.db.builds.Plan;
import lodebook.db.builds.PlannedSlot;
import lodebook.reports.words.FacingWords;
import lodebook.ui.craft.PlannedRing;
import lodebook.ui.words.Amounts;
import lodebook.ui.words.Words;

/// A plan in words, in the order of filling.
final class PlanWords {
  private final Words words;

  PlanWords(Words words) {
    this.words = words;
  }

  String of(PlannedRing ring) {
    Plan plan = ring.plan();
    Layout layout = ring.design().layout();
    FacingWords facings = new FacingWords(words.locale());
    Double bound = plan.lowerBound();
    String head =
        words.say(
            "plan.head",
            plan.rotor(),
            Amounts.fixed(plan.unwantedHarmonics() * 100, 2),
            Amounts.fixed(plan.asTheyCome() * 100, 2),
            bound == null ? words.say("plan.no-bound") : Amounts.fixed(bound * 100, 2) + " %",
            Amounts.milliTesla(plan.workingAmplitudeTesla()));
    Table table = new Table(">STEP", ">SLOT", "PIECE", "TRAY", "CELL", "FACING", "REMARK");
    List<PlannedSlot> inOrder =
        plan.slots().stream().sorted(Comparator.comparingInt(PlannedSlot::fillStep)).toList();
    inOrder.forEach(
        s ->
            table.row(
                s.fillStep(),
                s.slot(),
                s.magnet(),
                RotorList.dash(s.tray()),
                RotorList.dash(s.cell()),
                facings.of(layout, s.slot(), s.facing()),
                s.remark()));
    return head + "\n" + table.text();
  }
}
