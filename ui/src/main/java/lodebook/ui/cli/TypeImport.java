package lodebook.ui.cli;

import java.nio.file.Path;
import lodebook.assembly.magnet.MagnetType;
import lodebook.db.stock.MagnetTypes;
import lodebook.ui.files.Example;
import lodebook.ui.files.Rows;
import lodebook.ui.files.TypeFile;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Takes in magnet types.
@Command(
    name = "import",
    description = "Take in magnet types.",
    footer = {"", "Example:", "  lodebook type import types.csv"})
final class TypeImport extends FileVerb {
  @Parameters(arity = "0..1", paramLabel = "FILE", description = "a CSV file")
  private @Nullable Path file;

  TypeImport(Session session) {
    super(session, Example.TYPES);
  }

  @Override
  int takeIn() {
    Rows<MagnetType> rows = TypeFile.read(session.source(need(file, "FILE")));
    importing(
        rows,
        () -> session.change(book -> new MagnetTypes(book).importTypes(session.act(), rows.all())));
    session.done("type.imported", rows.count());
    session.next("lodebook lot import lots.csv");
    return 0;
  }
}
