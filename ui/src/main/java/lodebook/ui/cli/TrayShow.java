package lodebook.ui.cli;

import java.util.List;
import lodebook.db.stock.Trays;
import lodebook.ui.words.Amounts;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Shows what lies in a tray.
@Command(
    name = "show",
    description = "Show what lies in a tray.",
    footer = {"", "Example:", "  lodebook tray show T-11"})
final class TrayShow extends Verb {
  @Parameters(paramLabel = "TRAY", description = "number of the tray")
  private String tray = "";

  TrayShow(Session session) {
    super(session);
  }

  @Override
  int run() {
    List<Trays.Content> cells = session.read(book -> new Trays(book).show(tray));
    Table table = new Table("CELL", "PIECE", "STATE", ">Br mT");
    cells.forEach(
        c ->
            table.row(
                c.cell(),
                c.piece(),
                c.state().word(),
                c.strength() == null ? "-" : Amounts.milliTesla(c.strength().remanenceTesla())));
    session.list(
        Json.object().put("tray", tray).put("cells", cells.stream().map(TrayShow::json).toList()),
        table,
        "tray.empty");
    return 0;
  }

  private static Json json(Trays.Content content) {
    return Json.object()
        .put("cell", content.cell())
        .put("piece", content.piece())
        .put("state", content.state().word())
        .put(
            "remanenceMilliTesla",
            content.strength() == null ? null : content.strength().remanenceTesla() * 1000);
  }
}
