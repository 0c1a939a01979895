package lodebook.db.keep;

import java.nio.file.Path;
import lodebook.db.book.Act;
import lodebook.db.book.BookAddress;
import lodebook.db.book.Upgrade;
import lodebook.db.book.Visit;
import lodebook.db.refusal.Refusal;
import lodebook.db.refusal.Sentences;

/// Bringing a book to this program's generation of tables.
public final class Upgrading {
  private Upgrading() {}

  /// Writes a backup, migrates a copy, verifies it and lets it take the book's place. Only a lead
  /// may, and never does it happen by itself.
  ///
  /// @param backup a new file for the backup
  public static void upgrade(BookAddress address, Visit visit, Act act, Path backup) {
    Upgrade.run(
        address,
        visit,
        act,
        book -> new Backup(book).write(backup),
        book -> {
          var faults = Verification.of(book, null).faults();
          if (!faults.isEmpty()) {
            throw Refusal.cannotOpen(
                "upgrade.failed", address.shown(), Sentences.english().say(faults.getFirst()));
          }
        });
  }
}
