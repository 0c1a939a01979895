package lodebook.ui.cli;

import java.util.List;
import lodebook.db.stock.Lot;
import lodebook.db.stock.Lots;
import picocli.CommandLine.Command;

/// Lists the lots.
@Command(
    name = "list",
    description = "List the lots, what may be done with them and what is left.",
    footer = {"", "Example:", "  lodebook lot list"})
final class LotList extends Verb {

  LotList(Session session) {
    super(session);
  }

  @Override
  int run() {
    List<Lot> lots = session.read(book -> new Lots(book).list());
    Table table =
        new Table("LOT", "TYPE", "STATE", ">COUNT", ">MEASURED", ">PLACED", ">LEFT", "LIES");
    lots.forEach(
        l ->
            table.row(
                l.code(),
                l.received().type(),
                l.state().words(),
                l.received().count(),
                l.measured(),
                l.placed(),
                l.left(),
                l.received().location()));
    session.list(Json.list(lots.stream().map(LotShow::json).toList()), table, "lot.none");
    return 0;
  }
}
