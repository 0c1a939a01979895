package lodebook.ui.cli;

import lodebook.db.units.GearUnit;
import lodebook.db.units.Units;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Records that a gear came back.
@Command(
    name = "return",
    description = "Record that a gear came back, and with which complaint.",
    footer = {
      "",
      "Example:",
      "  lodebook unit return U-0001 --complaint \"slips at half the torque\""
    })
final class UnitReturn extends Verb {
  @Parameters(paramLabel = "UNIT", description = "its number")
  private String code = "";

  @Option(
      names = "--complaint",
      paramLabel = "TEXT",
      required = true,
      description = "what the customer says")
  private String complaint = "";

  UnitReturn(Session session) {
    super(session);
  }

  @Override
  int run() {
    GearUnit unit = session.write(book -> new Units(book).takeBack(session.act(), code, complaint));
    session.done("unit.returned", unit.code());
    session.next("lodebook trace " + unit.code());
    return 0;
  }
}
