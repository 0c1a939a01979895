package lodebook.db.book;

import static lodebook.db.tables.Tables.CHAIN_HEAD;
import static lodebook.db.tables.Tables.COUNTER;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.time.temporal.ChronoUnit;
import java.util.List;
import java.util.function.Consumer;
import java.util.stream.Stream;
import lodebook.db.chain.LineText;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import org.jooq.DSLContext;
import org.jooq.impl.DSL;

/// Makes a new book. An embedded one is made under another name and renamed at the end, so that a
/// half-made book never stands where a book should.
final class Creation {
  private static final List<String> OURS =
      List.of("turn.lock", "turn.next", "turn.who", "new.mv.db", FileSize.NOTE);

  private Creation() {}

  static void create(BookAddress address, Visit visit, Consumer<Writing> first) {
    make(address, visit, book -> begin(book, first));
  }

  /// Makes the tables and lets somebody fill them.
  static void make(BookAddress address, Visit visit, Consumer<Book> fill) {
    switch (address) {
      case BookAddress.Folder folder -> makeFolder(folder, visit, fill);
      case BookAddress.Server server -> makeSchema(server, visit, fill);
    }
  }

  private static void makeFolder(BookAddress.Folder folder, Visit visit, Consumer<Book> fill) {
    FileSystems.refuseNetwork(folder);
    try {
      Files.createDirectories(folder.path());
      refuseIfUsed(folder);
      try (Turn _ = Turn.take(folder, visit)) {
        refuseIfUsed(folder);
        Path made = folder.path().resolve("new.mv.db");
        Files.deleteIfExists(made);
        try {
          fillNew(folder, visit, fill);
          Files.move(made, folder.file(), StandardCopyOption.ATOMIC_MOVE);
        } finally {
          Files.deleteIfExists(made);
        }
      }
    } catch (IOException failure) {
      throw Refusal.cannotOpen("book.not-made", folder.shown(), failure.toString())
          .because(failure);
    }
  }

  private static void fillNew(BookAddress.Folder folder, Visit visit, Consumer<Book> fill) {
    EmbeddedEngine engine = EmbeddedEngine.named(folder, "new");
    Generation.migrate(engine);
    try (Book book = new Book(folder, visit, engine, null)) {
      fill.accept(book);
    }
  }

  private static void refuseIfUsed(BookAddress.Folder folder) throws IOException {
    if (Files.exists(folder.file())) {
      throw Refusal.refused("book.exists", folder.shown())
          .remedy("lodebook book info --book " + folder.shown());
    }
    try (Stream<Path> inside = Files.list(folder.path())) {
      if (inside.anyMatch(p -> !OURS.contains(String.valueOf(p.getFileName())))) {
        throw Refusal.refused("book.folder-not-empty", folder.shown())
            .remedy("lodebook book create --book NEW-FOLDER");
      }
    }
  }

  private static void makeSchema(BookAddress.Server server, Visit visit, Consumer<Book> fill) {
    Engine engine = new ServerEngine(server, System.getenv("PGPASSWORD"));
    try (Book book = new Book(server, visit, engine, null)) {
      if (!book.read(Creation::tables).isEmpty()) {
        throw Refusal.refused("book.schema-not-empty", server.url());
      }
      try {
        Generation.migrate(engine);
        fill.accept(book);
      } catch (RuntimeException failure) {
        book.unchained(
            sql ->
                tables(sql).forEach(table -> sql.dropTable(DSL.name(table)).cascade().execute()));
        throw failure;
      }
    }
  }

  private static List<String> tables(DSLContext sql) {
    return sql.select(DSL.field("table_name", String.class))
        .from("information_schema.tables")
        .where("table_schema = current_schema()")
        .fetch(r -> r.value1());
  }

  private static void begin(Book book, Consumer<Writing> first) {
    Visit visit = book.visit();
    book.unchained(
        sql -> {
          sql.insertInto(CHAIN_HEAD)
              .set(CHAIN_HEAD.ID, 1L)
              .set(CHAIN_HEAD.SEQUENCE, 0L)
              .set(CHAIN_HEAD.HASH, LineText.START)
              .set(CHAIN_HEAD.NEXT_ID, 1L)
              .set(CHAIN_HEAD.GENERATION, Generation.CURRENT)
              .set(CHAIN_HEAD.REVISION, 0L)
              .set(CHAIN_HEAD.BOOK_NAME, nameOf(book.address()))
              .set(CHAIN_HEAD.CREATED_AT, visit.clock().instant().truncatedTo(ChronoUnit.MICROS))
              .execute();
          for (String prefix : List.of("S", "N")) {
            sql.insertInto(COUNTER)
                .set(COUNTER.PREFIX, prefix)
                .set(COUNTER.NEXT_NUMBER, 1L)
                .execute();
          }
        });
    book.run(Act.by(null), Permission.CREATE_BOOK, "book create", first);
  }

  private static String nameOf(BookAddress address) {
    return switch (address) {
      case BookAddress.Folder folder -> String.valueOf(folder.path().getFileName());
      case BookAddress.Server server -> {
        String path = server.url().split("\\?", 2)[0];
        yield path.substring(path.lastIndexOf('/') + 1);
      }
    };
  }
}
