package lodebook.ui.cli;

import java.util.List;
import lodebook.db.stock.Piece;
import lodebook.db.stock.Pieces;
import lodebook.ui.words.Amounts;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Lists the numbered pieces of a lot.
@Command(
    name = "list",
    description = "List the numbered pieces of a lot.",
    footer = {"", "Example:", "  lodebook piece list L-2404"})
final class PieceList extends Verb {
  @Parameters(paramLabel = "LOT", description = "number of the lot")
  private String lot = "";

  PieceList(Session session) {
    super(session);
  }

  @Override
  int run() {
    List<Piece> pieces = session.read(book -> new Pieces(book).list(lot));
    Table table = new Table("PIECE", "STATE", ">Br mT", ">+-", "TRAY", "CELL", "STANDS", "PLANNED");
    pieces.forEach(
        p ->
            table.row(
                p.name(),
                p.state().word(),
                p.strength() == null ? "-" : Amounts.milliTesla(p.strength().remanenceTesla()),
                p.strength() == null
                    ? "-"
                    : Amounts.milliTesla(p.strength().standardUncertaintyTesla()),
                p.lies() == null ? "-" : p.lies().tray(),
                p.lies() == null ? "-" : p.lies().cell(),
                slot(p.stands()),
                slot(p.planned())));
    session.list(Json.list(pieces.stream().map(PieceShow::json).toList()), table, "piece.none");
    return 0;
  }

  static String slot(Piece.@Nullable Slot slot) {
    return slot == null ? "-" : slot.rotor() + " slot " + slot.slot();
  }
}
