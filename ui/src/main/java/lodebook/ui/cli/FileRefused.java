package lodebook.ui.cli;

import java.util.List;
import lodebook.db.refusal.RowProblem;
import lodebook.db.refusal.RowsRefused;
import lodebook.ui.files.BadFile;
import lodebook.ui.files.Placed;
import lodebook.ui.files.Problem;
import org.jspecify.annotations.Nullable;

/// The book refuses rows of a file: the same list of places as for a file that is wrong in itself.
final class FileRefused extends RuntimeException {
  private static final long serialVersionUID = 1;

  private final transient List<Problem> problems;
  private final int more;
  private final @Nullable String remedy;
  private final int exitCode;

  private FileRefused(
      List<Problem> problems, int more, @Nullable String remedy, RowsRefused cause) {
    super(cause);
    this.problems = problems;
    this.more = more;
    this.remedy = remedy;
    this.exitCode = cause.kind().exitCode();
  }

  /// The refusal with the places of its rows or keys.
  static FileRefused of(RowsRefused refused, Placed read, Session session) {
    List<RowProblem> all = refused.problems();
    List<String> remedies =
        all.stream().map(p -> String.valueOf(p.refusal().remedy())).distinct().toList();
    String common = remedies.size() == 1 ? all.getFirst().refusal().remedy() : null;
    List<Placed.Fault> faults =
        all.stream()
            .limit(BadFile.SHOWN)
            .map(p -> new Placed.Fault(p.row(), p.column(), sentence(p, common, session)))
            .toList();
    return new FileRefused(read.problems(faults), all.size() - faults.size(), common, refused);
  }

  private static String sentence(RowProblem problem, @Nullable String common, Session session) {
    String sentence = session.sentences().say(problem.refusal());
    String remedy = problem.refusal().remedy();
    return remedy == null || remedy.equals(common)
        ? sentence
        : session.words().say("row.remedy", sentence, remedy);
  }

  /// The command that helps with every row, or null where there is no such.
  @Nullable String remedy() {
    return remedy;
  }

  List<Problem> problems() {
    return problems;
  }

  int more() {
    return more;
  }

  int exitCode() {
    return exitCode;
  }
}
