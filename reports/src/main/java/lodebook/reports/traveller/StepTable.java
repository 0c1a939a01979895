package lodebook.reports.traveller;

import java.util.ArrayList;
import java.util.List;
import lodebook.assembly.layout.Component;
import lodebook.assembly.layout.Layout;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.layout.Spot;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.sheet.Cell;
import lodebook.reports.sheet.Flow;
import lodebook.reports.sheet.Table;
import lodebook.reports.words.FacingWords;
import lodebook.reports.words.Words;

/// The table of steps: which magnet goes where, which way, what it should read, room to write.
final class StepTable {
  private static final Lettering TEXT = Lettering.plain(11);
  private static final Lettering STRONG = Lettering.bold(11);
  private static final double WRITING = 8;

  private final Words words;
  private final FacingWords facings;
  private final Layout layout;

  StepTable(Words words, Layout layout) {
    this.words = words;
    this.facings = new FacingWords(words.language());
    this.layout = layout;
  }

  /// The table of steps.
  Table steps(Flow flow, Traveller traveller) {
    boolean readings = traveller.steps().stream().anyMatch(s -> !s.expected().isEmpty());
    List<Table.Column> columns = new ArrayList<>();
    columns.add(new Table.Column(words.say("step.column.step"), 12.5));
    columns.add(new Table.Column(words.say("step.column.slot"), 13.5));
    columns.add(new Table.Column(words.say("step.column.piece"), readings ? 35 : 56));
    columns.add(new Table.Column(words.say("step.column.facing"), readings ? 36.5 : 60));
    if (readings) {
      columns.add(new Table.Column(words.say("step.column.component"), 22));
      columns.add(new Table.Column(words.say("step.column.expected"), 30.5));
      columns.add(new Table.Column(words.say("step.column.read"), 20));
    }
    columns.add(new Table.Column(words.say("step.column.initials"), 16));
    List<Table.Row> rows = new ArrayList<>();
    for (int i = 0; i < traveller.steps().size(); i++) {
      rows.add(row(i + 1, traveller.steps().get(i), readings));
    }
    return new Table(flow, columns, rows);
  }

  private Table.Row row(int number, Step step, boolean readings) {
    List<Cell> cells = new ArrayList<>();
    cells.add(Cell.Text.of(Integer.toString(number), TEXT));
    cells.add(Cell.Text.of(Integer.toString(step.slot()), Lettering.bold(15)));
    cells.add(piece(step));
    cells.add(
        new Cell.Drawing(
            FacingArrow.SIZE,
            FacingArrow.SIZE,
            canvas -> FacingArrow.draw(canvas, layout, step.facing()),
            Cell.Text.of(facings.of(layout, step.slot(), step.facing()), STRONG)));
    if (readings) {
      cells.addAll(readings(step.expected()));
    }
    cells.add(
        step.inPlace() ? Cell.Text.of(words.say("step.inPlace"), TEXT) : new Cell.Box(WRITING));
    return new Table.Row(cells, step.remark());
  }

  private Cell piece(Step step) {
    List<Cell.Part> parts = new ArrayList<>();
    parts.add(
        new Cell.Part(
            step.piece() == null ? words.say("step.any", step.lot()) : step.piece(), STRONG));
    if (step.tray() != null) {
      parts.add(
          new Cell.Part(
              step.cell() == null
                  ? words.say("step.tray", step.tray())
                  : words.say("step.cell", step.tray(), step.cell()),
              TEXT));
    }
    return new Cell.Text(parts);
  }

  private List<Cell> readings(List<ExpectedReading> expected) {
    List<Cell> components = new ArrayList<>();
    List<Cell> values = new ArrayList<>();
    List<Cell> boxes = new ArrayList<>();
    for (ExpectedReading reading : expected) {
      components.add(Cell.Text.of(component(reading.point()), TEXT));
      values.add(value(reading));
      boxes.add(new Cell.Box(WRITING));
    }
    return List.of(new Cell.Stack(components), new Cell.Stack(values), new Cell.Stack(boxes));
  }

  /// "radial", or "radial, midway to slot 8".
  private String component(ProbePoint point) {
    String name =
        words.say(point.component() == Component.RADIAL ? "ring.radial" : "ring.tangential");
    return point.spot() == Spot.CENTRE
        ? name
        : words.say("step.midway", name, Integer.toString(layout.next(point.slot())));
  }

  private Cell value(ExpectedReading reading) {
    double band = 1e3 * reading.bandTesla();
    int decimals = band < 9.95 ? 1 : 0;
    return Cell.Text.of(
        words.signed(1e3 * reading.valueTesla(), decimals)
            + " ±\u00A0"
            + words.number(band, decimals),
        STRONG);
  }

  /// The table of readings of the finished ring.
  Table finished(Flow flow, List<ExpectedReading> finished) {
    List<Table.Column> columns =
        List.of(
            new Table.Column(words.say("step.column.slot"), 20),
            new Table.Column(words.say("step.column.component"), 60),
            new Table.Column(words.say("step.column.expected"), 40),
            new Table.Column(words.say("step.column.read"), 36),
            new Table.Column(words.say("step.column.initials"), 24));
    List<Table.Row> rows = new ArrayList<>();
    for (ExpectedReading reading : finished) {
      rows.add(
          new Table.Row(
              List.of(
                  Cell.Text.of(Integer.toString(reading.point().slot()), Lettering.bold(13)),
                  Cell.Text.of(component(reading.point()), TEXT),
                  value(reading),
                  new Cell.Box(WRITING),
                  new Cell.Box(WRITING)),
              null));
    }
    return new Table(flow, columns, rows);
  }
}
