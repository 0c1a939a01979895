package lodebook.db.keep;

import static lodebook.db.tables.Tables.CHAIN_HEAD;
import static lodebook.db.tables.Tables.SETTING;

import java.util.HashMap;
import java.util.Map;
import java.util.TreeMap;
import lodebook.assembly.survey.Priors;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import org.jooq.DSLContext;
import org.jspecify.annotations.Nullable;

/// What the shop has settled for its book: `name`, the book's name on papers, `shop`, the shop's
/// own, and what it believes of a survey before the first reading ([Priors#byName()]).
public final class Settings {
  private static final int LONGEST = 100;
  private static final double MOST_LIKELY = 0.5;

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
    Double prior = Priors.DEFAULT.byName().get(name);
    if (content == null && prior != null) {
      return prior.toString();
    }
    if (content == null) {
      throw unknown(name);
    }
    return content;
  }

  /// Settles one.
  public void set(Act act, String name, String content) {
    boolean prior = Priors.DEFAULT.byName().containsKey(name);
    if (!prior && !name.equals("name") && !name.equals("shop")) {
      throw unknown(name);
    }
    if (prior && !isProbability(content)) {
      throw Refusal.wrongInput("setting.probability", name, content);
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

  private static boolean isProbability(String content) {
    try {
      double value = Double.parseDouble(content);
      return value > 0 && value <= MOST_LIKELY;
    } catch (NumberFormatException notOne) {
      return false;
    }
  }

  /// What the shop believes of a survey before the first reading, inside a transaction: the default
  /// where it settled nothing else.
  public static Priors priors(DSLContext sql) {
    Map<String, Double> settled = new HashMap<>();
    sql.selectFrom(SETTING)
        .where(SETTING.NAME.in(Priors.DEFAULT.byName().keySet()))
        .forEach(r -> settled.put(r.getName(), Double.valueOf(r.getContent())));
    return Priors.DEFAULT.with(settled);
  }

  private static Refusal unknown(String name) {
    return Refusal.refused("setting.unknown", name).remedy("lodebook help book setting");
  }
}
