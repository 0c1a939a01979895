package lodebook.reports.sheet;

import java.util.List;
import java.util.function.Consumer;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;

/// What stands in a cell of a table.
public sealed interface Cell {
  /// Words, broken to the column's width; each part begins a line.
  record Text(List<Part> parts) implements Cell {
    /// Words in one lettering.
    public static Text of(String words, Lettering lettering) {
      return new Text(List.of(new Part(words, lettering)));
    }
  }

  /// A part of a cell's words.
  record Part(String words, Lettering lettering) {}

  /// A frame to write in.
  ///
  /// @param height least height, millimetres
  record Box(double height) implements Cell {}

  /// A drawing with words to its right.
  ///
  /// @param width width of the drawing, millimetres
  /// @param height height of the drawing, millimetres
  /// @param drawing draws below and to the right of the canvas's origin
  record Drawing(double width, double height, Consumer<Canvas> drawing, Text text)
      implements Cell {}

  /// Cells one above the other; the same count in all stacks of a row.
  record Stack(List<Cell> cells) implements Cell {}
}
