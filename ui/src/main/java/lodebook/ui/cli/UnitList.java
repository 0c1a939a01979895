package lodebook.ui.cli;

import java.util.List;
import lodebook.db.units.GearUnit;
import lodebook.db.units.Units;
import lodebook.ui.words.Amounts;
import picocli.CommandLine.Command;

/// Lists the gears.
@Command(
    name = "list",
    description = "List the gears.",
    footer = {"", "Example:", "  lodebook unit list"})
final class UnitList extends Verb {

  UnitList(Session session) {
    super(session);
  }

  @Override
  int run() {
    List<GearUnit> units = session.read(book -> new Units(book).list());
    Table table = new Table("UNIT", "GEAR", "STATE", "BATCH", "ASSEMBLED");
    units.forEach(
        u ->
            table.row(
                u.code(),
                u.gear(),
                u.state(),
                RotorList.dash(u.batch()),
                Amounts.minute(u.assembledAt(), session.zone())));
    session.list(Json.list(units.stream().map(UnitShow::json).toList()), table, "unit.none");
    return 0;
  }
}
