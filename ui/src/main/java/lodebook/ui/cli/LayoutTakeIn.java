package lodebook.ui.cli;

import java.nio.file.Path;
import java.util.List;
import lodebook.assembly.layout.Layout;
import lodebook.db.layouts.Layouts;
import lodebook.ui.files.Documents;
import lodebook.ui.files.Example;
import lodebook.ui.files.LayoutFile;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Takes in the layouts of rings as drafts.
@Command(
    name = "import",
    description = "Take in the layout of a ring as a draft.",
    footer = {"", "Example:", "  lodebook layout import layout.json"})
final class LayoutTakeIn extends FileVerb {
  @Parameters(arity = "0..1", paramLabel = "FILE", description = "a JSON file")
  private @Nullable Path file;

  LayoutTakeIn(Session session) {
    super(session, Example.LAYOUT);
  }

  @Override
  int takeIn() {
    Documents<Layout> read = LayoutFile.read(session.source(need(file, "FILE")));
    List<Layout> layouts = read.all();
    importing(
        read, () -> session.change(book -> new Layouts(book).importDrafts(session.act(), layouts)));
    List<String> names = layouts.stream().map(LayoutShow::shown).toList();
    session.done("layout.imported", String.join(", ", names), names.size());
    session.next("lodebook layout release " + layouts.getFirst().code());
    return 0;
  }
}
