package lodebook.db.keep;

import lodebook.assembly.magnet.GradeTable;
import lodebook.db.book.Book;
import lodebook.db.book.BookAddress;
import lodebook.db.book.Visit;
import lodebook.db.stock.Grades;

/// Making a new book.
public final class NewBook {
  private NewBook() {}

  /// Makes a new book that knows the usual grades, only where nothing is.
  public static void create(BookAddress address, Visit visit) {
    Book.create(address, visit, writing -> Grades.insert(writing, GradeTable.all()));
  }
}
