package lodebook.ui.cli;

import java.util.List;
import java.util.Locale;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.survey.Diagnosis;
import lodebook.assembly.survey.Disagreement;
import lodebook.assembly.survey.Evidence;
import lodebook.assembly.survey.FaultKind;
import lodebook.assembly.survey.Finding;
import lodebook.assembly.survey.MeasureNext;
import lodebook.assembly.survey.Measuring;
import lodebook.assembly.survey.RunnerUp;
import lodebook.assembly.survey.WholeRing;
import lodebook.db.layouts.LayoutWords;
import lodebook.db.surveys.SurveyChecks;
import lodebook.ui.words.Words;
import org.jspecify.annotations.Nullable;

/// What a survey shows, as JSON.
final class SurveyJson {
  private SurveyJson() {}

  static Json of(SurveyChecks.Checked checked, Words words) {
    Diagnosis diagnosis = checked.diagnosis();
    Json document =
        Json.object()
            .put("rotor", checked.survey().rotor())
            .put("survey", checked.survey().name())
            .put("verdict", diagnosis.verdict().word())
            .put("findings", diagnosis.findings().stream().map(SurveyJson::finding).toList())
            .put("measuring", measuring(diagnosis.measuring()))
            .put(
                "measuringAlternatives",
                diagnosis.measuringAlternatives().stream().map(SurveyJson::measuring).toList())
            .put("runnerUp", runnerUp(diagnosis.runnerUp()))
            .put(
                "measureNext",
                diagnosis.measureNext().stream().map(next -> next(next, words)).toList());
    if (!diagnosis.disagreements().isEmpty()) {
      document.put(
          "disagreements",
          diagnosis.disagreements().stream().map(SurveyJson::disagreement).toList());
    }
    return document
        .putIfAny("wholeRing", wholeRing(diagnosis.wholeRing()))
        .put("fitProbability", diagnosis.fitProbability())
        .put("reason", diagnosis.reason().name().toLowerCase(Locale.ROOT).replace('_', ' '));
  }

  private static Json finding(Finding finding) {
    Json json = Json.object().put("slot", finding.slot()).put("kind", finding.kind().word());
    if (finding.kind() != FaultKind.SUSPECT_READING) {
      json.put("shouldFaceDegrees", finding.shouldFace().degrees())
          .put("facesDegrees", finding.faces() == null ? null : finding.faces().degrees());
    }
    json.putIfAny("byDegrees", finding.byDegrees())
        .putIfAny("strengthShare", finding.strengthShare())
        .put("probability", finding.probability())
        .put("readings", finding.readings().stream().map(SurveyJson::evidence).toList());
    return finding.alsoPossibleSlots().isEmpty()
        ? json
        : json.put("alsoPossibleSlots", finding.alsoPossibleSlots());
  }

  private static Json disagreement(Disagreement disagreement) {
    return point(disagreement.point(), true)
        .put("surveys", disagreement.surveys())
        .put(
            "readMilliTesla", disagreement.readTesla().stream().map(tesla -> tesla * 1000).toList())
        .put("differenceMilliTesla", disagreement.differenceTesla() * 1000)
        .put("bandMilliTesla", disagreement.bandTesla() * 1000);
  }

  private static Json evidence(Evidence evidence) {
    return point(evidence.point(), false)
        .put("expectedMilliTesla", evidence.expectedTesla() * 1000)
        .put("bandMilliTesla", evidence.bandTesla() * 1000)
        .put("readMilliTesla", evidence.readTesla() * 1000);
  }

  private static Json point(ProbePoint point, boolean withSlot) {
    Json json = withSlot ? Json.object().put("slot", point.slot()) : Json.object();
    return json.put("spot", LayoutWords.word(point.spot()))
        .put("component", LayoutWords.word(point.component()));
  }

  private static Json measuring(Measuring measuring) {
    return Json.object()
        .put("sign", measuring.sign().word())
        .put("startSlot", measuring.startSlot())
        .put("direction", measuring.direction().word())
        .put("unit", measuring.unit().word());
  }

  private static @Nullable Json runnerUp(@Nullable RunnerUp runnerUp) {
    if (runnerUp == null) {
      return null;
    }
    List<Json> findings =
        runnerUp.findings().stream()
            .map(f -> Json.object().put("slot", f.slot()).put("kind", f.kind().word()))
            .toList();
    return Json.object()
        .put("findings", findings)
        .put("oddsAgainst", Math.min(runnerUp.oddsAgainst(), Double.MAX_VALUE));
  }

  private static Json next(MeasureNext next, Words words) {
    return point(next.point(), true).put("why", SurveyWords.why(next, words));
  }

  private static @Nullable Json wholeRing(@Nullable WholeRing wholeRing) {
    if (wholeRing == null) {
      return null;
    }
    Double gain = wholeRing.gain();
    Double offset = wholeRing.probeOffsetMetres();
    return Json.object()
        .put("gainPercent", gain == null ? null : gain * 100)
        .put("probeOffsetMillimetres", offset == null ? null : offset * 1000);
  }
}
