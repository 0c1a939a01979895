package lodebook.db.book;

import static lodebook.db.tables.Tables.COUNTER;

import java.time.Instant;
import lodebook.db.chain.Line;
import lodebook.db.code.CodeKind;
import lodebook.db.code.Codes;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import lodebook.db.rights.Person;
import org.jooq.DSLContext;
import org.jspecify.annotations.Nullable;

/// A writing transaction while it runs: the tables, who writes, the line of history.
public final class Writing {
  private final DSLContext sql;
  private final Line.Head head;
  private final @Nullable Person person;
  private final Line line = new Line();
  private long nextId;

  Writing(DSLContext sql, Line.Head head, @Nullable Person person, long nextId) {
    this.sql = sql;
    this.head = head;
    this.person = person;
    this.nextId = nextId;
  }

  /// The tables, inside the transaction.
  public DSLContext sql() {
    return sql;
  }

  /// The line of history that the operation fills.
  public Line line() {
    return line;
  }

  /// Number of the line of history, for `history_sequence`.
  public long sequence() {
    return head.sequence();
  }

  /// When the person says it happened.
  public Instant statedAt() {
    return head.statedAt();
  }

  /// The book's time of this transaction.
  public Instant recordedAt() {
    return head.recordedAt();
  }

  /// Who writes.
  public Person person() {
    if (person == null) {
      throw new IllegalStateException("nobody signs " + head.operation());
    }
    return person;
  }

  /// A new id, unique over all tables.
  public long newId() {
    return nextId++;
  }

  /// Reserves a run of new ids and returns the first.
  public long newIds(int count) {
    long first = nextId;
    nextId += count;
    return first;
  }

  long nextId() {
    return nextId;
  }

  /// Refuses what the person's role may not do.
  public void require(Permission permission) {
    require(permission, head.operation());
  }

  /// Refuses what the person's role may not do.
  ///
  /// @param what what the person wants to do, as a command
  public void require(Permission permission, String what) {
    Person who = person();
    if (!permission.allows(who.role())) {
      throw Refusal.refused(
              "role.not-permitted", who.initials(), who.role().word(), what, permission.words())
          .remedy("lodebook person list");
    }
  }

  /// Registers a number of the shop for a new thing and returns its id; a taken number is refused.
  public long register(String code, CodeKind kind) {
    long id = newId();
    Codes.register(sql, id, code, kind);
    line.subject(code);
    return id;
  }

  /// The next number that the book gives, such as `S-12`, registered for a new thing; numbers that
  /// the shop has used for something else are passed over.
  ///
  /// @param prefix `S` or `N`
  public Numbered give(String prefix, CodeKind kind) {
    long number =
        sql.select(COUNTER.NEXT_NUMBER)
            .from(COUNTER)
            .where(COUNTER.PREFIX.eq(prefix))
            .fetchSingle()
            .value1();
    while (Codes.find(sql, prefix + "-" + number) != null) {
      number++;
    }
    sql.update(COUNTER)
        .set(COUNTER.NEXT_NUMBER, number + 1)
        .where(COUNTER.PREFIX.eq(prefix))
        .execute();
    String code = prefix + "-" + number;
    return new Numbered(register(code, kind), code);
  }

  /// A number given by the book.
  ///
  /// @param id id of the new thing
  /// @param code its number
  public record Numbered(long id, String code) {}
}
