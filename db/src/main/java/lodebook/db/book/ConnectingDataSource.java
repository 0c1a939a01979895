package lodebook.db.book;

import java.io.PrintWriter;
import java.sql.Connection;
import java.sql.SQLFeatureNotSupportedException;
import java.util.function.Supplier;
import java.util.logging.Logger;
import javax.sql.DataSource;
import org.jspecify.annotations.Nullable;

/// A data source that makes its connections in one given way.
final class ConnectingDataSource implements DataSource {
  private final Supplier<Connection> connect;

  ConnectingDataSource(Supplier<Connection> connect) {
    this.connect = connect;
  }

  @Override
  public Connection getConnection() {
    return connect.get();
  }

  @Override
  public Connection getConnection(String user, String password) {
    return connect.get();
  }

  @Override
  public @Nullable PrintWriter getLogWriter() {
    return null;
  }

  @Override
  public void setLogWriter(@Nullable PrintWriter out) {
    // there is no log
  }

  @Override
  public void setLoginTimeout(int seconds) {
    // the address says how long to wait
  }

  @Override
  public int getLoginTimeout() {
    return 0;
  }

  @Override
  public Logger getParentLogger() throws SQLFeatureNotSupportedException {
    throw new SQLFeatureNotSupportedException();
  }

  @Override
  public <T> T unwrap(Class<T> type) {
    return type.cast(this);
  }

  @Override
  public boolean isWrapperFor(Class<?> type) {
    return type.isInstance(this);
  }
}
