package lodebook.ui.cli;

import lodebook.db.surveys.Survey;
import lodebook.db.surveys.Surveys;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Moves a survey to the rotor of which it is.
@Command(
    name = "move",
    description = "Say that a survey was of another rotor.",
    footer = {
      "",
      "Example:",
      "  lodebook survey move S-12 --to R-0002 --why \"rotors were mixed up\""
    })
final class SurveyMove extends Verb {
  @Parameters(paramLabel = "SURVEY", description = "its number, such as S-12")
  private String survey = "";

  @Option(names = "--to", paramLabel = "ROTOR", required = true, description = "the rotor")
  private String rotor = "";

  @Option(names = "--why", paramLabel = "TEXT", required = true, description = "the reason")
  private String why = "";

  SurveyMove(Session session) {
    super(session);
  }

  @Override
  int run() {
    Survey moved = session.write(book -> new Surveys(book).move(session.act(), survey, rotor, why));
    session.done("survey.moved-to", moved.code(), moved.rotor());
    session.next("lodebook survey check " + moved.code());
    return 0;
  }
}
