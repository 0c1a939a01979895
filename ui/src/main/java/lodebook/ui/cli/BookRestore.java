package lodebook.ui.cli;

import java.nio.file.Path;
import lodebook.db.book.BookAddress;
import lodebook.db.keep.Head;
import lodebook.db.keep.Restore;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/// Makes a book from a backup.
@Command(
    name = "restore",
    description = "Make the book from a backup, only where nothing is; needs a lead.",
    footer = {"", "Example:", "  lodebook book restore book-2026-12-01.zip --book ~/shop/new"})
final class BookRestore extends Verb {
  @Parameters(paramLabel = "FILE", description = "a backup")
  private Path file = Path.of("book.zip");

  BookRestore(Session session) {
    super(session);
  }

  @Override
  int run() {
    BookAddress address = session.address();
    Head head = Restore.restore(file, address, session.visit(), session.act());
    session.done("book.restored", address.shown(), head);
    session.tellBook(address);
    session.next("lodebook book verify");
    return 0;
  }
}
