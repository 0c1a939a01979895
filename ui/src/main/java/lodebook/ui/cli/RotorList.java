package lodebook.ui.cli;

import java.util.List;
import lodebook.db.builds.Rotor;
import lodebook.db.builds.Rotors;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;

/// Lists the rotors.
@Command(
    name = "list",
    description = "List the rotors and how far they are.",
    footer = {"", "Example:", "  lodebook rotor list"})
final class RotorList extends Verb {

  RotorList(Session session) {
    super(session);
  }

  @Override
  int run() {
    List<Rotor> rotors = session.read(book -> new Rotors(book).list());
    Table table =
        new Table("ROTOR", "LAYOUT", "STATE", ">FILLED", "PLAN", "SURVEY", "BATCH", "UNIT");
    rotors.forEach(
        r ->
            table.row(
                r.code(),
                r.layout(),
                r.state(),
                r.filled() + "/" + r.slots(),
                r.planned() ? "yes" : "-",
                dash(r.latestSurvey()),
                dash(r.batch()),
                dash(r.unit())));
    session.list(Json.list(rotors.stream().map(RotorShow::json).toList()), table, "rotor.none");
    return 0;
  }

  static String dash(@Nullable String text) {
    return text == null ? "-" : text;
  }
}
