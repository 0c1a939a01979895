package lodebook.ui.process;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.LocalDate;
import java.time.ZoneOffset;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.BookAddress;
import lodebook.db.book.Visit;
import lodebook.db.history.Histories;
import lodebook.db.meters.Meter;
import lodebook.db.meters.MeterKind;
import lodebook.db.meters.Meters;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/// What an operation returned from is in the file, though the book is still open: a copy of the
/// file at that moment is what a kill would leave.
class AnsweredIsKeptTest {
  private static final Visit VISIT = new Visit("BENCH-1", "test", Clock.system(ZoneOffset.UTC));

  @TempDir Path folder;

  @Test
  void everyOperationOfABurst() throws Exception {
    Station station = Station.open(folder);
    Path file = station.book().resolve("book.mv.db");
    for (int burst = 0; burst < 4; burst++) {
      Aged.byAnHour(file);
      try (Book book = Book.open(new BookAddress.Folder(station.book()), VISIT)) {
        int lines = new Histories(book).list(null).size();
        for (int i = 1; i <= 8; i++) {
          new Meters(book).add(Act.by("AB"), meter("M-" + burst + "-" + i));
          assertEquals(lines + i, linesAfterKill(file), "operation " + i + " of burst " + burst);
        }
      }
    }
  }

  private static Meter meter(String code) {
    return new Meter(code, MeterKind.FIELD, 0.01, 0.0, 0.0, LocalDate.parse("2099-12-31"), false);
  }

  private int linesAfterKill(Path file) throws Exception {
    Path left = Files.createTempDirectory(folder, "left");
    Files.copy(file, left.resolve("book.mv.db"));
    try (Book book = Book.open(new BookAddress.Folder(left), VISIT)) {
      return new Histories(book).list(null).size();
    }
  }
}
