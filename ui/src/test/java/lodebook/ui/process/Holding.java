package lodebook.ui.process;

import java.nio.file.Path;
import java.time.Clock;
import java.time.ZoneOffset;
import lodebook.db.book.Book;
import lodebook.db.book.BookAddress;
import lodebook.db.book.Visit;

/// A process that keeps a book open until its input ends.
public final class Holding {
  private Holding() {}

  /// @param args the book's folder
  public static void main(String[] args) throws Exception {
    Visit visit = new Visit("BENCH-2", "piece import", Clock.system(ZoneOffset.UTC));
    try (Book book = Book.open(new BookAddress.Folder(Path.of(args[0])), visit)) {
      System.out.println(AtTheGate.READY + " " + book.address().shown());
      while (System.in.read() >= 0) {
        Thread.onSpinWait();
      }
    }
  }
}
