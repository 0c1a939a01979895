package lodebook.ui.cli;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.plan.OrderPattern;
import lodebook.assembly.plan.RotorPlan;
import lodebook.db.builds.MagnetName;
import lodebook.db.builds.Plan;
import lodebook.db.builds.PlannedSlot;
import lodebook.reports.words.FacingWords;
import lodebook.ui.craft.Planned;
import lodebook.ui.craft.PlannedRing;
import lodebook.ui.words.Amounts;
import lodebook.ui.words.Words;
import org.jspecify.annotations.Nullable;

/// Plans in words: figures, steps in the order of filling, what few lots cost, what is left over.
final class PlanWords {
  private final Words words;

  PlanWords(Words words) {
    this.words = words;
  }

  /// One rotor's plan with its steps.
  String of(PlannedRing ring, @Nullable RotorPlan computed) {
    List<String> lines = new ArrayList<>();
    lines.add(head(ring.plan()));
    if (computed != null) {
      addComputed(computed, lines);
    }
    lines.add(order(ring));
    lines.addAll(spoilt(ring.plan()));
    lines.add(steps(ring).text());
    return String.join("\n", lines);
  }

  /// The plan's figures in one sentence.
  String head(Plan plan) {
    Double bound = plan.lowerBound();
    return words.say(
        "plan.head",
        plan.rotor(),
        percent(plan.unwantedHarmonics()),
        percent(plan.asTheyCome()),
        bound == null ? words.say("plan.no-bound") : percent(bound) + " %",
        Amounts.milliTesla(plan.workingAmplitudeTesla()));
  }

  /// How the order of filling goes, for the slots of the plan.
  String order(PlannedRing ring) {
    List<Integer> filled = inOrder(ring.plan()).stream().map(PlannedSlot::slot).toList();
    OrderPattern pattern = OrderPattern.of(filled, ring.design().slots());
    return pattern == null
        ? words.say("fill.by-table")
        : words.say("fill.pattern." + pattern.name().toLowerCase(Locale.ROOT).replace('_', '-'));
  }

  /// A sentence for each piece that may not be placed any more.
  List<String> spoilt(Plan plan) {
    return plan.spoilt().stream()
        .map(
            s ->
                words.say(
                    s.state().equals("gone") ? "plan.spoilt-gone" : "plan.spoilt-held",
                    s.magnet(),
                    plan.rotor(),
                    s.slot()))
        .toList();
  }

  private void addComputed(RotorPlan computed, List<String> lines) {
    if (!computed.withinTolerance()) {
      lines.add(
          words.say(
              "plan.off-amplitude",
              Amounts.fixed(
                  100 * (computed.workingAmplitudeTesla() / computed.targetAmplitudeTesla() - 1),
                  1),
              Amounts.milliTesla(computed.targetAmplitudeTesla())));
    }
    Double free = computed.freelyMixed();
    if (free != null) {
      lines.add(
          words.say(
              "plan.price",
              String.join(", ", computed.lots()),
              percent(computed.unwantedHarmonics()),
              percent(free)));
    }
  }

  private Table steps(PlannedRing ring) {
    Layout layout = ring.design().layout();
    FacingWords facings = new FacingWords(words.locale());
    Table table = new Table(">STEP", ">SLOT", "PIECE", "TRAY", "CELL", "FACING", "REMARK");
    inOrder(ring.plan())
        .forEach(
            s ->
                table.row(
                    s.fillStep(),
                    s.slot(),
                    s.magnet(),
                    RotorList.dash(s.tray()),
                    RotorList.dash(s.cell()),
                    facings.of(layout, s.slot(), s.facing()),
                    s.state().equals("planned") ? s.remark() : s.state()));
    return table;
  }

  static List<PlannedSlot> inOrder(Plan plan) {
    return plan.slots().stream().sorted(Comparator.comparingInt(PlannedSlot::fillStep)).toList();
  }

  /// Several rotors' plans, a line each, and what concerns them together.
  String together(Planned planned) {
    Table table =
        new Table("ROTOR", "LOTS", ">UNWANTED %", ">AS THEY COME %", ">BOUND %", ">AMPLITUDE mT");
    for (Plan plan : planned.plans()) {
      RotorPlan computed = planned.computed().get(plan.rotor());
      Double bound = plan.lowerBound();
      table.row(
          plan.rotor(),
          computed == null ? "-" : String.join(", ", computed.lots()),
          percent(plan.unwantedHarmonics()),
          percent(plan.asTheyCome()),
          bound == null ? "-" : percent(bound),
          Amounts.milliTesla(plan.workingAmplitudeTesla()));
    }
    List<String> lines = new ArrayList<>(List.of(table.text()));
    planned
        .amplitudeSpread()
        .forEach((layout, spread) -> lines.add(words.say("plan.spread", layout, percent(spread))));
    Double free = planned.freelyMixed();
    if (free != null) {
      lines.add(words.say("plan.price-batch", percent(planned.meanUnwanted()), percent(free)));
    }
    lines.add(leftOver(planned.leftOver()));
    return String.join("\n", lines);
  }

  private String leftOver(List<String> pieces) {
    Map<String, Integer> byLot = new TreeMap<>();
    pieces.forEach(piece -> byLot.merge(MagnetName.of(piece).lot(), 1, Integer::sum));
    List<String> parts = new ArrayList<>();
    byLot.forEach((lot, count) -> parts.add(words.say("plan.left-of", count, lot)));
    return parts.isEmpty()
        ? words.say("plan.left-none")
        : words.say("plan.left", pieces.size(), String.join(", ", parts));
  }

  /// A ratio in per cent; small ones with more decimals.
  static String percent(double ratio) {
    return Amounts.fixed(ratio * 100, ratio < 0.001 ? 4 : ratio < 0.01 ? 3 : 2);
  }
}
