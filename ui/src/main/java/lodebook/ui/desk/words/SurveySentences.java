package lodebook.ui.desk.words;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.Spot;
import lodebook.assembly.survey.Diagnosis;
import lodebook.assembly.survey.FaultKind;
import lodebook.assembly.survey.Finding;
import lodebook.assembly.survey.MeasureNext;
import lodebook.assembly.survey.Measuring;
import lodebook.assembly.survey.NamedFault;
import lodebook.assembly.survey.RunnerUp;
import lodebook.assembly.survey.WholeRing;
import lodebook.reports.words.FacingWords;

/// What readings show, in sentences for the bench.
public final class SurveySentences {
  private static final double MOST_ODDS = 1e6;

  private final DeskWords words;
  private final FacingWords facings;

  /// Sentences in a language.
  public SurveySentences(DeskWords words) {
    this.words = words;
    this.facings = new FacingWords(words.locale());
  }

  /// Where the north of a slot's magnet points.
  public String facing(Layout layout, int slot, Facing facing) {
    return facings.of(layout, slot, facing);
  }

  /// The verdict in one sentence.
  public String verdict(Diagnosis diagnosis, String rotor) {
    String open = diagnosis.passesIfPocketsAreFilled() ? "-if-filled" : "";
    return words.say("verdict." + key(diagnosis.reason().name()) + open, rotor);
  }

  /// What is wrong with a slot, in one sentence.
  public String finding(Finding finding, Layout layout) {
    String should = facing(layout, finding.slot(), finding.shouldFace());
    Facing stands = finding.faces();
    Double share = finding.strengthShare();
    return words.say(
        "finding." + key(finding.kind().name()),
        words.number(finding.slot()),
        stands == null ? "" : facing(layout, finding.slot(), stands),
        should,
        share == null ? "" : words.percent(share, 0));
  }

  /// What is to be done about a finding.
  public String remedy(Finding finding, Layout layout) {
    return words.say(
        "remedy." + key(finding.kind().name()),
        words.number(finding.slot()),
        facing(layout, finding.slot(), finding.shouldFace()));
  }

  /// A fault in a word or two, as it is written beside a slot.
  public String mark(FaultKind kind) {
    return words.say("mark." + key(kind.name()));
  }

  /// A probe point: "slot 7, over its middle, radial".
  public String point(ProbePoint point) {
    return words.say(
        "point",
        words.number(point.slot()),
        words.say(point.spot() == Spot.CENTRE ? "spot.centre" : "spot.to-next"),
        component(point.component()));
  }

  /// Radial or tangential.
  public String component(Component component) {
    return words.say(component == Component.RADIAL ? "component.radial" : "component.tangential");
  }

  /// The next telling reading.
  public String next(MeasureNext next) {
    String why = words.say("why." + key(next.why().name()));
    return words.say("measure-next", point(next.point()), why);
  }

  /// Everything beyond the verdict and the findings: slips of the person measuring, the whole ring,
  /// the next explanation; a sentence each.
  public List<String> beside(Diagnosis diagnosis) {
    List<String> said = new ArrayList<>(measuring(diagnosis));
    for (Finding finding : diagnosis.findings()) {
      if (!finding.alsoPossibleSlots().isEmpty()) {
        List<String> slots =
            finding.alsoPossibleSlots().stream().map(s -> words.number(s)).toList();
        said.add(words.say("finding.also", words.number(finding.slot()), String.join(", ", slots)));
      }
    }
    RunnerUp second = diagnosis.runnerUp();
    if (second != null && !diagnosis.findings().isEmpty()) {
      said.add(runnerUp(second));
    }
    return said;
  }

  /// How the readings were taken, where that was not as set, and by what all of them would fit.
  public List<String> measuring(Diagnosis diagnosis) {
    List<String> said = new ArrayList<>();
    if (!diagnosis.measuring().asSet()) {
      said.add(words.say("measuring.slip", slips(diagnosis.measuring())));
    }
    WholeRing whole = diagnosis.wholeRing();
    if (whole != null) {
      Double gain = whole.gain();
      Double offset = whole.probeOffsetMetres();
      if (gain != null) {
        said.add(words.say("whole-ring.gain", words.percent(gain, 1)));
      }
      if (offset != null) {
        said.add(words.say("whole-ring.offset", words.number(offset * 1e3, 2)));
      }
    }
    return said;
  }

  private String runnerUp(RunnerUp second) {
    List<String> faults = new ArrayList<>();
    for (NamedFault fault : second.findings()) {
      faults.add(words.say("fault.named", words.number(fault.slot()), mark(fault.kind())));
    }
    String what = faults.isEmpty() ? words.say("fault.none") : String.join(", ", faults);
    String odds =
        second.oddsAgainst() >= MOST_ODDS
            ? words.say("odds.most")
            : words.number(second.oddsAgainst(), second.oddsAgainst() < 10 ? 1 : 0);
    return words.say("runner-up", what, odds);
  }

  private String slips(Measuring measuring) {
    List<String> slips = new ArrayList<>();
    if (measuring.sign() == Measuring.Sign.INVERTED) {
      slips.add(words.say("slip.sign"));
    }
    if (measuring.startSlot() != 1) {
      slips.add(words.say("slip.start", words.number(measuring.startSlot())));
    }
    if (measuring.direction() == Measuring.Direction.OPPOSITE) {
      slips.add(words.say("slip.direction"));
    }
    switch (measuring.unit()) {
      case GAUSS_AS_MILLITESLA -> slips.add(words.say("slip.gauss"));
      case MILLITESLA_AS_GAUSS -> slips.add(words.say("slip.millitesla"));
      case AS_STATED -> {}
    }
    return String.join(", ", slips);
  }

  private static String key(String name) {
    return name.toLowerCase(Locale.ROOT).replace('_', '-');
  }
}
