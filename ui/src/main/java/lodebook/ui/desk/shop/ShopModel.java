package lodebook.ui.desk.shop;

import java.nio.file.Path;
import java.time.LocalDate;
import java.time.format.DateTimeParseException;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Supplier;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import lodebook.db.book.Book;
import lodebook.db.keep.Backup;
import lodebook.db.keep.BookInfo;
import lodebook.db.keep.Head;
import lodebook.db.keep.Settings;
import lodebook.db.meters.Meter;
import lodebook.db.meters.MeterKind;
import lodebook.db.meters.Meters;
import lodebook.db.people.People;
import lodebook.db.rights.Person;
import lodebook.db.rights.Role;
import lodebook.ui.desk.room.Said;
import lodebook.ui.desk.run.Runner;
import lodebook.ui.desk.run.Trouble;
import lodebook.ui.desk.station.Station;
import lodebook.ui.desk.words.DeskWords;
import lodebook.ui.desk.words.TypedNumber;
import org.jspecify.annotations.Nullable;

/// The shop itself: who works there, with which meters, under which name, and its backups.
public final class ShopModel {
  private final Station station;
  private final Runner runner;
  private final DeskWords words;
  private final ReadOnlyObjectWrapper<@Nullable Shop> shop = new ReadOnlyObjectWrapper<>();
  private final ReadOnlyObjectWrapper<Said> said = new ReadOnlyObjectWrapper<>(Said.NOTHING);

  /// The shop as the book knows it.
  ///
  /// @param info what the book is
  /// @param name the shop's own name, may be empty
  /// @param people everybody who ever signed
  /// @param meters all instruments
  public record Shop(BookInfo info, String name, List<Person> people, List<Meter> meters) {
    public Shop {
      people = List.copyOf(people);
      meters = List.copyOf(meters);
    }
  }

  /// @param station whose book it is
  /// @param runner does what takes time
  public ShopModel(Station station, Runner runner) {
    this.station = station;
    this.runner = runner;
    this.words = station.words();
  }

  /// The shop, or null before the first look.
  public ReadOnlyObjectProperty<@Nullable Shop> shop() {
    return shop.getReadOnlyProperty();
  }

  /// What is said.
  public ReadOnlyObjectProperty<Said> said() {
    return said.getReadOnlyProperty();
  }

  /// The desktop's sentences.
  DeskWords words() {
    return words;
  }

  /// Looks at the shop.
  public void look() {
    runner.run(words.say("doing.look"), () -> station.with(ShopModel::read), shop::set, this::tell);
  }

  private static Shop read(Book book) {
    return new Shop(
        BookInfo.of(book),
        new Settings(book).get("shop"),
        new People(book).list(),
        new Meters(book).list());
  }

  /// Adds a person.
  public void addPerson(String initials, String name, Role role) {
    doing(
        "shop.person-added",
        book -> new People(book).add(station.act(), initials.strip(), name.strip(), role).name());
  }

  /// Gives a person another role.
  public void changeRole(String initials, Role role) {
    doing(
        "shop.role-changed",
        book -> new People(book).changeRole(station.act(), initials, role).name());
  }

  /// A person signs no more.
  public void retire(String initials) {
    doing("shop.retired", book -> new People(book).retire(station.act(), initials).name());
  }

  /// Adds a meter of flux density.
  ///
  /// @param accuracy standard deviation of its gain in per cent, as typed
  /// @param floor standard deviation near zero in mT, as typed; empty for none
  /// @param due the day until which its calibration holds, as ISO 8601 has it
  public void addMeter(String code, String accuracy, String floor, String due) {
    OptionalDouble percent = TypedNumber.of(accuracy);
    OptionalDouble milliTesla = floor.isBlank() ? OptionalDouble.of(0) : TypedNumber.of(floor);
    if (percent.isEmpty() || milliTesla.isEmpty()) {
      said.set(Said.of(Said.Tone.WRONG, words.say("shop.meter-numbers")));
      return;
    }
    LocalDate day;
    try {
      day = LocalDate.parse(due.strip());
    } catch (DateTimeParseException none) {
      said.set(Said.of(Said.Tone.WRONG, words.say("shop.meter-day", due.strip())));
      return;
    }
    Meter meter =
        new Meter(
            code.strip(),
            MeterKind.FIELD,
            percent.getAsDouble() / 100,
            milliTesla.getAsDouble() / 1e3,
            0,
            day,
            false);
    doing(
        "shop.meter-added",
        book -> {
          new Meters(book).add(station.act(), meter);
          return meter.code();
        });
  }

  /// Settles the shop's name.
  public void name(String name) {
    doing(
        "shop.named",
        book -> {
          new Settings(book).set(station.act(), "shop", name.strip());
          return name.strip();
        });
  }

  /// Writes a backup.
  public void backup(Path file) {
    runner.run(
        words.say("doing.backup"),
        () -> station.with(book -> new Backup(book).write(file)),
        (Head head) -> said.set(Said.of(Said.Tone.RIGHT, words.say("shop.backed-up", file, head))),
        this::tell);
  }

  private interface Work {
    String on(Book book);
  }

  private void doing(String key, Work work) {
    Supplier<String> all = () -> station.with(work::on);
    runner.run(
        words.say("doing.record"),
        all,
        name -> {
          said.set(Said.of(Said.Tone.RIGHT, words.say(key, name)));
          look();
        },
        this::tell);
  }

  private void tell(Trouble trouble) {
    said.set(Said.of(trouble));
  }
}
