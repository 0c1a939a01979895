package lodebook.db;

import io.zonky.test.db.postgres.embedded.EmbeddedPostgres;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.Duration;
import java.time.Instant;
import java.util.EnumMap;
import java.util.Map;
import java.util.Objects;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.Consumer;
import lodebook.db.book.BookAddress;
import lodebook.db.book.Visit;
import lodebook.db.keep.NewBook;

/// The two databases, for tests: new empty places, and connections that go round the book.
public enum TestBook {
  /// H2 on a file in a temporary folder.
  EMBEDDED {
    @Override
    public BookAddress newPlace() {
      try {
        return new BookAddress.Folder(Files.createTempDirectory("lodebook-test").resolve("book"));
      } catch (IOException failure) {
        throw new UncheckedIOException(failure);
      }
    }

    @Override
    BookAddress copy(BookAddress template) {
      try {
        BookAddress.Folder place = (BookAddress.Folder) newPlace();
        Files.createDirectories(place.path());
        Files.copy(
            ((BookAddress.Folder) template).path().resolve("book.mv.db"),
            place.path().resolve("book.mv.db"));
        return place;
      } catch (IOException failure) {
        throw new UncheckedIOException(failure);
      }
    }

    @Override
    public Connection raw(BookAddress address) throws SQLException {
      Path path = ((BookAddress.Folder) address).path();
      return DriverManager.getConnection(
          "jdbc:h2:" + path.resolve("book") + ";MAX_COMPACT_TIME=0", "sa", "");
    }
  },
  /// PostgreSQL, one server for all tests, a database for each book, sorted by ICU's rules.
  SERVER {
    @Override
    public BookAddress newPlace() {
      return make("template0 encoding 'UTF8' locale_provider icu icu_locale 'de'");
    }

    @Override
    BookAddress copy(BookAddress template) {
      String url = ((BookAddress.Server) template).url();
      return make(url.substring(url.lastIndexOf('/') + 1, url.indexOf('?')));
    }

    private BookAddress make(String template) {
      String name = "book" + Server.NUMBER.incrementAndGet();
      try (Connection connection = Server.RUNNING.getPostgresDatabase().getConnection();
          Statement statement = connection.createStatement()) {
        statement.execute("create database " + name + " template " + template);
      } catch (SQLException failure) {
        throw new IllegalStateException(failure);
      }
      return BookAddress.of(
          "jdbc:postgresql://localhost:%d/%s?user=postgres"
              .formatted(Server.RUNNING.getPort(), name));
    }

    @Override
    public Connection raw(BookAddress address) throws SQLException {
      return DriverManager.getConnection(((BookAddress.Server) address).url());
    }
  };

  /// A place where a book can be made.
  public abstract BookAddress newPlace();

  abstract BookAddress copy(BookAddress template);

  /// A new book that nobody has signed yet.
  public BookAddress newBook() {
    return copy(Objects.requireNonNull(Templates.EMPTY.get(this)));
  }

  /// A new book of a shop: people LE (lead), IN (inspector), PL (planner) and BE (bench), meter
  /// GM-1, type BLK-4-4-10 and lot L-1 of 60, accepted.
  public BookAddress newShop() {
    return copy(Objects.requireNonNull(Templates.SHOP.get(this)));
  }

  /// A connection to a book's tables that knows nothing of its rules.
  public abstract Connection raw(BookAddress address) throws SQLException;

  /// The time at which tests begin.
  public static final Instant START = Instant.parse("2026-05-04T08:00:00Z");

  /// A visit from station BENCH-1 whose clock rises by a second with each look.
  public static Visit visit() {
    return visit(START);
  }

  /// A visit whose clock begins at a time.
  public static Visit visit(Instant start) {
    AtomicLong seconds = new AtomicLong();
    return new Visit(
        "BENCH-1",
        "a test",
        () -> start.plusSeconds(seconds.getAndIncrement()),
        Duration.ofSeconds(10));
  }

  private static final class Templates {
    static final Map<TestBook, BookAddress> EMPTY = each(address -> {});
    static final Map<TestBook, BookAddress> SHOP = each(TestShop::open);

    private static Map<TestBook, BookAddress> each(Consumer<BookAddress> fill) {
      Map<TestBook, BookAddress> templates = new EnumMap<>(TestBook.class);
      for (TestBook database : values()) {
        BookAddress place = database.newPlace();
        NewBook.create(place, visit());
        fill.accept(place);
        templates.put(database, place);
      }
      return templates;
    }
  }

  private static final class Server {
    static final AtomicLong NUMBER = new AtomicLong();
    static final EmbeddedPostgres RUNNING = start();

    private static EmbeddedPostgres start() {
      try {
        return EmbeddedPostgres.builder().start();
      } catch (IOException failure) {
        throw new UncheckedIOException(failure);
      }
    }
  }
}
