package lodebook.ui.cli;

import java.nio.file.Path;
import lodebook.db.surveys.Survey;
import lodebook.db.surveys.SurveyRow;
import lodebook.db.surveys.Surveys;
import lodebook.ui.files.Example;
import lodebook.ui.files.Rows;
import lodebook.ui.files.SurveyFile;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Takes in gaussmeter readings round a rotor.
@Command(
    name = "import",
    description = "Take in gaussmeter readings round a rotor; prints the survey's number.",
    footer = {"", "Example:", "  lodebook survey import R-0001 survey.csv --meter GM-1"})
final class SurveyTakeIn extends FileVerb {
  @Parameters(index = "0", arity = "0..1", paramLabel = "ROTOR", description = "its number")
  private @Nullable String rotor;

  @Parameters(index = "1", arity = "0..1", paramLabel = "FILE", description = "a CSV file")
  private @Nullable Path file;

  @Option(names = "--meter", paramLabel = "METER", description = "the meter of rows that name none")
  private @Nullable String meter;

  @Option(
      names = "--continue",
      paramLabel = "S-12",
      description = "the unfinished survey that the readings belong to")
  private @Nullable String continued;

  SurveyTakeIn(Session session) {
    super(session, Example.SURVEY);
  }

  @Override
  int takeIn() {
    String code = need(rotor, "ROTOR");
    Path path = need(file, "FILE");
    Rows<SurveyRow> rows = SurveyFile.read(session.source(path), meter != null);
    importing(
        rows,
        () ->
            session.change(
                book ->
                    tell(
                        new Surveys(book)
                            .importReadings(session.act(), code, rows.all(), meter, continued))));
    return 0;
  }

  private void tell(Survey survey) {
    Json document =
        Json.object()
            .put("survey", survey.code())
            .put("rotor", survey.rotor())
            .put("readings", survey.readings());
    if (!session.json(document)) {
      session.say(survey.code());
    }
    session.remark(
        session.words().say("survey.imported", survey.code(), survey.rotor(), survey.readings()));
    session.next("lodebook survey check " + survey.code());
  }
}
