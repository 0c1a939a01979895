package lodebook.ui.files;

import java.util.List;

/// A file is wrong in itself; nothing of it counts.
public final class BadFile extends RuntimeException {
  /// How many problems are told one by one.
  public static final int SHOWN = 50;

  private static final long serialVersionUID = 1;

  private final transient List<Problem> problems;
  private final int count;

  /// A refusal of a file.
  ///
  /// @param problems the first problems by line and column, at most [#SHOWN]
  /// @param count how many there are in all
  public BadFile(List<Problem> problems, int count) {
    super(problems.getFirst().toString());
    this.problems = List.copyOf(problems);
    this.count = count;
  }

  /// A refusal for one problem.
  public BadFile(Problem problem) {
    this(List.of(problem), 1);
  }

  /// The first problems by line and column.
  public List<Problem> problems() {
    return problems;
  }

  /// How many problems there are beyond those told.
  public int more() {
    return count - problems.size();
  }
}
