package lodebook.db.book;

import static lodebook.db.tables.Tables.PERSON;

import lodebook.db.code.CodeText;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Permission;
import lodebook.db.rights.Person;
import lodebook.db.rights.Role;
import org.jooq.DSLContext;
import org.jspecify.annotations.Nullable;

/// Finds who signs a transaction.
final class Signature {
  private Signature() {}

  /// The person who signs, or null where nobody needs to: the first person of a book.
  static @Nullable Person signing(DSLContext sql, @Nullable String by, Permission permission) {
    if (permission == Permission.ADD_PERSON && !sql.fetchExists(PERSON)) {
      return null;
    }
    if (by == null) {
      throw Refusal.refused("person.nobody-signs").remedy("lodebook person list");
    }
    Person person = find(sql, by);
    if (person == null) {
      throw Refusal.refused("person.unknown", by).remedy("lodebook person list");
    }
    if (person.retired()) {
      throw Refusal.refused("person.retired", person.initials(), person.name())
          .remedy("lodebook person list");
    }
    return person;
  }

  private static @Nullable Person find(DSLContext sql, String initials) {
    return sql.select(PERSON.ID, PERSON.INITIALS, PERSON.NAME, PERSON.ROLE, PERSON.RETIRED)
        .from(PERSON)
        .where(PERSON.FOLDED.eq(CodeText.fold(initials)))
        .fetchOne(
            r -> new Person(r.value1(), r.value2(), r.value3(), Role.of(r.value4()), r.value5()));
  }
}
