package lodebook.ui.desk.run;

import java.util.List;

/// Why something was not done, in words for a person.
///
/// @param sentence what went wrong and what to do
/// @param rows what is wrong row by row, for files; else empty
/// @param defect whether the program is at fault and not the person
public record Trouble(String sentence, List<String> rows, boolean defect) {
  public Trouble {
    rows = List.copyOf(rows);
  }
}
