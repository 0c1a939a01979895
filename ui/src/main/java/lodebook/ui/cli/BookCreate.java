package lodebook.ui.cli;

import lodebook.db.book.BookAddress;
import lodebook.db.keep.NewBook;
import picocli.CommandLine.Command;

/// Makes a new book.
@Command(
    name = "create",
    description = "Make a new, empty book that knows the usual grades.",
    footer = {"", "Example:", "  lodebook book create --book ~/shop/book"})
final class BookCreate extends Verb {

  BookCreate(Session session) {
    super(session);
  }

  @Override
  int run() {
    BookAddress address = session.address();
    NewBook.create(address, session.visit());
    session.done("book.created", address.shown());
    session.next("lodebook person add AB --name \"A. Baker\"");
    return 0;
  }
}
