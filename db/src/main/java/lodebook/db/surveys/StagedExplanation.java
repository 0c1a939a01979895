package lodebook.db.surveys;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import lodebook.assembly.survey.Diagnosis;
import lodebook.assembly.survey.FaultKind;
import lodebook.assembly.survey.Finding;
import lodebook.assembly.survey.Priors;
import lodebook.assembly.survey.ProbeResponses;
import lodebook.assembly.survey.Reading;
import lodebook.assembly.survey.RepeatedSurveys;
import lodebook.assembly.survey.SurveyExplainer;
import lodebook.assembly.survey.SurveyedRing;
import lodebook.assembly.survey.Verdict;

/// Explains a survey whose ring may have changed while it was taken.
///
/// Readings of magnets that all stand still are explained together, each against the ring as far as
/// it was filled then. Where that does not show everything right, faults count as well that were
/// shown before some magnet was changed, unless they are of a magnet that was changed since.
final class StagedExplanation {
  private StagedExplanation() {}

  static Diagnosis of(RecordedSurvey survey) {
    Priors priors = survey.priors();
    ProbeResponses responses = new ProbeResponses(survey.design());
    List<RecordedSurvey.Stage> stages = survey.stages();
    if (stages.isEmpty()) {
      return new SurveyExplainer(new SurveyedRing(survey.design(), Map.of()), priors, responses)
          .explain(List.of());
    }
    Diagnosis last = explain(standing(stages), priors, responses);
    List<Finding> earlier = new ArrayList<>();
    if (last.verdict() != Verdict.PASS) {
      for (RecordedSurvey.Stage stage : stages) {
        if (stage.changedSince().isEmpty()) {
          continue;
        }
        Diagnosis diagnosis = explain(stage, priors, responses);
        if (diagnosis.verdict() == Verdict.FAULT) {
          diagnosis.findings().stream()
              .filter(finding -> finding.kind() != FaultKind.SUSPECT_READING)
              .filter(finding -> !stage.changedSince().contains(finding.slot()))
              .forEach(earlier::add);
        }
      }
    }
    return earlier.isEmpty() ? last : joined(last, earlier);
  }

  /// The ring of the last stage with all readings of magnets that stand in it still: those of
  /// earlier stages count with the slots that were filled then.
  private static RecordedSurvey.Stage standing(List<RecordedSurvey.Stage> stages) {
    RecordedSurvey.Stage last = stages.getLast();
    List<Reading> readings = new ArrayList<>();
    List<String> from = new ArrayList<>();
    for (RecordedSurvey.Stage stage : stages) {
      if (stage.changedSince().isEmpty()) {
        Set<Integer> filled = stage.ring().magnets().keySet();
        boolean whole = filled.equals(last.ring().magnets().keySet());
        stage.readings().forEach(r -> readings.add(whole ? r : r.whenFilled(filled)));
        from.addAll(stage.from());
      }
    }
    return new RecordedSurvey.Stage(last.ring(), readings, from, Set.of());
  }

  private static Diagnosis explain(
      RecordedSurvey.Stage stage, Priors priors, ProbeResponses responses) {
    Map<String, List<Reading>> surveys = new LinkedHashMap<>();
    for (int i = 0; i < stage.readings().size(); i++) {
      surveys
          .computeIfAbsent(stage.from().get(i), survey -> new ArrayList<>())
          .add(stage.readings().get(i));
    }
    return surveys.size() > 1
        ? new RepeatedSurveys(stage.ring(), priors, responses).explain(surveys)
        : new SurveyExplainer(stage.ring(), priors, responses).explain(stage.readings());
  }

  private static Diagnosis joined(Diagnosis last, List<Finding> earlier) {
    List<Finding> findings = new ArrayList<>();
    if (last.verdict() == Verdict.FAULT) {
      findings.addAll(last.findings());
    }
    for (Finding finding : earlier) {
      if (findings.stream().noneMatch(each -> each.slot() == finding.slot())) {
        findings.add(finding);
      }
    }
    findings.sort(Comparator.comparingInt(Finding::slot));
    return new Diagnosis(
        Verdict.FAULT,
        findings,
        last.measuring(),
        last.measuringAlternatives(),
        last.runnerUp(),
        last.measureNext(),
        last.wholeRing(),
        last.fitProbability(),
        Diagnosis.Reason.FAULT_SHOWN,
        last.disagreements());
  }
}
