package lodebook.db.surveys;

import java.util.List;
import lodebook.assembly.survey.Diagnosis;
import lodebook.assembly.survey.Measuring;
import lodebook.assembly.survey.Verdict;
import lodebook.db.Workshop;
import lodebook.db.book.Book;

/// Verdicts for tests of what follows from them.
public final class Verdicts {
  private Verdicts() {}

  /// Records a verdict of a survey as if a check had come to it.
  public static void record(Book book, String survey, Verdict verdict) {
    RecordedSurvey recorded = new Surveys(book).asRecorded(List.of(survey));
    SurveyChecks.store(
        book,
        Workshop.BENCH,
        new SurveyChecks.Checked(
            recorded,
            new Diagnosis(
                verdict,
                List.of(),
                Measuring.AS_SET,
                List.of(),
                null,
                List.of(),
                null,
                0.5,
                Diagnosis.Reason.SHOWN_RIGHT)));
  }
}
