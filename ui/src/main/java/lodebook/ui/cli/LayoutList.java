package lodebook.ui.cli;

import java.util.List;
import lodebook.db.layouts.LayoutRevision;
import lodebook.db.layouts.Layouts;
import picocli.CommandLine.Command;

/// Lists the layouts.
@Command(
    name = "list",
    description = "List the layouts and their revisions.",
    footer = {"", "Example:", "  lodebook layout list"})
final class LayoutList extends Verb {

  LayoutList(Session session) {
    super(session);
  }

  @Override
  int run() {
    List<LayoutRevision> all = session.read(book -> new Layouts(book).list());
    Table table = new Table("LAYOUT", "REV", ">SLOTS", "FOCUS", "MAGNETS", "STATE");
    all.forEach(
        r ->
            table.row(
                r.layout().code(),
                r.layout().revision(),
                r.layout().slots(),
                LayoutShow.word(r.layout().focus()),
                r.layout().magnetType(),
                LayoutShow.state(r, session)));
    session.list(Json.list(all.stream().map(LayoutShow::json).toList()), table, "layout.none");
    return 0;
  }
}
