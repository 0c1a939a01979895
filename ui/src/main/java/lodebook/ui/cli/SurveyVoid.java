package lodebook.ui.cli;

import lodebook.db.surveys.Survey;
import lodebook.db.surveys.Surveys;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Declares a survey void.
@Command(
    name = "void",
    description = "Declare a survey void; what was read stays on record.",
    footer = {"", "Example:", "  lodebook survey void S-12 --why \"probe was loose\""})
final class SurveyVoid extends Verb {
  @Parameters(paramLabel = "SURVEY", description = "its number, such as S-12")
  private String survey = "";

  @Option(names = "--why", paramLabel = "TEXT", required = true, description = "the reason")
  private String why = "";

  SurveyVoid(Session session) {
    super(session);
  }

  @Override
  int run() {
    Survey gone = session.write(book -> new Surveys(book).declareVoid(session.act(), survey, why));
    session.done("survey.void-now", gone.code());
    session.next("lodebook survey import " + gone.rotor() + " survey.csv --meter METER");
    return 0;
  }
}
