package lodebook.ui.desk.station;

import java.time.Clock;
import java.util.function.Consumer;
import java.util.function.Function;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import lodebook.db.book.Act;
import lodebook.db.book.Book;
import lodebook.db.book.BookAddress;
import lodebook.db.book.Visit;
import lodebook.db.rights.Person;
import lodebook.ui.desk.words.DeskWords;
import lodebook.ui.words.Words;
import org.jspecify.annotations.Nullable;

/// The computer at which somebody stands, with the book it is used on.
///
/// The book is opened for an operation or a burst of them and closed again, so that other stations
/// have their turn.
public final class Station {
  private final BookAddress address;
  private final String name;
  private final Clock clock;
  private final DeskWords words;
  private final ReadOnlyObjectWrapper<@Nullable Person> who = new ReadOnlyObjectWrapper<>();

  /// @param address where the book is
  /// @param name name of this computer
  /// @param clock the one clock, with the station's zone
  /// @param words the desktop's language
  public Station(BookAddress address, String name, Clock clock, DeskWords words) {
    this.address = address;
    this.name = name;
    this.clock = clock;
    this.words = words;
  }

  /// Where the book is.
  public BookAddress address() {
    return address;
  }

  /// Name of this computer.
  public String name() {
    return name;
  }

  /// The one clock.
  public Clock clock() {
    return clock;
  }

  /// The desktop's sentences.
  public DeskWords words() {
    return words;
  }

  /// What both faces say, in the desktop's language.
  public Words shared() {
    return Words.in(words.locale());
  }

  /// Who is at this station, or null where nobody has said so yet.
  public ReadOnlyObjectProperty<@Nullable Person> who() {
    return who.getReadOnlyProperty();
  }

  /// Somebody takes the station over; null for nobody.
  public void takenBy(@Nullable Person person) {
    who.set(person);
  }

  /// What is signed, by who is at this station, now.
  public Act act() {
    Person person = who.get();
    return Act.by(person == null ? null : person.initials());
  }

  /// Opens the book; close it soon.
  public Book open() {
    return Book.open(address, visit());
  }

  /// Who opens the book, and from where.
  public Visit visit() {
    return new Visit(name, "desktop", clock);
  }

  /// Asks the book something, or does something to it.
  public <T> T with(Function<Book, T> work) {
    try (Book book = open()) {
      return work.apply(book);
    }
  }

  /// Does something to the book that answers nothing.
  ///
  /// @return true, so that a runner has an outcome
  public boolean change(Consumer<Book> work) {
    try (Book book = open()) {
      work.accept(book);
      return true;
    }
  }
}
