package lodebook.ui.cli;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/// A table for a terminal of 80 columns: columns of numbers to the right, texts to the left; where
/// it would be wider, the widest column of texts is broken into lines.
final class Table {
  private static final int WIDTH = 80;
  private static final int GAP = 2;
  private static final int NARROWEST = 8;

  private final List<String> titles;
  private final List<List<String>> rows = new ArrayList<>();

  /// A table.
  ///
  /// @param titles titles of the columns; one that begins with `>` stands to the right
  Table(String... titles) {
    this.titles = List.of(titles);
  }

  /// Adds a row.
  Table row(Object... cells) {
    rows.add(Arrays.stream(cells).map(String::valueOf).toList());
    return this;
  }

  /// Whether it has no row.
  boolean isEmpty() {
    return rows.isEmpty();
  }

  /// The table's lines, without an end at the last.
  String text() {
    List<List<String>> all = new ArrayList<>();
    all.add(titles.stream().map(t -> t.startsWith(">") ? t.substring(1) : t).toList());
    all.addAll(rows);
    int[] widths = widths(all);
    StringBuilder text = new StringBuilder();
    for (List<String> row : all) {
      append(text, row, widths);
    }
    return text.toString().stripTrailing();
  }

  private int[] widths(List<List<String>> all) {
    int[] widths = new int[titles.size()];
    for (List<String> row : all) {
      for (int i = 0; i < widths.length; i++) {
        widths[i] = Math.max(widths[i], row.get(i).length());
      }
    }
    int over = Arrays.stream(widths).sum() + GAP * (widths.length - 1) - WIDTH;
    while (over > 0) {
      int widest = 0;
      for (int i = 1; i < widths.length; i++) {
        widest = widths[i] > widths[widest] ? i : widest;
      }
      if (widths[widest] <= NARROWEST) {
        break;
      }
      widths[widest]--;
      over--;
    }
    return widths;
  }

  private void append(StringBuilder text, List<String> row, int[] widths) {
    List<List<String>> cells = new ArrayList<>();
    int lines = 1;
    for (int i = 0; i < widths.length; i++) {
      List<String> broken = broken(row.get(i), widths[i]);
      lines = Math.max(lines, broken.size());
      cells.add(broken);
    }
    for (int line = 0; line < lines; line++) {
      StringBuilder out = new StringBuilder();
      for (int i = 0; i < widths.length; i++) {
        String cell = line < cells.get(i).size() ? cells.get(i).get(line) : "";
        String space = " ".repeat(Math.max(0, widths[i] - cell.length()));
        out.append(titles.get(i).startsWith(">") ? space + cell : cell + space);
        out.append(" ".repeat(GAP));
      }
      text.append(out.toString().stripTrailing()).append('\n');
    }
  }

  /// A text in lines of a width, broken at spaces where there are any.
  static List<String> broken(String text, int width) {
    List<String> lines = new ArrayList<>();
    String rest = text;
    while (rest.length() > width) {
      int space = rest.lastIndexOf(' ', width);
      int end = space > 0 ? space : width;
      lines.add(rest.substring(0, end));
      rest = rest.substring(end).stripLeading();
    }
    lines.add(rest);
    return lines;
  }
}
