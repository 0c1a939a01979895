package lodebook.db.book;

import static lodebook.db.tables.Tables.CHAIN_HEAD;
import static lodebook.db.tables.Tables.HISTORY;
import static lodebook.db.tables.Tables.STATION;

import java.sql.Connection;
import java.sql.SQLException;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import java.util.function.Function;
import lodebook.db.chain.Line;
import lodebook.db.chain.LineText;
import lodebook.db.refusal.Notice;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import lodebook.db.rights.Person;
import lodebook.db.tables.tables.records.ChainHeadRecord;
import org.jooq.DSLContext;
import org.jooq.exception.DataAccessException;
import org.jspecify.annotations.Nullable;

/// An open book: for one operation, or for a burst of them. Close it soon; others wait.
///
/// Safe for several threads, which take turns.
public final class Book implements AutoCloseable {
  private final BookAddress address;
  private final Visit visit;
  private final Engine engine;
  private final @Nullable Turn turn;
  private final Connection connection;
  private final List<Notice> notices = new ArrayList<>();
  private boolean written;

  Book(BookAddress address, Visit visit, Engine engine, @Nullable Turn turn) {
    this.address = address;
    this.visit = visit;
    this.engine = engine;
    this.turn = turn;
    this.connection = engine.connect();
  }

  /// Opens a book; refuses with exit code 5 what is no book, busy, or of another generation.
  public static Book open(BookAddress address, Visit visit) {
    return Opening.open(address, visit);
  }

  /// Makes a new book; only where nothing is.
  ///
  /// @param first what it holds from the start, in its first transaction
  public static void create(BookAddress address, Visit visit, Consumer<Writing> first) {
    Creation.create(address, visit, first);
  }

  /// Makes a new book from rows that stand elsewhere; only where nothing is.
  ///
  /// @param load fills all tables, in one transaction
  /// @param after what is done in the filled book; if it is refused, there is no book
  public static void fill(BookAddress address, Visit visit, Load load, Consumer<Book> after) {
    Creation.make(
        address,
        visit,
        book -> {
          book.unchained(sql -> sql.connection(load::into));
          after.accept(book);
        });
  }

  /// Fills the tables of a new book.
  @FunctionalInterface
  public interface Load {
    /// Inserts all rows.
    void into(Connection connection) throws SQLException;
  }

  /// Where this book is.
  public BookAddress address() {
    return address;
  }

  /// Who opened it.
  public Visit visit() {
    return visit;
  }

  /// Reads one state of the book; writes nothing.
  public synchronized <T> T read(Function<DSLContext, T> question) {
    try {
      engine.beginReading(connection);
      T answer = question.apply(Sql.on(connection, engine.dialect()));
      connection.rollback();
      return answer;
    } catch (SQLException failure) {
      throw new IllegalStateException(failure);
    } catch (RuntimeException failure) {
      rollback(failure);
      throw failure instanceof DataAccessException e ? ConstraintSentences.explain(e) : failure;
    }
  }

  /// Does one operation: all of it and its line of history, or nothing.
  ///
  /// @param act who and when
  /// @param permission what the person must be allowed to do
  /// @param operation the operation's name in history, such as `lot accept`
  /// @param work what is done
  public synchronized <T> T write(
      Act act, Permission permission, String operation, Function<Writing, T> work) {
    try {
      engine.beginWriting(connection);
      T result =
          new Transaction(Sql.on(connection, engine.dialect()), visit, notices::add)
              .run(act, permission, operation, work);
      connection.commit();
      engine.settle(connection);
      written = true;
      return result;
    } catch (SQLException failure) {
      rollback(failure);
      throw Refusal.cannotOpen("book.not-written", address.shown(), Sql.firstLine(failure))
          .because(failure);
    } catch (RuntimeException failure) {
      rollback(failure);
      throw failure instanceof DataAccessException e ? ConstraintSentences.explain(e) : failure;
    }
  }

