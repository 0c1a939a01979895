package lodebook.ui.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import lodebook.assembly.plan.Arranged;
import lodebook.assembly.plan.RingFigures;
import lodebook.db.builds.Rotor;
import lodebook.ui.craft.WhatIf;
import lodebook.ui.words.Amounts;
import lodebook.ui.words.Words;

/// The same pieces as they come, sorted and planned, side by side in words.
final class CompareWords {
  private final Words words;

  CompareWords(Words words) {
    this.words = words;
  }

  String of(WhatIf whatIf) {
    Table table = new Table("ROTOR", "ARRANGED", ">UNWANTED %", ">AMPLITUDE mT");
    for (Rotor rotor : whatIf.rotors()) {
      for (Arranged how : Arranged.values()) {
        RingFigures ring = whatIf.figures().getOrDefault(how, Map.of()).get(rotor.code());
        if (ring != null) {
          table.row(
              rotor.code(),
              name(how),
              PlanWords.percent(ring.unwantedHarmonics()),
              Amounts.milliTesla(ring.workingAmplitudeTesla()));
        }
      }
    }
    List<String> lines = new ArrayList<>(List.of(table.text()));
    List<String> spreads = new ArrayList<>();
    for (Arranged how : Arranged.values()) {
      Double spread = whatIf.pullOutSpread(how);
      if (spread != null) {
        spreads.add(words.say("compare.spread-of", name(how), PlanWords.percent(spread)));
      }
    }
    lines.add(
        spreads.isEmpty()
            ? words.say("compare.no-spread")
            : words.say("compare.spread", String.join(", ", spreads)));
    if (!spreads.isEmpty()) {
      lines.add(words.say("compare.model"));
    }
    lines.add(words.say("compare.not-stored"));
    return String.join("\n", lines);
  }

  private String name(Arranged how) {
    return words.say("arranged." + how.name().toLowerCase(Locale.ROOT).replace('_', '-'));
  }
}
