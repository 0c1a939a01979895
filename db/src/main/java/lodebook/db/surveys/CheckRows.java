package lodebook.db.surveys;

import static lodebook.db.tables.Tables.FINDING;
import static lodebook.db.tables.Tables.SURVEY_CHECK;

import java.util.List;
import java.util.Locale;
import lodebook.assembly.layout.Facing;
import lodebook.assembly.survey.Diagnosis;
import lodebook.assembly.survey.Finding;
import lodebook.assembly.survey.Measuring;
import lodebook.db.book.Writing;
import lodebook.db.tables.tables.records.FindingRecord;
import lodebook.db.tables.tables.records.SurveyCheckRecord;
import org.jspecify.annotations.Nullable;

/// What a check said, as rows and in the line of history.
final class CheckRows {
  private CheckRows() {}

  static void insert(Writing writing, long surveyId, String survey, Diagnosis diagnosis) {
    SurveyCheckRecord check = writing.sql().newRecord(SURVEY_CHECK);
    check.setId(writing.newId());
    check.setSurveyId(surveyId);
    check.setVerdict(diagnosis.verdict().word());
    check.setReason(diagnosis.reason().name().toLowerCase(Locale.ROOT));
    check.setMeasuring(words(diagnosis.measuring()));
    check.setFitProbability(diagnosis.fitProbability());
    check.setPersonId(writing.person().id());
    check.setRecordedAt(writing.recordedAt());
    check.setHistorySequence(writing.sequence());
    check.insert();
    writing
        .line()
        .subject(survey)
        .field("survey", survey)
        .field("verdict", diagnosis.verdict().word())
        .field("reason", check.getReason())
        .field("measuring", check.getMeasuring())
        .field("fitProbability", diagnosis.fitProbability());
    long number = 1;
    for (Finding finding : diagnosis.findings()) {
      insert(writing, check.getId(), number, finding);
      number++;
    }
  }

  private static void insert(Writing writing, long checkId, long number, Finding finding) {
    Facing faces = finding.faces();
    FindingRecord row = writing.sql().newRecord(FINDING);
    row.setSurveyCheckId(checkId);
    row.setNumber(number);
    row.setSlot((long) finding.slot());
    row.setKind(finding.kind().word());
    row.setShouldFaceDegrees(finding.shouldFace().degrees());
    row.setFacesDegrees(faces == null ? null : faces.degrees());
    row.setByDegrees(finding.byDegrees());
    row.setStrengthRelative(finding.strengthShare());
    row.setProbability(finding.probability());
    row.insert();
    writing
        .line()
        .row(
            List.of(
                Integer.toString(finding.slot()),
                finding.kind().word(),
                Double.toString(finding.shouldFace().degrees()),
                orNothing(row.getFacesDegrees()),
                orNothing(finding.byDegrees()),
                orNothing(finding.strengthShare()),
                Double.toString(finding.probability())));
  }

  private static String words(Measuring measuring) {
    return "%s, start %d, %s, %s"
        .formatted(
            measuring.sign().word(),
            measuring.startSlot(),
            measuring.direction().word(),
            measuring.unit().word());
  }

  private static String orNothing(@Nullable Double number) {
    return number == null ? "" : number.toString();
  }
}
