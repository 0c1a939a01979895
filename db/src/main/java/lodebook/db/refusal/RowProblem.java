package lodebook.db.refusal;

/// What is wrong with one row of an import.
///
/// @param row index of the row in the list that was handed in, from 0
/// @param column name of the file's column or key that is at fault, such as `piece`; empty for that
///   which the sentence names
/// @param refusal what is wrong, with its kind and remedy
public record RowProblem(int row, String column, Refusal refusal) {}
