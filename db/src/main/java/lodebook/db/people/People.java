package lodebook.db.people;

import static lodebook.db.tables.Tables.PERSON;

import java.util.Comparator;
import java.util.List;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.Writing;
import lodebook.db.code.CodeText;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import lodebook.db.rights.Person;
import lodebook.db.rights.Role;
import lodebook.db.tables.tables.records.PersonRecord;
import org.jooq.DSLContext;

/// The people of the shop. The first person of a book is its lead, and a book never loses its last.
public final class People {
  private static final int LONGEST_INITIALS = 20;
  private static final int LONGEST_NAME = 200;

  private final Book book;

  /// The people of a book.
  public People(Book book) {
    this.book = book;
  }

  /// Adds a person. In a book without people nobody needs to sign, and the person becomes its lead
  /// whatever role is asked for.
  public Person add(Act act, String initials, String name, Role role) {
    checkInitials(initials);
    if (name.isBlank() || name.length() > LONGEST_NAME) {
      throw Refusal.wrongInput("person.name", LONGEST_NAME);
    }
    return book.write(
        act,
        Permission.ADD_PERSON,
        "person add",
        writing -> {
          DSLContext sql = writing.sql();
          Role given = sql.fetchExists(PERSON) ? role : Role.LEAD;
          refuseTaken(sql, initials);
          Person person = new Person(writing.newId(), initials, name.strip(), given, false);
          sql.insertInto(PERSON)
              .set(PERSON.ID, person.id())
              .set(PERSON.FOLDED, CodeText.fold(initials))
              .set(PERSON.INITIALS, initials)
              .set(PERSON.NAME, person.name())
              .set(PERSON.ROLE, given.word())
              .set(PERSON.RETIRED, false)
              .set(PERSON.RECORDED_AT, writing.recordedAt())
              .set(PERSON.HISTORY_SEQUENCE, writing.sequence())
              .execute();
          writing.line().field("initials", initials).field("name", person.name());
          now(writing, person);
          return person;
        });
  }

  /// Gives a person another role.
  public Person changeRole(Act act, String initials, Role role) {
    return book.write(
        act,
        Permission.LEAD,
        "person role",
        writing -> {
          PersonRecord row = require(writing.sql(), initials);
          if (!row.getRetired() && role != Role.LEAD) {
            refuseLastLead(writing.sql(), row);
          }
          row.setRole(role.word());
          return store(writing, row);
        });
  }

  /// Lets a person sign no more; what they signed stays.
  public Person retire(Act act, String initials) {
    return book.write(
        act,
        Permission.LEAD,
        "person retire",
        writing -> {
          PersonRecord row = require(writing.sql(), initials);
          if (row.getRetired()) {
            throw Refusal.refused("person.retired", row.getInitials(), row.getName())
                .remedy("lodebook person list");
          }
          refuseLastLead(writing.sql(), row);
          row.setRetired(true);
          return store(writing, row);
        });
  }

  /// Everybody, by initials; those who are retired last.
  public List<Person> list() {
    return book.read(
        sql ->
            sql.selectFrom(PERSON).fetch(People::person).stream()
                .sorted(
                    Comparator.comparing(Person::retired)
                        .thenComparing(p -> CodeText.fold(p.initials())))
                .toList());
  }

  private static Person store(Writing writing, PersonRecord row) {
    row.store();
    Person person = person(row);
    writing.line().field("initials", person.initials());
    now(writing, person);
    return person;
  }

  private static void now(Writing writing, Person person) {
    writing
        .line()
        .now(
            "person",
            person.initials(),
            person.role().word() + (person.retired() ? " retired" : ""));
  }

  private static Person person(PersonRecord row) {
    return new Person(
        row.getId(), row.getInitials(), row.getName(), Role.of(row.getRole()), row.getRetired());
  }

  private static PersonRecord require(DSLContext sql, String initials) {
    return sql.selectFrom(PERSON)
        .where(PERSON.FOLDED.eq(CodeText.fold(initials)))
        .fetchOptional()
        .orElseThrow(
            () -> Refusal.refused("person.unknown", initials).remedy("lodebook person list"));
  }

  private static void refuseTaken(DSLContext sql, String initials) {
    PersonRecord holder =
        sql.selectFrom(PERSON).where(PERSON.FOLDED.eq(CodeText.fold(initials))).fetchOne();
    if (holder != null) {
      throw Refusal.refused("person.taken", holder.getInitials(), holder.getName())
          .remedy("lodebook person list");
    }
  }

  private static void refuseLastLead(DSLContext sql, PersonRecord row) {
    boolean another =
        sql.fetchExists(
            PERSON,
            PERSON.ROLE.eq(Role.LEAD.word()),
            PERSON.RETIRED.eq(false),
            PERSON.ID.ne(row.getId()));
    if (!another) {
      throw Refusal.refused("person.last-lead", row.getInitials(), row.getName())
          .remedy("lodebook person role INITIALS lead");
    }
  }

  private static void checkInitials(String initials) {
    boolean signs =
        initials
            .codePoints()
            .allMatch(c -> Character.isLetterOrDigit(c) || c == '.' || c == '-' || c == '_');
    if (initials.isEmpty() || initials.length() > LONGEST_INITIALS || !signs) {
      throw Refusal.wrongInput("person.initials", initials, LONGEST_INITIALS);
    }
  }
}
