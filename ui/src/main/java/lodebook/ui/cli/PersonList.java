package lodebook.ui.cli;

import java.util.List;
import lodebook.db.people.People;
import lodebook.db.rights.Person;
import picocli.CommandLine.Command;

/// Lists the people of the shop.
@Command(
    name = "list",
    description = "List the people of the shop and their roles.",
    footer = {"", "Example:", "  lodebook person list"})
final class PersonList extends Verb {
  PersonList(Session session) {
    super(session);
  }

  @Override
  int run() {
    List<Person> people = session.read(book -> new People(book).list());
    Table table = new Table("INITIALS", "NAME", "ROLE", "");
    people.forEach(
        p -> table.row(p.initials(), p.name(), p.role().word(), p.retired() ? "retired" : ""));
    session.list(Json.list(people.stream().map(PersonList::json).toList()), table, "person.none");
    return 0;
  }

  private static Json json(Person person) {
    return Json.object()
        .put("initials", person.initials())
        .put("name", person.name())
        .put("role", person.role().word())
        .put("retired", person.retired());
  }
}
