package lodebook.db.refusal;

import java.util.Comparator;
import java.util.List;

/// An import is refused as a whole; every row at fault is listed, in the file's order.
///
/// Its kind is the gravest of its rows: wrong input if any row is wrong in itself, else refused.
public final class RowsRefused extends Refusal {
  private static final long serialVersionUID = 1;

  private final transient List<RowProblem> problems;

  /// A refusal for a list of at least one problem.
  public RowsRefused(List<RowProblem> problems) {
    super(kindOf(problems), Notice.of("rows.refused", problems.size()), null);
    this.problems = problems.stream().sorted(Comparator.comparingInt(RowProblem::row)).toList();
  }

  /// Throws if there are problems.
  public static void throwIfAny(List<RowProblem> problems) {
    if (!problems.isEmpty()) {
      throw new RowsRefused(problems);
    }
  }

  private static RefusalKind kindOf(List<RowProblem> problems) {
    boolean wrong = problems.stream().anyMatch(p -> p.refusal().kind() == RefusalKind.WRONG_INPUT);
    return wrong ? RefusalKind.WRONG_INPUT : RefusalKind.REFUSED;
  }

  /// The problems by rising row.
  public List<RowProblem> problems() {
    return problems;
  }
}
