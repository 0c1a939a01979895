package lodebook.assembly.survey;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/// Surveys made by an independent program that perturbs geometry, strengths and readings.
class SurveyCasesTest {
  static List<String> names() throws Exception {
    return SurveyCase.names();
  }

  @Test
  void thereAreCases() throws Exception {
    assertTrue(names().size() >= 17, "at least seventeen cases");
  }

  @ParameterizedTest
  @MethodSource("names")
  void isExplained(String name) {
    SurveyCase survey = SurveyCase.read(name);
    Diagnosis diagnosis =
        new SurveyExplainer(survey.ring(), Priors.DEFAULT).explain(survey.readings());
    Set<NamedFault> found =
        diagnosis.findings().stream()
            .map(f -> new NamedFault(f.slot(), f.kind()))
            .collect(Collectors.toSet());
    assertEquals(survey.faults(), found, diagnosis::toString);
    assertEquals(
        survey.faults().isEmpty() ? Verdict.PASS : Verdict.FAULT,
        diagnosis.verdict(),
        diagnosis::toString);
    Set<Measuring> measuring = new HashSet<>(diagnosis.measuringAlternatives());
    measuring.add(diagnosis.measuring());
    assertTrue(measuring.contains(survey.measuring()), diagnosis::toString);
  }
}
