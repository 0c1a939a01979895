package lodebook.db.book;

import static lodebook.db.tables.Tables.CHAIN_HEAD;

import java.nio.file.Files;
import lodebook.db.refusal.Refusal;
import org.jooq.exception.DataAccessException;
import org.jspecify.annotations.Nullable;

/// Opens a book and looks whether this program may use it.
final class Opening {
  private Opening() {}

  static Book open(BookAddress address, Visit visit) {
    Book book = unchecked(address, visit);
    try {
      checkGeneration(generation(book));
      return book;
    } catch (RuntimeException failure) {
      try (book) {
        throw failure;
      }
    }
  }

  /// Opens a book of whatever generation.
  static Book unchecked(BookAddress address, Visit visit) {
    return switch (address) {
      case BookAddress.Folder folder -> embedded(folder, visit);
      case BookAddress.Server server ->
          new Book(server, visit, new ServerEngine(server, System.getenv("PGPASSWORD")), null);
    };
  }

  private static Book embedded(BookAddress.Folder folder, Visit visit) {
    if (!Files.isRegularFile(folder.file())) {
      throw Refusal.cannotOpen("book.none", folder.shown())
          .remedy("lodebook book create --book " + folder.shown());
    }
    FileSystems.refuseNetwork(folder);
    if (!Files.isReadable(folder.file()) || !Files.isWritable(folder.file())) {
      throw Refusal.cannotOpen("book.not-writable", folder.shown());
    }
    Turn turn = Turn.take(folder, visit);
    return orGiveBack(turn, () -> new Book(folder, visit, EmbeddedEngine.existing(folder), turn));
  }

  static Book orGiveBack(@Nullable Turn turn, java.util.function.Supplier<Book> opening) {
    try {
      return opening.get();
    } catch (RuntimeException failure) {
      if (turn != null) {
        turn.close();
      }
      throw failure;
    }
  }

  private static long generation(Book book) {
    Long generation;
    try {
      generation =
          book.read(
              sql ->
                  sql.select(CHAIN_HEAD.GENERATION)
                      .from(CHAIN_HEAD)
                      .fetchOptional(CHAIN_HEAD.GENERATION)
                      .orElse(-1L));
    } catch (DataAccessException noTable) {
      throw Refusal.cannotOpen("book.none", book.address().shown())
          .because(noTable)
          .remedy("lodebook book create --book " + book.address().shown());
    }
    if (generation < 0) {
      throw Refusal.cannotOpen("book.unfinished", book.address().shown());
    }
    return generation;
  }

  static void checkGeneration(long generation) {
    if (generation > Generation.CURRENT) {
      throw Refusal.cannotOpen("book.newer", generation, Generation.CURRENT);
    }
    if (generation < Generation.CURRENT) {
      throw Refusal.cannotOpen("book.older", generation, Generation.CURRENT)
          .remedy("lodebook book upgrade");
    }
  }
}
