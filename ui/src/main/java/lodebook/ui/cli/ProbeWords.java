package lodebook.ui.cli;

import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.survey.NamedFault;
import lodebook.assembly.survey.ProbeReport;
import lodebook.assembly.survey.ToldApart;
import lodebook.ui.words.Amounts;
import lodebook.ui.words.Words;

/// What readings tell apart, in words.
final class ProbeWords {
  private static final double SMALLEST_RATE = 1e-6;

  private final Words words;

  ProbeWords(Words words) {
    this.words = words;
  }

  /// One sentence: what is told apart and what is not.
  String sentence(ProbeReport report) {
    return report.tellsAll()
        ? words.say("probe.tells-all", worst(report.worstSingle()), worst(report.worstPair()))
        : words.say(
            "probe.leaves-alike",
            report.singlesAlike().size(),
            report.pairsAlike().size(),
            worst(
                report.worstSingle().errorRate() > report.worstPair().errorRate()
                    ? report.worstSingle()
                    : report.worstPair()));
  }

  private String worst(ToldApart two) {
    return words.say("probe.worst", rate(two.errorRate()), faults(two.one()), faults(two.other()));
  }

  /// A rate in per cent with two digits that mean something.
  static String rate(double rate) {
    if (rate < SMALLEST_RATE) {
      return "< 0.0001 %";
    }
    int decimals = Math.max(0, 1 - (int) Math.floor(Math.log10(rate * 100)));
    return Amounts.fixed(rate * 100, decimals) + " %";
  }

  /// Faults in a row, or that everything is right.
  String faults(List<NamedFault> faults) {
    return faults.isEmpty()
        ? words.say("probe.right")
        : faults.stream().map(this::fault).collect(Collectors.joining(", "));
  }

  private String fault(NamedFault fault) {
    return words.say(
        "fault.named", fault.slot(), words.say("fault." + fault.kind().word().replace(' ', '-')));
  }

  /// The same text for pairs that a turn by whole pole pairs makes of each other.
  String kind(ToldApart two, Layout layout) {
    int first =
        Stream.concat(two.one().stream(), two.other().stream())
            .mapToInt(NamedFault::slot)
            .findFirst()
            .orElse(1);
    int perPair = layout.segmentsPerPolePair();
    int from = first - 1 - (first - 1) % perPair;
    return Stream.of(two.one(), two.other())
        .map(
            side ->
                side.stream()
                    .map(
                        f -> Math.floorMod(f.slot() - from, layout.slots()) + " " + f.kind().word())
                    .toList()
                    .toString())
        .collect(Collectors.joining("|"));
  }
}