  /// As [#write(Act, Permission, String, Function)], with nothing to return.
  public void run(Act act, Permission permission, String operation, Consumer<Writing> work) {
    Boolean done =
        write(
            act,
            permission,
            operation,
            writing -> {
              work.accept(writing);
              return true;
            });
    if (!done) {
      throw new IllegalStateException(operation);
    }
  }

  /// Changes tables outside the history: only for making, restoring and upgrading a book.
  synchronized void unchained(Consumer<DSLContext> work) {
    try {
      engine.beginWriting(connection);
      work.accept(Sql.on(connection, engine.dialect()));
      connection.commit();
      engine.settle(connection);
      written = true;
    } catch (SQLException failure) {
      rollback(failure);
      throw Refusal.cannotOpen("book.not-written", address.shown(), Sql.firstLine(failure))
          .because(failure);
    } catch (RuntimeException failure) {
      rollback(failure);
      throw failure;
    }
  }

  /// What should be said to the person after the operations so far, such as that this station's
  /// clock is behind; each notice is given once.
  public synchronized List<Notice> takeNotices() {
    List<Notice> taken = List.copyOf(notices);
    notices.clear();
    return taken;
  }

  private void rollback(Throwable failure) {
    try {
      connection.rollback();
    } catch (SQLException second) {
      failure.addSuppressed(second);
    }
  }

  @Override
  public synchronized void close() {
    try (Turn _ = turn) {
      engine.leave(connection, written);
    } catch (SQLException failure) {
      throw new IllegalStateException(failure);
    }
  }

  /// One writing transaction, from taking the head of the chain to moving it on.
  private record Transaction(DSLContext sql, Visit visit, Consumer<Notice> notices) {
    <T> T run(Act act, Permission permission, String operation, Function<Writing, T> work) {
      ChainHeadRecord chain = sql.selectFrom(CHAIN_HEAD).forUpdate().fetchSingle();
      Opening.checkGeneration(chain.getGeneration());
      Instant now = visit.clock().instant().truncatedTo(ChronoUnit.MICROS);
      warnIfBehind(chain.getSequence(), now);
      Person person =
          permission == Permission.CREATE_BOOK
              ? null
              : Signature.signing(sql, act.by(), permission);
      Line.Head head =
          new Line.Head(
              chain.getSequence() + 1,
              act.at() == null ? now : act.at().truncatedTo(ChronoUnit.MICROS),
              now,
              person == null ? "" : person.initials(),
              visit.station(),
              operation);
      Writing writing = new Writing(sql, head, person, chain.getNextId());
      if (person != null) {
        writing.require(permission);
      }
      T result = work.apply(writing);
      registerStation(writing);
      String text = writing.line().text(head);
      String hash = LineText.hash(chain.getHash(), text);
      HistoryWriter.append(sql, head, writing.line(), text, hash);
      sql.update(CHAIN_HEAD)
          .set(CHAIN_HEAD.SEQUENCE, head.sequence())
          .set(CHAIN_HEAD.HASH, hash)
          .set(CHAIN_HEAD.NEXT_ID, writing.nextId())
          .set(CHAIN_HEAD.REVISION, chain.getRevision() + 1)
          .execute();
      return result;
    }

    private void registerStation(Writing writing) {
      if (!sql.fetchExists(STATION, STATION.NAME.eq(visit.station()))) {
        sql.insertInto(STATION, STATION.ID, STATION.NAME)
            .values(writing.newId(), visit.station())
            .execute();
      }
    }

    private void warnIfBehind(long sequence, Instant now) {
      Instant last =
          sql.select(HISTORY.RECORDED_AT)
              .from(HISTORY)
              .where(HISTORY.SEQUENCE.eq(sequence))
              .fetchOne(HISTORY.RECORDED_AT);
      if (last != null && now.isBefore(last)) {
        notices.accept(Notice.of("clock.behind", visit.station(), now, sequence, last));
      }
    }
  }
}
