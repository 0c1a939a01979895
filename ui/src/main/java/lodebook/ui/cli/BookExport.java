package lodebook.ui.cli;

import java.nio.file.Path;
import lodebook.db.keep.Backup;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Writes each table as CSV.
@Command(
    name = "export",
    description = "Write each table of the book as CSV into a new or empty folder.",
    footer = {"", "Example:", "  lodebook book export tables"})
final class BookExport extends Verb {
  @Parameters(paramLabel = "FOLDER", description = "a new or empty folder")
  private Path folder = Path.of("tables");

  BookExport(Session session) {
    super(session);
  }

  @Override
  int run() {
    session.read(
        book -> {
          new Backup(book).export(folder);
          return true;
        });
    session.done("book.exported", folder);
    session.next("lodebook book backup FILE");
    return 0;
  }
}
