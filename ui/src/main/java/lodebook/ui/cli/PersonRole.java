package lodebook.ui.cli;

import lodebook.db.people.People;
import lodebook.db.rights.Person;
import lodebook.db.rights.Role;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/// Gives a person another role.
@Command(
    name = "role",
    description = "Give a person another role.",
    footer = {"", "Example:", "  lodebook person role CD planner"})
final class PersonRole extends Verb {
  @Parameters(index = "0", paramLabel = "INITIALS", description = "who")
  private String initials = "";

  @Parameters(
      index = "1",
      arity = "0..1",
      paramLabel = "ROLE",
      description = "bench, inspector, planner or lead")
  private String word = "";

  @Option(names = "--role", paramLabel = "ROLE", description = "the same, as an option")
  private String option = "";

  PersonRole(Session session) {
    super(session);
  }

  @Override
  int run() {
    String role = word.isEmpty() ? option : word;
    if (role.isEmpty()) {
      throw wrongLine("line.missing", "ROLE");
    }
    Role asked = Roles.of(this, role);
    Person person =
        session.write(book -> new People(book).changeRole(session.act(), initials, asked));
    session.done("person.role-is", person.initials(), person.name(), person.role().word());
    session.next("lodebook person list");
    return 0;
  }
}
