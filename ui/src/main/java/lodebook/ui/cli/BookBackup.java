package lodebook.ui.cli;

import java.nio.file.Path;
import lodebook.db.keep.Backup;
import lodebook.db.keep.Head;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Writes a backup.
@Command(
    name = "backup",
    description = "Write the whole book into one new file, while others go on working.",
    footer = {"", "Example:", "  lodebook book backup book-2026-12-01.zip"})
final class BookBackup extends Verb {
  @Parameters(paramLabel = "FILE", description = "a new file")
  private Path file = Path.of("book.zip");

  BookBackup(Session session) {
    super(session);
  }

  @Override
  int run() {
    Head head = session.read(book -> new Backup(book).write(file));
    session.done("book.backed-up", file, head);
    session.next("lodebook book verify --expect-head " + head);
    return 0;
  }
}
