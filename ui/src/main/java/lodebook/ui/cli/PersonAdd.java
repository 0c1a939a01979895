package lodebook.ui.cli;

import lodebook.db.people.People;
import lodebook.db.rights.Person;
import lodebook.db.rights.Role;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Adds a person.
@Command(
    name = "add",
    description = "Add a person; the first of a book is its lead.",
    footer = {"", "Example:", "  lodebook person add AB --name \"A. Baker\" --role inspector"})
final class PersonAdd extends Verb {
  @Parameters(paramLabel = "INITIALS", description = "how the person signs")
  private String initials = "";

  @Option(names = "--name", paramLabel = "NAME", required = true, description = "the person's name")
  private String name = "";

  @Option(names = "--role", description = "bench (default), inspector, planner or lead")
  private String role = "bench";

  PersonAdd(Session session) {
    super(session);
  }

  @Override
  int run() {
    Role asked = Roles.of(this, role);
    Person person =
        session.write(book -> new People(book).add(session.act(), initials, name, asked));
    session.done("person.added", person.initials(), person.name(), person.role().word());
    session.next("lodebook meter add METER --accuracy-percent 1 --calibration-due 2027-06-30");
    return 0;
  }
}
