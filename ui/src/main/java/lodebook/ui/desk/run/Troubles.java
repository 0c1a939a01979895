package lodebook.ui.desk.run;

import java.util.ArrayList;
import java.util.List;
import lodebook.db.refusal.Refusal;
import lodebook.db.refusal.RowsRefused;
import lodebook.db.refusal.Sentences;
import lodebook.ui.craft.PiecesShort;
import lodebook.ui.desk.words.DeskWords;
import lodebook.ui.files.BadFile;
import lodebook.ui.files.Problem;

/// Turns every failure into words; the only place of the desktop that does.
public final class Troubles {
  private final DeskWords words;
  private final Sentences sentences;
  private final DefectLog log;

  /// @param words the desktop's language
  /// @param log where defects of the program are written down
  public Troubles(DeskWords words, DefectLog log) {
    this.words = words;
    this.sentences = Sentences.in(words.locale());
    this.log = log;
  }

  /// What is said about a failure.
  public Trouble of(Throwable failure) {
    return switch (failure) {
      case BadFile bad -> file(bad);
      case RowsRefused rows -> rows(rows);
      case Refusal refusal -> new Trouble(sentences.say(refusal), List.of(), false);
      case PiecesShort pieces ->
          new Trouble(
              words.say("trouble.short"),
              pieces.shortages().stream()
                  .map(
                      s ->
                          words.say(
                              "trouble.short-of",
                              s.type(),
                              words.number(s.missing()),
                              words.number(s.needed()),
                              words.number(s.available())))
                  .toList(),
              false);
      default -> new Trouble(words.say("trouble.defect", log.write(failure)), List.of(), true);
    };
  }

  private Trouble file(BadFile bad) {
    List<String> rows = new ArrayList<>();
    for (Problem problem : bad.problems()) {
      rows.add(
          words.say(
              "trouble.at",
              words.number(problem.line()),
              words.number(problem.column()),
              problem.sentence()));
    }
    if (bad.more() > 0) {
      rows.add(words.say("trouble.more", words.number(bad.more())));
    }
    return new Trouble(words.say("trouble.file"), rows, false);
  }

  private Trouble rows(RowsRefused refused) {
    List<String> rows = new ArrayList<>();
    refused
        .problems()
        .forEach(
            p ->
                rows.add(
                    words.say(
                        "trouble.row",
                        words.number(p.row() + 1),
                        p.column(),
                        sentences.say(p.refusal()))));
    return rows.size() == 1
        ? new Trouble(sentences.say(refused.problems().getFirst().refusal()), List.of(), false)
        : new Trouble(words.say("trouble.file"), rows, false);
  }
}
