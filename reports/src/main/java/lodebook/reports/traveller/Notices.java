package lodebook.reports.traveller;

import java.util.ArrayList;
import java.util.List;
import lodebook.assembly.magnet.MagnetType;
import lodebook.assembly.safety.HandlingFigures;
import lodebook.reports.canvas.Lettering;
import lodebook.reports.sheet.Cell;
import lodebook.reports.sheet.Flow;
import lodebook.reports.sheet.Table;
import lodebook.reports.words.Words;

/// The notices for handling magnets, each with its source; local rules and qualified people decide.
public final class Notices {
  private static final Lettering NAME = Lettering.bold(10);
  private static final Lettering TEXT = Lettering.plain(10);
  private static final Lettering SOURCE = Lettering.plain(8.5);

  private final Words words;
  private final List<Table.Row> rows = new ArrayList<>();

  private Notices(Words words) {
    this.words = words;
  }

  /// Sets the notices for one magnet type.
  ///
  /// @param magnets how many magnets are handled together
  /// @param adhesive the adhesive in words, empty if none is named
  public static void set(
      Flow flow,
      Words words,
      MagnetType type,
      HandlingFigures figures,
      int magnets,
      String adhesive) {
    var notices = new Notices(words);
    notices.collect(type, figures, magnets, adhesive);
    var columns =
        List.of(
            new Table.Column(words.say("notice.column.name"), 36),
            new Table.Column(words.say("notice.column.text"), 144));
    var table = new Table(flow, columns, notices.rows);
    flow.heading(words.say("notice.title"), 12 + table.startHeight());
    flow.paragraph(words.say("notice.deferral"), Lettering.bold(10));
    flow.gap(1.5);
    table.set();
  }

  private void collect(MagnetType type, HandlingFigures f, int magnets, String adhesive) {
    add("pinch", words.number(roundedUp(f.pinchNewton()), 0), type.code());
    add(
        "implants",
        millimetres(f.implantsMetres()),
        millimetres(f.implantsTogetherMetres()),
        Integer.toString(magnets));
    add("iron", millimetres(f.looseIronMetres()));
    add("chips");
    add("coating", type.coating().isEmpty() ? words.say("notice.coating.unknown") : type.coating());
    add("cards");
    add("dust");
    add("adhesive", adhesive.isEmpty() ? words.say("notice.adhesive.unknown") : adhesive);
    add("temperature", words.number(Math.floor(f.highestTemperatureCelsius()), 0), type.grade());
  }

  private void add(String key, Object... values) {
    rows.add(
        new Table.Row(
            List.of(
                Cell.Text.of(words.say("notice." + key + ".name"), NAME),
                new Cell.Text(
                    List.of(
                        new Cell.Part(words.say("notice." + key, values), TEXT),
                        new Cell.Part(
                            words.say("notice.source", words.say("notice." + key + ".source")),
                            SOURCE)))),
            null));
  }

  /// A length on the safe side: up to the next whole millimetre.
  private String millimetres(double metres) {
    return words.number(roundedUp(1e3 * metres), 0);
  }

  private static double roundedUp(double value) {
    return Math.ceil(value - 1e-9);
  }
}
