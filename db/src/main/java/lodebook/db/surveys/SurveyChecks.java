package lodebook.db.surveys;

import static lodebook.db.tables.Tables.SURVEY;

import java.util.List;
import java.util.function.Supplier;
import lodebook.assembly.survey.Diagnosis;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.code.Code;
import lodebook.db.code.CodeKind;
import lodebook.db.code.Codes;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import lodebook.db.tables.tables.records.SurveyRecord;

/// Checking surveys: read, explain with the book closed, record what was said.
public final class SurveyChecks {
  private final Supplier<Book> opening;

  /// A check.
  ///
  /// @param survey what was explained
  /// @param diagnosis what it shows
  public record Checked(RecordedSurvey survey, Diagnosis diagnosis) {}

  /// @param opening opens the book; it is closed while the computer thinks
  public SurveyChecks(Supplier<Book> opening) {
    this.opening = opening;
  }

  /// Explains surveys; writes nothing.
  ///
  /// @param codes surveys of one rotor, or one rotor for its latest survey
  public Checked check(List<String> codes) {
    RecordedSurvey survey;
    try (Book book = opening.get()) {
      survey = new Surveys(book).asRecorded(codes);
    }
    return new Checked(survey, StagedExplanation.of(survey));
  }

  /// Explains surveys with the book kept open; writes nothing.
  ///
  /// @param codes surveys of one rotor, or one rotor for its latest survey
  public static Checked check(Book book, List<String> codes) {
    RecordedSurvey survey = new Surveys(book).asRecorded(codes);
    return new Checked(survey, StagedExplanation.of(survey));
  }

  /// Records what a check of one survey said, so that the survey carries its verdict; a check of
  /// several surveys together is nobody's and is not recorded.
  public void store(Act act, Checked checked) {
    if (checked.survey().surveys().size() > 1) {
      return;
    }
    try (Book book = opening.get()) {
      store(book, act, checked);
    }
  }

  static void store(Book book, Act act, Checked checked) {
    String survey = checked.survey().surveys().getFirst();
    book.run(
        act,
        Permission.ANYTHING_ELSE,
        "survey check",
        writing -> {
          Code code = Codes.require(writing.sql(), survey, CodeKind.SURVEY);
          SurveyRecord row = writing.sql().fetchSingle(SURVEY, SURVEY.ID.eq(code.id()));
          if (row.getVoided()
              || SurveyRows.lastChange(writing.sql(), code.id(), row.getRotorId())
                  > checked.survey().seen()) {
            throw Refusal.refused("survey.changed-meanwhile", code.shown())
                .remedy("lodebook survey check " + code.shown());
          }
          writing.line().subject(checked.survey().rotor());
          CheckRows.insert(writing, code.id(), code.shown(), checked.diagnosis());
        });
  }
}
