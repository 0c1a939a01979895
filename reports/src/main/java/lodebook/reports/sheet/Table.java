package lodebook.reports.sheet;

import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import lodebook.reports.canvas.Anchor;
import lodebook.reports.canvas.Canvas;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.canvas.Palette;
import lodebook.reports.canvas.Typeface;
import lodebook.reports.canvas.Wrap;
import org.jspecify.annotations.Nullable;

/// A table that breaks between rows, repeats its head on every page and leaves no row alone.
public final class Table {
  private static final double PAD = 1.3;
  private static final double LINE = 1.24;
  private static final Lettering HEAD = Lettering.bold(9);
  private static final Lettering NOTE = Lettering.plain(11);

  /// A column.
  ///
  /// @param title its head
  /// @param share share of the table's width; shares need not add up to anything
  public record Column(String title, double share) {}

  /// A row.
  ///
  /// @param cells one for each column
  /// @param note words under the row, from the second column to the end, or null
  public record Row(List<Cell> cells, @Nullable String note) {}

  private final Flow flow;
  private final List<Column> columns;
  private final List<Row> rows;
  private final double[] left;

  /// A table across the width of a flow.
  public Table(Flow flow, List<Column> columns, List<Row> rows) {
    this.flow = flow;
    this.columns = List.copyOf(columns);
    this.rows = List.copyOf(rows);
    double all = columns.stream().mapToDouble(Column::share).sum();
    left = new double[columns.size() + 1];
    for (int i = 0; i < columns.size(); i++) {
      left[i + 1] = left[i] + flow.width() * columns.get(i).share() / all;
    }
  }

  /// Height of the table's head and first two rows, which stay together.
  public double startHeight() {
    double start = headHeight();
    for (int i = 0; i < Math.min(2, rows.size()); i++) {
      start += height(rows.get(i));
    }
    return Math.min(start, flow.pageRoom());
  }

  /// Sets the table.
  public void set() {
    double[] heights = rows.stream().mapToDouble(this::height).toArray();
    double head = headHeight();
    for (int i = 0; i < rows.size(); i++) {
      boolean lastTwo = i == rows.size() - 2 && i > 0;
      double need = lastTwo ? heights[i] + heights[i + 1] : heights[i];
      if (i == 0) {
        flow.need(startHeight());
        head();
      } else if (flow.room() < Math.min(need, flow.pageRoom() - head)) {
        flow.newPage();
        head();
      }
      row(flow.take(Math.min(heights[i], flow.room())), rows.get(i), heights[i]);
    }
  }

  private double width(int column) {
    return left[column + 1] - left[column];
  }

  private Typeface typeface() {
    return flow.typeface();
  }

  private double headHeight() {
    int most = 1;
    for (int i = 0; i < columns.size(); i++) {
      most = Math.max(most, headLines(i).size());
    }
    return most * LINE * HEAD.sizeMillimetres() + 2 * PAD;
  }

  private List<String> headLines(int column) {
    return Wrap.lines(
        columns.get(column).title(), typeface(), headLettering(column), width(column) - 2 * PAD);
  }

  /// The head's lettering, smaller where a word would not fit its column.
  private Lettering headLettering(int column) {
    double widest = 0;
    for (String word : columns.get(column).title().split(" ")) {
      widest = Math.max(widest, typeface().width(word, HEAD));
    }
    double fit = (width(column) - 2 * PAD) / Math.max(widest, 1e-9);
    return HEAD.sized(HEAD.sizePoints() * Math.clamp(fit, 0.6, 1));
  }

  private void head() {
    double height = headHeight();
    Canvas strip = flow.take(height);
    strip.fill(new Rectangle2D.Double(0, 0, flow.width(), height), Palette.SHADE);
    for (int i = 0; i < columns.size(); i++) {
      double y = PAD;
      for (String line : headLines(i)) {
        double baseline = y + 0.8 * HEAD.sizeMillimetres();
        strip.text(line, left[i] + PAD, baseline, headLettering(i), Anchor.START);
        y += LINE * HEAD.sizeMillimetres();
      }
    }
    strip.stroke(new Line2D.Double(0, height, flow.width(), height), Palette.GRAPHITE, 0.4);
  }

  private double[] stackHeights(Row row) {
    double[] parts = {};
    for (int i = 0; i < row.cells().size(); i++) {
      if (row.cells().get(i) instanceof Cell.Stack(List<Cell> cells)) {
        if (parts.length == 0) {
          parts = new double[cells.size()];
        }
        for (int j = 0; j < cells.size(); j++) {
          parts[j] = Math.max(parts[j], height(cells.get(j), width(i)));
        }
      }
    }
    double sum = java.util.Arrays.stream(parts).sum();
    double spare = (simpleHeight(row) - sum) / Math.max(parts.length, 1);
    for (int j = 0; j < parts.length; j++) {
      parts[j] += Math.max(spare, 0);
    }
    return parts;
  }

