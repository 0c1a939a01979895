package lodebook.ui.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.survey.Diagnosis;
import lodebook.assembly.survey.Disagreement;
import lodebook.assembly.survey.Evidence;
import lodebook.assembly.survey.Finding;
import lodebook.assembly.survey.MeasureNext;
import lodebook.assembly.survey.Measuring;
import lodebook.assembly.survey.RunnerUp;
import lodebook.assembly.survey.Verdict;
import lodebook.assembly.survey.WholeRing;
import lodebook.db.layouts.LayoutWords;
import lodebook.db.surveys.SurveyChecks;
import lodebook.reports.words.FacingWords;
import lodebook.ui.words.Amounts;
import lodebook.ui.words.Words;

/// What a survey shows, in words: the verdict in one sentence, the evidence, then what to do.
final class SurveyWords {
  private static final double MOST_ODDS = 1e6;
  private static final int WIDTH = 80;
  private static final int MOST_NAMED = 3;

  private final Words words;

  SurveyWords(Words words) {
    this.words = words;
  }

  String of(SurveyChecks.Checked checked) {
    Diagnosis diagnosis = checked.diagnosis();
    Layout layout = checked.survey().design().layout();
    List<String> parts = new ArrayList<>();
    parts.add(verdict(checked));
    diagnosis.findings().forEach(f -> parts.add("  " + finding(f, layout)));
    addMeasuring(diagnosis, parts);
    WholeRing wholeRing = diagnosis.wholeRing();
    if (wholeRing != null) {
      parts.add(wholeRing(wholeRing));
    }
    Table table = new Table(">SLOT", "SPOT", "COMPONENT", ">EXPECTED mT", ">+-", ">READ mT");
    diagnosis.findings().forEach(f -> f.readings().forEach(e -> row(table, e)));
    if (!table.isEmpty()) {
      parts.add(table.text());
    }
    diagnosis.disagreements().forEach(d -> parts.add(disagreement(d)));
    addRunnerUp(diagnosis, parts);
    diagnosis.measureNext().forEach(n -> parts.add(measure(n)));
    return parts.stream().map(SurveyWords::wrapped).collect(Collectors.joining("\n"));
  }

  private static String wrapped(String text) {
    return text.lines()
        .flatMap(line -> Table.broken(line, WIDTH).stream())
        .collect(Collectors.joining("\n"));
  }

  private String verdict(SurveyChecks.Checked checked) {
    Diagnosis diagnosis = checked.diagnosis();
    String reason = diagnosis.reason().name().toLowerCase(Locale.ROOT).replace('_', '-');
    String key = "verdict." + reason + (diagnosis.passesIfPocketsAreFilled() ? "-if-filled" : "");
    return words.say(key, checked.survey().name(), checked.survey().rotor());
  }

  private String finding(Finding finding, Layout layout) {
    FacingWords facings = new FacingWords(words.locale());
    String should = facings.of(layout, finding.slot(), finding.shouldFace());
    String faces =
        finding.faces() == null ? "" : facings.of(layout, finding.slot(), finding.faces());
    String sure = probability(finding.probability());
    String key = "finding." + finding.kind().name().toLowerCase(Locale.ROOT).replace('_', '-');
    Double share = finding.strengthShare();
    return words.say(
        key,
        finding.slot(),
        faces,
        should,
        sure,
        share == null ? "" : Amounts.fixed(share * 100, 0));
  }

  private static String probability(double probability) {
    return probability > 0.9999 ? "over 99.99" : Amounts.fixed(probability * 100, 2);
  }

  private void addMeasuring(Diagnosis diagnosis, List<String> parts) {
    Measuring measuring = diagnosis.measuring();
    if (!measuring.asSet()) {
      parts.add(words.say("measuring.slip", slips(measuring)));
    }
    boolean speak = !measuring.asSet() || diagnosis.verdict() != Verdict.PASS;
    if (speak && !diagnosis.measuringAlternatives().isEmpty()) {
      List<String> others = diagnosis.measuringAlternatives().stream().map(this::slips).toList();
      int more = others.size() - MOST_NAMED;
      String named = String.join("; ", others.subList(0, Math.min(MOST_NAMED, others.size())));
      parts.add(
          more > 0
              ? words.say("measuring.alternatives-more", named, more)
              : words.say("measuring.alternatives", named));
    }
    for (Finding finding : diagnosis.findings()) {
      if (!finding.alsoPossibleSlots().isEmpty()) {
        List<String> slots = finding.alsoPossibleSlots().stream().map(String::valueOf).toList();
        parts.add(words.say("finding.also", finding.slot(), String.join(", ", slots)));
      }
    }
  }

