package lodebook.db.people;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.function.Consumer;
import lodebook.db.TestBook;
import lodebook.db.TestShop;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.refusal.Refusal;
import lodebook.db.rights.Person;
import lodebook.db.rights.Role;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class PeopleTest {
  @ParameterizedTest
  @EnumSource
  void theFirstPersonIsTheLeadWhoeverSigns(TestBook database) {
    try (Book book = Book.open(database.newBook(), TestBook.visit())) {
      People people = new People(book);
      Person first = people.add(Act.by("nobody"), "Le", "Lena Lead", Role.BENCH);
      assertEquals(Role.LEAD, first.role());
      assertEquals(List.of(first), people.list());
      assertRefused(
          "nobody signs: say who you are with --by INITIALS",
          people,
          p -> p.add(Act.by(null), "BE", "Ben", Role.BENCH));
      assertRefused(
          "nobody here signs as nobody",
          people,
          p -> p.add(Act.by("nobody"), "BE", "Ben", Role.BENCH));
    }
  }

  @ParameterizedTest
  @EnumSource
  void initialsAreTakenWithoutRegardToCase(TestBook database) {
    try (Book book = Book.open(database.newShop(), TestBook.visit())) {
      assertRefused(
          "BE are the initials of Ben Bench",
          new People(book),
          p -> p.add(TestShop.LEAD, "be", "Bea", Role.BENCH));
      assertRefused(
          "\"B E\" cannot be initials: 1 to 20 letters, digits, \".\", \"-\", \"_\"",
          new People(book),
          p -> p.add(TestShop.LEAD, "B E", "Bea", Role.BENCH));
    }
  }

  @ParameterizedTest
  @EnumSource
  void onlyALeadChangesPeopleAndTheLastLeadStays(TestBook database) {
    try (Book book = Book.open(database.newShop(), TestBook.visit())) {
      People people = new People(book);
      assertRefused(
          "BE is bench and may not do \"person role\"; it needs lead",
          people,
          p -> p.changeRole(TestShop.BENCH, "BE", Role.LEAD));
      assertRefused(
          "LE (Lena Lead) is the only lead; make somebody else lead first",
          people,
          p -> p.retire(TestShop.LEAD, "LE"));
      assertRefused(
          "LE (Lena Lead) is the only lead; make somebody else lead first",
          people,
          p -> p.changeRole(TestShop.LEAD, "LE", Role.BENCH));
      people.changeRole(TestShop.LEAD, "BE", Role.LEAD);
      people.retire(Act.by("BE"), "LE");
      assertRefused(
          "LE (Lena Lead) is retired and signs no more",
          people,
          p -> p.add(TestShop.LEAD, "X", "Xaver", Role.BENCH));
      assertEquals(
          List.of("BE", "IN", "PL", "LE"), people.list().stream().map(Person::initials).toList());
    }
  }

  private static void assertRefused(String sentence, People people, Consumer<People> deed) {
    Refusal refusal = assertThrows(Refusal.class, () -> deed.accept(people));
    assertEquals(sentence, refusal.getMessage());
  }
}
