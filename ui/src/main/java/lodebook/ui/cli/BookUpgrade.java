package lodebook.ui.cli;

import java.nio.file.Path;
import java.time.LocalDate;
import lodebook.db.book.BookAddress;
import lodebook.db.keep.Upgrading;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/// Brings an older book to this program.
@Command(
    name = "upgrade",
    description = "Bring an older book to this program, after a backup; needs a lead.",
    footer = {"", "Example:", "  lodebook book upgrade --backup before.zip"})
final class BookUpgrade extends Verb {
  @Option(
      names = "--backup",
      paramLabel = "FILE",
      description = "a new file for the backup (else one beside the book)")
  private @Nullable Path backup;

  BookUpgrade(Session session) {
    super(session);
  }

  @Override
  int run() {
    BookAddress address = session.address();
    Path file = backup == null ? beside(address) : backup;
    Upgrading.upgrade(address, session.visit(), session.act(), file);
    session.done("book.upgraded", address.shown(), file);
    session.tellBook(address);
    session.next("lodebook book verify");
    return 0;
  }

  private Path beside(BookAddress address) {
    String name = "before-upgrade-" + LocalDate.now(session.around().clock()) + ".zip";
    return address instanceof BookAddress.Folder folder
        ? folder.path().resolveSibling(folder.path().getFileName() + "-" + name)
        : Path.of(name);
  }
}
