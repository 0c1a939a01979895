package lodebook.db.book;

import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.Properties;
import lodebook.db.refusal.Refusal;
import org.flywaydb.core.api.configuration.FluentConfiguration;
import org.jooq.SQLDialect;
import org.jspecify.annotations.Nullable;

/// A PostgreSQL server. The password comes from PGPASSWORD, or from a pgpass file by the driver.
final class ServerEngine implements Engine {
  private final BookAddress.Server server;
  private final @Nullable String password;

  ServerEngine(BookAddress.Server server, @Nullable String password) {
    this.server = server;
    this.password = password;
  }

  @Override
  public Connection connect() {
    Properties properties = new Properties();
    if (password != null) {
      properties.setProperty("password", password);
    }
    properties.setProperty("connectTimeout", "10");
    properties.setProperty("ApplicationName", "lodebook");
    properties.setProperty("reWriteBatchedInserts", "true");
    try {
      Connection connection = DriverManager.getConnection(server.url(), properties);
      try (Statement statement = connection.createStatement()) {
        statement.execute("set lock_timeout = '10s'");
      }
      return connection;
    } catch (SQLException failure) {
      throw Refusal.cannotOpen("server.unreachable", server.url(), Sql.firstLine(failure))
          .because(failure);
    }
  }

  @Override
  public SQLDialect dialect() {
    return SQLDialect.POSTGRES;
  }

  @Override
  public FluentConfiguration migrations(FluentConfiguration flyway) {
    return flyway.dataSource(new ConnectingDataSource(this::connect));
  }

  @Override
  public void settle(Connection connection) {
    // the server syncs at commit
  }

  @Override
  public void beginReading(Connection connection) throws SQLException {
    connection.setAutoCommit(false);
    connection.setTransactionIsolation(Connection.TRANSACTION_REPEATABLE_READ);
    connection.setReadOnly(true);
  }

  @Override
  public void beginWriting(Connection connection) throws SQLException {
    connection.setAutoCommit(false);
    connection.setTransactionIsolation(Connection.TRANSACTION_READ_COMMITTED);
    connection.setReadOnly(false);
  }
}