  private double simpleHeight(Row row) {
    double most = 0;
    for (int i = 0; i < row.cells().size(); i++) {
      most = Math.max(most, height(row.cells().get(i), width(i)));
    }
    return most;
  }

  private double cellsHeight(Row row) {
    return Math.max(simpleHeight(row), java.util.Arrays.stream(stackHeights(row)).sum());
  }

  private double height(Row row) {
    return cellsHeight(row)
        + noteLines(row).size() * LINE * NOTE.sizeMillimetres()
        + (row.note() == null ? 0 : PAD);
  }

  private List<String> noteLines(Row row) {
    return row.note() == null
        ? List.of()
        : Wrap.lines(row.note(), typeface(), NOTE, flow.width() - left[1] - 2 * PAD);
  }

  private double height(Cell cell, double width) {
    return switch (cell) {
      case Cell.Text text -> textHeight(text, width);
      case Cell.Box box -> box.height();
      case Cell.Drawing d ->
          Math.max(d.height() + 2 * PAD, textHeight(d.text(), width - d.width() - PAD));
      case Cell.Stack stack -> 0;
    };
  }

  private record Line(String text, Lettering lettering) {}

  private List<Line> lines(Cell.Text text, double width) {
    List<Line> lines = new ArrayList<>();
    for (Cell.Part part : text.parts()) {
      for (String line : Wrap.lines(part.words(), typeface(), part.lettering(), width - 2 * PAD)) {
        lines.add(new Line(line, part.lettering()));
      }
    }
    return lines;
  }

  private double textHeight(Cell.Text text, double width) {
    double height = 2 * PAD;
    for (Line line : lines(text, width)) {
      height += LINE * line.lettering().sizeMillimetres();
    }
    return height;
  }

  private void row(Canvas strip, Row row, double height) {
    double cells = cellsHeight(row);
    double[] parts = stackHeights(row);
    for (int i = 0; i < columns.size(); i++) {
      if (!(row.cells().get(i) instanceof Cell.Stack)) {
        draw(strip.moved(left[i], 0), row.cells().get(i), width(i), cells);
      } else if (i == 0 || !(row.cells().get(i - 1) instanceof Cell.Stack)) {
        stacks(strip, row, i, parts);
      }
    }
    double y = cells;
    for (String line : noteLines(row)) {
      strip.text(line, left[1] + PAD, y + 0.8 * NOTE.sizeMillimetres(), NOTE, Anchor.START);
      y += LINE * NOTE.sizeMillimetres();
    }
    for (int i = 1; i < columns.size(); i++) {
      strip.stroke(new Line2D.Double(left[i], 0, left[i], cells), Palette.RULE, 0.15);
    }
    strip.stroke(new Line2D.Double(0, height, flow.width(), height), Palette.PENCIL, 0.25);
  }

  /// Neighbouring stacks from the first on, line by line, so that a reader hears what belongs
  /// together.
  private void stacks(Canvas strip, Row row, int first, double[] parts) {
    double y = 0;
    for (int j = 0; j < parts.length; j++) {
      int i = first;
      for (; i < columns.size(); i++) {
        if (!(row.cells().get(i) instanceof Cell.Stack(List<Cell> stacked))) {
          break;
        }
        draw(strip.moved(left[i], y), stacked.get(j), width(i), parts[j]);
      }
      y += parts[j];
      if (j < parts.length - 1) {
        strip.stroke(new Line2D.Double(left[first], y, left[i], y), Palette.RULE, 0.15);
      }
    }
  }

  private void draw(Canvas place, Cell cell, double width, double height) {
    switch (cell) {
      case Cell.Text text -> text(place, text, width, height);
      case Cell.Box box ->
          place.stroke(
              new Rectangle2D.Double(0.8, 0.8, width - 1.6, height - 1.6), Palette.GRAPHITE, 0.3);
      case Cell.Drawing d -> {
        d.drawing().accept(place.moved(PAD, (height - d.height()) / 2));
        double shift = d.width() + PAD;
        text(place.moved(shift, 0), d.text(), width - shift, height);
      }
      case Cell.Stack stack -> throw new IllegalStateException("a stack within a stack");
    }
  }

  private void text(Canvas place, Cell.Text text, double width, double height) {
    double y = (height - textHeight(text, width)) / 2 + PAD;
    for (Line line : lines(text, width)) {
      double size = line.lettering().sizeMillimetres();
      place.text(line.text(), PAD, y + 0.88 * size, line.lettering(), Anchor.START);
      y += LINE * size;
    }
  }
}
