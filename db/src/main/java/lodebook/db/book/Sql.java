package lodebook.db.book;

import java.sql.Connection;
import java.sql.SQLException;
import org.jooq.DSLContext;
import org.jooq.SQLDialect;
import org.jooq.conf.RenderQuotedNames;
import org.jooq.conf.Settings;
import org.jooq.impl.DSL;

/// SQL that reads the same on both databases: names unquoted and without a schema.
final class Sql {
  private Sql() {}

  /// What the database says went wrong, without what follows.
  static String firstLine(SQLException failure) {
    return String.valueOf(failure.getMessage()).lines().findFirst().orElse("?");
  }

  static DSLContext on(Connection connection, SQLDialect dialect) {
    Settings settings =
        new Settings()
            .withRenderQuotedNames(RenderQuotedNames.EXPLICIT_DEFAULT_UNQUOTED)
            .withRenderSchema(false)
            .withExecuteLogging(false);
    return DSL.using(connection, dialect, settings);
  }
}
