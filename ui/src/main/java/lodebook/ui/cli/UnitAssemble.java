package lodebook.ui.cli;

import java.util.List;
import lodebook.db.surveys.Survey;
import lodebook.db.surveys.SurveyChecks;
import lodebook.db.surveys.Surveys;
import lodebook.db.units.GearUnit;
import lodebook.db.units.Units;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Assembles a gear.
@Command(
    name = "assemble",
    description = "Assemble a gear from rotors whose latest survey passes.",
    footer = {
      "",
      "Example:",
      "  lodebook unit assemble U-0001 --gear STIR --inner R-0001 --outer R-0002"
    })
final class UnitAssemble extends Verb {
  @Parameters(paramLabel = "UNIT", description = "its number")
  private String code = "";

  @Option(names = "--gear", paramLabel = "GEAR", required = true, description = "a released model")
  private String gear = "";

  @Option(names = "--inner", paramLabel = "ROTOR", required = true, description = "the inner rotor")
  private String inner = "";

  @Option(names = "--outer", paramLabel = "ROTOR", required = true, description = "the outer ring")
  private String outer = "";

  @Option(
      names = "--override",
      description = "a rotor goes in whose latest survey doesn't pass; a lead's (needs --why)")
  private boolean override;

  @Option(names = "--why", paramLabel = "TEXT", description = "the reason for --override")
  private @Nullable String why;

  UnitAssemble(Session session) {
    super(session);
  }

  @Override
  int run() {
    if (override && why == null) {
      throw wrongLine("line.missing", "--why TEXT");
    }
    String reason = override ? why : null;
    judgeLatest(inner);
    judgeLatest(outer);
    GearUnit unit =
        session.write(
            book -> new Units(book).assemble(session.act(), code, gear, inner, outer, reason));
    session.done("unit.assembled", unit.code(), unit.gear());
    session.next("lodebook trace " + unit.code());
    return 0;
  }

  /// Checks a rotor's latest survey where nobody has since it was read.
  private void judgeLatest(String rotor) {
    List<Survey> standing =
        session.read(book -> new Surveys(book).list(rotor)).stream()
            .filter(survey -> !survey.voided())
            .toList();
    if (!standing.isEmpty() && standing.getLast().verdict() == null) {
      SurveyChecks checks = new SurveyChecks(session::opened);
      checks.store(session.act(), checks.check(List.of(standing.getLast().code())));
    }
  }
}
