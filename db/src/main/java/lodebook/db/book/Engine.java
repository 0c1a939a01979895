package lodebook.db.book;

import java.sql.Connection;
import java.sql.SQLException;
import org.flywaydb.core.api.configuration.FluentConfiguration;
import org.jooq.SQLDialect;

/// What differs between the two databases.
interface Engine {
  /// A new connection; refuses with a sentence where there is none.
  Connection connect();

  /// The dialect of its SQL.
  SQLDialect dialect();

  /// Points the migrations at the database.
  FluentConfiguration migrations(FluentConfiguration flyway);

  /// Makes sure that what was committed is on the disk.
  void settle(Connection connection) throws SQLException;

  /// Prepares a connection for a read that sees one state of the book.
  void beginReading(Connection connection) throws SQLException;

  /// Prepares a connection for a write.
  void beginWriting(Connection connection) throws SQLException;

  /// Closes the last connection of a visit.
  ///
  /// @param written whether the visit wrote anything
  default void leave(Connection connection, boolean written) throws SQLException {
    connection.close();
  }
}