  /// What the person measuring did, in words.
  private String slips(Measuring measuring) {
    List<String> slips = new ArrayList<>();
    if (measuring.sign() == Measuring.Sign.INVERTED) {
      slips.add(words.say("slip.sign"));
    }
    if (measuring.startSlot() != 1) {
      slips.add(words.say("slip.start", measuring.startSlot()));
    }
    if (measuring.direction() == Measuring.Direction.OPPOSITE) {
      slips.add(words.say("slip.direction"));
    }
    switch (measuring.unit()) {
      case GAUSS_AS_MILLITESLA -> slips.add(words.say("slip.gauss"));
      case MILLITESLA_AS_GAUSS -> slips.add(words.say("slip.millitesla"));
      case AS_STATED -> {}
    }
    return slips.isEmpty() ? words.say("slip.none") : String.join(", ", slips);
  }

  private String wholeRing(WholeRing wholeRing) {
    Double gain = wholeRing.gain();
    Double offset = wholeRing.probeOffsetMetres();
    List<String> ways = new ArrayList<>();
    if (gain != null) {
      ways.add(words.say("whole-ring.gain", Amounts.fixed(gain * 100, 1)));
    }
    if (offset != null) {
      ways.add(words.say("whole-ring.offset", Amounts.fixed(offset * 1000, 2)));
    }
    return words.say("whole-ring", String.join(words.say("or"), ways));
  }

  private String disagreement(Disagreement where) {
    ProbePoint point = where.point();
    return words.say(
        "disagreement",
        point.slot(),
        words.say("spot." + LayoutWords.word(point.spot())),
        words.say("component." + LayoutWords.word(point.component())),
        where.surveys().getFirst(),
        Amounts.milliTesla(where.readTesla().getFirst()),
        where.surveys().getLast(),
        Amounts.milliTesla(where.readTesla().getLast()),
        Amounts.milliTesla(where.bandTesla()));
  }

  private static void row(Table table, Evidence evidence) {
    ProbePoint point = evidence.point();
    table.row(
        point.slot(),
        LayoutWords.word(point.spot()),
        LayoutWords.word(point.component()),
        Amounts.milliTesla(evidence.expectedTesla()),
        Amounts.milliTesla(evidence.bandTesla()),
        Amounts.milliTesla(evidence.readTesla()));
  }

  private void addRunnerUp(Diagnosis diagnosis, List<String> parts) {
    RunnerUp runnerUp = diagnosis.runnerUp();
    if (runnerUp == null || diagnosis.verdict() == Verdict.PASS) {
      return;
    }
    List<String> faults =
        runnerUp.findings().stream()
            .map(
                f ->
                    words.say(
                        "fault.named",
                        f.slot(),
                        words.say("fault." + f.kind().word().replace(' ', '-'))))
            .toList();
    String what = faults.isEmpty() ? words.say("fault.none") : String.join(", ", faults);
    String odds =
        runnerUp.oddsAgainst() >= MOST_ODDS
            ? words.say("odds.most")
            : Amounts.fixed(runnerUp.oddsAgainst(), runnerUp.oddsAgainst() < 10 ? 1 : 0);
    parts.add(words.say("runner-up", what, odds));
  }

  private String measure(MeasureNext next) {
    ProbePoint point = next.point();
    return words.say(
        "measure-next",
        point.slot(),
        words.say("spot." + LayoutWords.word(point.spot())),
        words.say("component." + LayoutWords.word(point.component())),
        why(next, words));
  }

  /// Why one more reading would help.
  static String why(MeasureNext next, Words words) {
    List<String> faults =
        next.magnets().stream()
            .map(
                f ->
                    words.say(
                        "fault.named",
                        f.slot(),
                        words.say("fault." + f.kind().word().replace(' ', '-'))))
            .toList();
    String key = "why." + next.why().name().toLowerCase(Locale.ROOT).replace('_', '-');
    String why = words.say(key);
    return faults.isEmpty() ? why : words.say("why.of", why, String.join(", ", faults));
  }
}
