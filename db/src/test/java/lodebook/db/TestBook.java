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
import java.util.concurrent.atomic.AtomicLong;
import lodebook.db.book.BookAddress;
import lodebook.db.book.Visit;

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
    public Connection raw(BookAddress address) throws SQLException {
      Path path = ((BookAddress.Folder) address).path();
      return DriverManager.getConnection("jdbc:h2:" + path.resolve("book"), "sa", "");
    }
  },
  /// PostgreSQL, one server for all tests, a database for each book, sorted by ICU's rules.
  SERVER {
    @Override
    public BookAddress newPlace() {
      String name = "book" + Server.NUMBER.incrementAndGet();
      try (Connection connection = Server.RUNNING.getPostgresDatabase().getConnection();
          Statement statement = connection.createStatement()) {
        statement.execute(
            "create database "
                + name
                + " template template0 encoding 'UTF8' locale_provider icu icu_locale 'de'");
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
