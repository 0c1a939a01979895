package lodebook.db.book;

import java.nio.file.Path;
import java.util.Locale;
import lodebook.db.refusal.Refusal;

/// Where a book is.
public sealed interface BookAddress {
  /// A folder that holds the embedded database's file.
  ///
  /// @param path the folder, absolute
  record Folder(Path path) implements BookAddress {
    public Folder {
      path = path.toAbsolutePath().normalize();
    }

    /// The database's file.
    Path file() {
      return path.resolve("book.mv.db");
    }

    @Override
    public String shown() {
      return path.toString();
    }
  }

  /// A schema of a PostgreSQL server.
  ///
  /// @param url a `jdbc:postgresql:` address without a password
  record Server(String url) implements BookAddress {
    @Override
    public String shown() {
      return url;
    }
  }

  /// How people see it.
  String shown();

  /// What a person writes after `--book`: a folder or a `jdbc:postgresql:` address. An address with
  /// a password in it is refused as wrong input.
  static BookAddress of(String text) {
    if (!text.startsWith("jdbc:")) {
      return new Folder(Path.of(text));
    }
    if (!text.startsWith("jdbc:postgresql:")) {
      throw Refusal.wrongInput("address.other-database", text.split(":", 3)[1])
          .remedy("lodebook help book create");
    }
    if (text.toLowerCase(Locale.ROOT).contains("password=")) {
      throw Refusal.wrongInput("address.password").remedy("lodebook help book create");
    }
    return new Server(text);
  }
}
