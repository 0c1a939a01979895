package lodebook.db.refusal;

import java.util.Comparator;
import java.util.List;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;

/// An import is refused as a whole; every row at fault is listed, in the file's order.
///
/// Its kind is the gravest of its rows: wrong input if any row is wrong in itself, else refused.
/// For a single row its sentence and remedy are that row's.
public final class RowsRefused extends Refusal {
  private static final long serialVersionUID = 1;

  private final transient List<RowProblem> problems;

  /// A refusal for a list of at least one problem.
  public RowsRefused(List<RowProblem> problems) {
    super(kindOf(problems), notice(problems), problems.size() == 1 ? remedy(problems) : null);
    this.problems = problems.stream().sorted(Comparator.comparingInt(RowProblem::row)).toList();
  }

  /// Throws if there are problems.
  public static void throwIfAny(List<RowProblem> problems) {
    if (!problems.isEmpty()) {
      throw new RowsRefused(problems);
    }
  }

  /// Does something with one field of what was handed in; what is refused is told at that field.
  ///
  /// @param row index of the row, from 0
  /// @param column name of the field
  public static <T> T at(int row, String column, Supplier<T> work) {
    try {
      return work.get();
    } catch (RowsRefused placed) {
      throw placed;
    } catch (Refusal refusal) {
      throw new RowsRefused(List.of(new RowProblem(row, column, refusal)));
    }
  }

  private static Notice notice(List<RowProblem> problems) {
    return problems.size() == 1
        ? problems.getFirst().refusal().notice()
        : Notice.of("rows.refused", problems.size());
  }

  private static @Nullable String remedy(List<RowProblem> problems) {
    return problems.getFirst().refusal().remedy();
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
