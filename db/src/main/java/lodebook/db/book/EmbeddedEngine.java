package lodebook.db.book;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.sql.Statement;
import lodebook.db.refusal.Refusal;
import org.flywaydb.core.api.configuration.FluentConfiguration;
import org.jooq.SQLDialect;

/// H2 in this process, on a file. Whoever uses it has the [Turn].
///
/// The engine never moves the parts of a file about, neither when it closes a book nor in the
/// background: version 2.3.232 can list a part twice when it does, and the file then doesn't open
/// again. Space is given back by copying what is live to a new file, which takes the old one's
/// place.
final class EmbeddedEngine implements Engine {
  private static final String FLAGS =
      ";WRITE_DELAY=0;LOCK_TIMEOUT=10000;DB_CLOSE_ON_EXIT=FALSE;TRACE_LEVEL_FILE=0"
          + ";MAX_COMPACT_TIME=0;AUTO_COMPACT_FILL_RATE=0";

  private final BookAddress.Folder folder;
  private final String url;
  private final FileSize size;

  private EmbeddedEngine(BookAddress.Folder folder, String name, String mode, FileSize size) {
    this.folder = folder;
    Path file = folder.path().resolve(name);
    this.url = "jdbc:h2:retry:" + file.toString().replace('\\', '/') + FLAGS + mode;
    this.size = size;
  }

  /// The book of a folder, which must be there.
  static EmbeddedEngine existing(BookAddress.Folder folder) {
    FileSize size = FileSize.of(folder, folder.file());
    return new EmbeddedEngine(folder, "book", ";IFEXISTS=TRUE", size);
  }

  /// A database `NAME.mv.db` in a folder, made if it isn't there.
  static EmbeddedEngine named(BookAddress.Folder folder, String name) {
    FileSize size = FileSize.of(folder, folder.path().resolve(name + ".mv.db"));
    return new EmbeddedEngine(folder, name, "", size);
  }

  @Override
  public Connection connect() {
    try {
      return DriverManager.getConnection(url, "sa", "");
    } catch (SQLException failure) {
      throw Refusal.cannotOpen("book.unreadable", folder.shown(), Sql.firstLine(failure))
          .because(failure)
          .remedy("lodebook book restore BACKUP --book NEW-FOLDER");
    }
  }

  @Override
  public SQLDialect dialect() {
    return SQLDialect.H2;
  }

  @Override
  public FluentConfiguration migrations(FluentConfiguration flyway) {
    return flyway.dataSource(url, "sa", "");
  }

  @Override
  public void settle(Connection connection) throws SQLException {
    try (Statement statement = connection.createStatement()) {
      statement.execute("checkpoint sync");
    }
  }

  @Override
  public void beginReading(Connection connection) throws SQLException {
    connection.setAutoCommit(false);
  }

  @Override
  public void beginWriting(Connection connection) throws SQLException {
    connection.setAutoCommit(false);
  }

  @Override
  public void leave(Connection connection, boolean written) throws SQLException {
    if (written && size.grownTooFar()) {
      compact(connection);
    }
    connection.close();
  }

  /// Copies what is live to a new file, which takes the book's place once it is synced. Everything
  /// written was synced before, so a copy that fails (a full disk) costs nothing but space.
  private void compact(Connection connection) {
    try (Statement statement = connection.createStatement()) {
      statement.execute("shutdown compact");
      size.note();
    } catch (SQLException notCompacted) {
      size.forget();
    }
  }
}
