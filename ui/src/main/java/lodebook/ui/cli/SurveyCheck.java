package lodebook.ui.cli;

import java.util.ArrayList;
import java.util.List;
import lodebook.assembly.survey.Diagnosis;
import lodebook.assembly.survey.Verdict;
import lodebook.db.surveys.SurveyChecks;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Says what a survey shows.
@Command(
    name = "check",
    description = "Say what a survey shows: what is wrong, how sure, what to measure next.",
    footer = {"", "Example:", "  lodebook survey check S-12"})
final class SurveyCheck extends Verb {
  @Parameters(
      paramLabel = "SURVEY",
      split = ",",
      arity = "1",
      description = "S-12, or S-12,S-13 together, or a rotor for its latest survey")
  private List<String> codes = new ArrayList<>();

  SurveyCheck(Session session) {
    super(session);
  }

  @Override
  int run() {
    SurveyChecks checks = new SurveyChecks(session::opened);
    SurveyChecks.Checked checked = checks.check(codes);
    if (!session.json(SurveyJson.of(checked, session.words()))) {
      session.say(new SurveyWords(session.words()).of(checked));
    }
    if (session.act().by() != null && checked.survey().surveys().size() == 1) {
      checks.store(session.act(), checked);
      session.tellBook(session.address());
    } else {
      session.remark(session.words().say("survey.not-kept"));
    }
    Diagnosis diagnosis = checked.diagnosis();
    String rotor = checked.survey().rotor();
    session.next(
        diagnosis.verdict() == Verdict.PASS
            ? "lodebook rotor show " + rotor
            : diagnosis.verdict() == Verdict.FAULT
                ? "lodebook place " + rotor + " placements.csv --rework --why TEXT"
                : "lodebook survey import "
                    + rotor
                    + " survey.csv --meter METER --continue "
                    + checked.survey().surveys().getLast());
    return diagnosis.verdict() == Verdict.PASS ? 0 : 1;
  }
}
