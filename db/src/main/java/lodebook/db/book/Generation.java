package lodebook.db.book;

import org.flywaydb.core.Flyway;

/// The generation of the book's tables: the number of the latest migration.
public final class Generation {
  /// The generation that this program reads and writes.
  public static final long CURRENT = 5;

  private static final String FOLDER = "classpath:lodebook/db/migration";

  private Generation() {}

  /// Brings a database to the current generation.
  static void migrate(Engine engine) {
    engine
        .migrations(Flyway.configure(Generation.class.getClassLoader()))
        .locations(FOLDER)
        .loggers("slf4j")
        .load()
        .migrate();
  }
}
