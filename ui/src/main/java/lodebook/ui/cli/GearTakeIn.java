package lodebook.ui.cli;

import java.nio.file.Path;
import lodebook.db.layouts.GearDraft;
import lodebook.db.layouts.Gears;
import lodebook.ui.files.Documents;
import lodebook.ui.files.Example;
import lodebook.ui.files.GearFile;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Takes in the model of a gear as a draft.
@Command(
    name = "import",
    description = "Take in the model of a gear as a draft.",
    footer = {"", "Example:", "  lodebook gear import gear.json"})
final class GearTakeIn extends FileVerb {
  @Parameters(arity = "0..1", paramLabel = "FILE", description = "a JSON file")
  private @Nullable Path file;

  GearTakeIn(Session session) {
    super(session, Example.GEAR);
  }

  @Override
  int takeIn() {
    Documents<GearDraft> read = GearFile.read(session.source(need(file, "FILE")));
    GearDraft draft = read.all().getFirst();
    importing(
        read, () -> session.change(book -> new Gears(book).importDraft(session.act(), draft)));
    session.done("gear.imported", draft.code() + " rev " + draft.revision());
    session.next("lodebook gear release " + draft.code());
    return 0;
  }
}
