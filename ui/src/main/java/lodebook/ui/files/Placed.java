package lodebook.ui.files;

import java.util.List;

/// What was read from a file, with the places where it stands.
public interface Placed {
  /// Problems that only the book knew of, at their places in the file.
  List<Problem> problems(List<Fault> faults);

  /// What the book says against a part of a file.
  ///
  /// @param row index of the row or object, from 0
  /// @param column name of the column or key at fault; empty for that which the sentence names
  /// @param sentence what is wrong
  record Fault(int row, String column, String sentence) {}
}
