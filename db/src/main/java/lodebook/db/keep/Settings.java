package lodebook.db.keep;

import static lodebook.db.tables.Tables.CHAIN_HEAD;
import static lodebook.db.tables.Tables.SETTING;

import java.util.Map;
import java.util.TreeMap;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import org.jspecify.annotations.Nullable;

/// What the shop has settled for its book: `name`, the book's name on papers, and `shop`, the
/// shop's own.
public final class Settings {
  private static final int LONGEST = 100;

  private final Book book;

  /// The settings of a book.
  public Settings(Book book) {
    this.book = book;
  }

  /// All settings by name; those never set are empty.
  public Map<String, String> all() {
    return book.read(
        sql -> {
          Map<String, String> settings = new TreeMap<>();
          settings.put("shop", "");
          sql.selectFrom(SETTING).forEach(r -> settings.put(r.getName(), r.getContent()));
          settings.put(
              "name", sql.select(CHAIN_HEAD.BOOK_NAME).from(CHAIN_HEAD).fetchSingle().value1());
          return settings;
        });
  }

  /// One setting; an unknown name is refused.
  public String get(String name) {
    @Nullable String content = all().get(name);
    if (content == null) {
      throw unknown(name);
    }
    return content;
  }

  /// Settles one.
  public void set(Act act, String name, String content) {
    if (!name.equals("name") && !name.equals("shop")) {
      throw unknown(name);
    }
    if (content.isBlank() || content.length() > LONGEST) {
      throw Refusal.wrongInput("setting.length", name, LONGEST).remedy("lodebook book setting");
    }
    book.run(
        act,
        Permission.LEAD,
        "book setting",
        writing -> {
          if (name.equals("name")) {
            writing.sql().update(CHAIN_HEAD).set(CHAIN_HEAD.BOOK_NAME, content).execute();
          } else {
            writing.sql().deleteFrom(SETTING).where(SETTING.NAME.eq(name)).execute();
            writing
                .sql()
                .insertInto(SETTING, SETTING.NAME, SETTING.CONTENT)
                .values(name, content)
                .execute();
          }
          writing.line().field(name, content);
        });
  }

  private static Refusal unknown(String name) {
    return Refusal.refused("setting.unknown", name).remedy("lodebook help book setting");
  }
}
