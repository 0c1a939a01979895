package lodebook.db.book;

import static lodebook.db.tables.Tables.CHAIN_HEAD;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.function.Consumer;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import org.jooq.DSLContext;

/// Bringing a book of an older generation to the current one.
///
/// An embedded book is copied aside, the copy is migrated and checked, and only then it takes the
/// place of the old one, which stays beside it as `before-N.mv.db`. A server's book is migrated in
/// place: PostgreSQL takes a failed migration back as a whole.
public final class Upgrade {
  private Upgrade() {}

  /// Upgrades a book; refused where it is current or newer already.
  ///
  /// @param backup writes a backup of the book as it is, before anything is changed
  /// @param check throws if the migrated book is not whole
  public static void run(
      BookAddress address, Visit visit, Act act, Consumer<Book> backup, Consumer<Book> check) {
    long before;
    try (Book book = Opening.unchecked(address, visit)) {
      before = book.read(Upgrade::generation);
      if (before == Generation.CURRENT) {
        throw Refusal.refused("upgrade.current", before).remedy("lodebook book info");
      }
      if (before > Generation.CURRENT) {
        Opening.checkGeneration(before);
      }
      book.read(sql -> lead(sql, act));
      backup.accept(book);
    }
    switch (address) {
      case BookAddress.Folder folder -> aside(folder, visit, act, before, check);
      case BookAddress.Server server -> {
        ServerEngine engine = new ServerEngine(server, System.getenv("PGPASSWORD"));
        try (Book book = new Book(server, visit, engine, null)) {
          migrate(engine, book, act, before, check);
        }
      }
    }
  }

  private static long generation(DSLContext sql) {
    return sql.select(CHAIN_HEAD.GENERATION).from(CHAIN_HEAD).fetchSingle().value1();
  }

  private static boolean lead(DSLContext sql, Act act) {
    var person = Signature.signing(sql, act.by(), Permission.LEAD);
    if (person == null || !Permission.LEAD.allows(person.role())) {
      throw Refusal.refused(
              "role.not-permitted",
              person == null ? "" : person.initials(),
              person == null ? "" : person.role().word(),
              "book upgrade",
              Permission.LEAD.words())
          .remedy("lodebook person list");
    }
    return true;
  }

  private static void aside(
      BookAddress.Folder folder, Visit visit, Act act, long before, Consumer<Book> check) {
    Path copy = folder.path().resolve("new.mv.db");
    try (Turn _ = Turn.take(folder, visit)) {
      Files.copy(folder.file(), copy, StandardCopyOption.REPLACE_EXISTING);
      try {
        EmbeddedEngine engine = EmbeddedEngine.named(folder, "new");
        try (Book book = new Book(folder, visit, engine, null)) {
          migrate(engine, book, act, before, check);
        }
        Path kept = folder.path().resolve("before-" + Generation.CURRENT + ".mv.db");
        Files.copy(folder.file(), kept, StandardCopyOption.REPLACE_EXISTING);
        Files.move(copy, folder.file(), StandardCopyOption.ATOMIC_MOVE);
      } finally {
        Files.deleteIfExists(copy);
      }
    } catch (IOException failure) {
      throw Refusal.cannotOpen("upgrade.failed", folder.shown(), failure.getMessage())
          .because(failure);
    }
  }

  private static void migrate(
      Engine engine, Book book, Act act, long before, Consumer<Book> check) {
    Generation.migrate(engine);
    book.unchained(
        sql -> sql.update(CHAIN_HEAD).set(CHAIN_HEAD.GENERATION, Generation.CURRENT).execute());
    check.accept(book);
    book.run(
        act,
        Permission.LEAD,
        "book upgrade",
        writing -> writing.line().field("from", before).field("to", Generation.CURRENT));
  }
}
