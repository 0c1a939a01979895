package lodebook.ui.cli;

import lodebook.db.people.People;
import lodebook.db.rights.Person;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Ends a person's signing.
@Command(
    name = "retire",
    description = "Say that a person signs no more; what was signed stays.",
    footer = {"", "Example:", "  lodebook person retire CD"})
final class PersonRetire extends Verb {
  @Parameters(paramLabel = "INITIALS", description = "who")
  private String initials = "";

  PersonRetire(Session session) {
    super(session);
  }

  @Override
  int run() {
    Person person = session.write(book -> new People(book).retire(session.act(), initials));
    session.done("person.retired-now", person.initials(), person.name());
    session.next("lodebook person list");
    return 0;
  }
}
