package lodebook.db.surveys;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import lodebook.assembly.survey.Diagnosis;
import lodebook.assembly.survey.FaultKind;
import lodebook.assembly.survey.Finding;
import lodebook.assembly.survey.Priors;
import lodebook.assembly.survey.ProbeResponses;
import lodebook.assembly.survey.SurveyExplainer;
import lodebook.assembly.survey.Verdict;

/// Explains a survey whose ring may have changed while it was taken.
///
/// Each stage is explained against the ring as it stood then. The last one speaks for the rotor;
/// where it does not show everything right, faults that earlier stages showed count as well, unless
/// the magnet was changed since.
final class StagedExplanation {
  private StagedExplanation() {}

  static Diagnosis of(RecordedSurvey survey) {
    ProbeResponses responses = new ProbeResponses(survey.design());
    List<RecordedSurvey.Stage> stages = survey.stages();
    Diagnosis last = explain(stages.getLast(), responses);
    List<Finding> earlier = new ArrayList<>();
    if (last.verdict() != Verdict.PASS) {
      for (RecordedSurvey.Stage stage : stages.subList(0, stages.size() - 1)) {
        Diagnosis diagnosis = explain(stage, responses);
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

  private static Diagnosis explain(RecordedSurvey.Stage stage, ProbeResponses responses) {
    return new SurveyExplainer(stage.ring(), Priors.DEFAULT, responses).explain(stage.readings());
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
        Diagnosis.Reason.FAULT_SHOWN);
  }
}
