package lodebook.ui.desk.waiting;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import lodebook.assembly.survey.Verdict;
import lodebook.db.book.Book;
import lodebook.db.builds.Plans;
import lodebook.db.builds.Rotor;
import lodebook.db.builds.Rotors;
import lodebook.db.meters.Meter;
import lodebook.db.meters.Meters;
import lodebook.db.stock.Lot;
import lodebook.db.stock.LotState;
import lodebook.db.stock.Lots;
import lodebook.db.surveys.Survey;
import lodebook.db.surveys.Surveys;
import lodebook.db.units.GearUnit;
import lodebook.db.units.Units;
import lodebook.ui.desk.room.Said;
import lodebook.ui.desk.run.Runner;
import lodebook.ui.desk.station.Station;
import lodebook.ui.desk.waiting.WaitingLine.Thing;
import lodebook.ui.desk.words.DeskWords;

/// What waits in the shop.
public final class WaitingModel {
  private final Station station;
  private final Runner runner;
  private final DeskWords words;
  private final ObservableList<WaitingLine> lines = FXCollections.observableArrayList();
  private final ReadOnlyObjectWrapper<Said> said = new ReadOnlyObjectWrapper<>(Said.NOTHING);

  /// @param station whose book it is
  /// @param runner does what takes time
  public WaitingModel(Station station, Runner runner) {
    this.station = station;
    this.runner = runner;
    this.words = station.words();
  }

  /// What waits, in the order in which it is dealt with in a day.
  public ObservableList<WaitingLine> lines() {
    return lines;
  }

  /// What is said where the book cannot be read, or where nothing waits.
  public ReadOnlyObjectProperty<Said> said() {
    return said.getReadOnlyProperty();
  }

  /// Looks what waits.
  public void look() {
    runner.run(
        words.say("doing.look"),
        () -> station.with(this::read),
        found -> {
          said.set(
              found.isEmpty()
                  ? Said.of(Said.Tone.RIGHT, words.say("waiting.nothing"))
                  : Said.NOTHING);
          if (!lines.equals(found)) {
            lines.setAll(found);
          }
        },
        trouble -> said.set(Said.of(trouble)));
  }

  private List<WaitingLine> read(Book book) {
    List<Rotor> rotors =
        new Rotors(book)
            .list().stream().filter(r -> r.state().equals("open") && r.unit() == null).toList();
    List<WaitingLine> found = new ArrayList<>();
    add(found, "lots", lots(book));
    add(found, "half-built", halfBuilt(rotors));
    add(found, "spoilt", spoilt(book, rotors));
    add(found, "planned", planned(rotors));
    add(found, "unplanned", unplanned(rotors));
    add(found, "unsurveyed", unsurveyed(rotors));
    addSurveys(book, rotors, found);
    add(found, "meters", meters(book));
    add(found, "returned", returned(book));
    return found;
  }

  private static void add(List<WaitingLine> found, String key, List<Thing> things) {
    if (!things.isEmpty()) {
      found.add(new WaitingLine(key, things));
    }
  }

  private List<Thing> lots(Book book) {
    List<Thing> things = new ArrayList<>();
    for (Lot lot : new Lots(book).list()) {
      if (lot.state() == LotState.AWAITING) {
        things.add(
            new Thing(
                words.say("waiting.lot", lot.code(), words.number(lot.received().count())),
                "stock",
                lot.code()));
      }
    }
    return things;
  }

  private List<Thing> halfBuilt(List<Rotor> rotors) {
    return rotors.stream()
        .filter(r -> r.filled() > 0 && r.filled() < r.slots())
        .map(
            r ->
                new Thing(
                    words.say(
                        "waiting.rotor",
                        r.code(),
                        words.number(r.filled()),
                        words.number(r.slots())),
                    "bench",
                    r.code()))
        .toList();
  }

  private static List<Thing> spoilt(Book book, List<Rotor> rotors) {
    List<Thing> things = new ArrayList<>();
    for (Rotor rotor : rotors) {
      if (rotor.planned() && !new Plans(book).show(rotor.code()).spoilt().isEmpty()) {
        things.add(new Thing(rotor.code(), "bench", rotor.code()));
      }
    }
    return things;
  }

  private static List<Thing> planned(List<Rotor> rotors) {
    return rotors.stream()
        .filter(r -> r.planned() && r.filled() == 0)
        .map(r -> new Thing(r.code(), "bench", r.code()))
        .toList();
  }

  private static List<Thing> unplanned(List<Rotor> rotors) {
    return rotors.stream()
        .filter(r -> !r.planned() && r.filled() < r.slots())
        .map(r -> new Thing(r.code(), "trace", r.code()))
        .toList();
  }

  private static List<Thing> unsurveyed(List<Rotor> rotors) {
    return rotors.stream()
        .filter(r -> r.filled() == r.slots() && r.latestSurvey() == null)
        .map(r -> new Thing(r.code(), "survey", r.code()))
        .toList();
  }

  private static void addSurveys(Book book, List<Rotor> rotors, List<WaitingLine> found) {
    List<Thing> faults = new ArrayList<>();
    List<Thing> open = new ArrayList<>();
    List<Thing> unchecked = new ArrayList<>();
    for (Rotor rotor : rotors) {
      String number = rotor.latestSurvey();
      if (number == null || rotor.filled() < rotor.slots()) {
        continue;
      }
      Survey survey = new Surveys(book).show(number);
      Verdict verdict = survey.verdict();
      Thing thing = new Thing(rotor.code() + " " + number, "survey", rotor.code());
      if (verdict == null) {
        unchecked.add(thing);
      } else if (verdict == Verdict.FAULT) {
        faults.add(thing);
      } else if (verdict == Verdict.CANNOT_TELL) {
        open.add(thing);
      }
    }
    add(found, "unchecked", unchecked);
    add(found, "faults", faults);
    add(found, "cannot-tell", open);
  }

  private List<Thing> meters(Book book) {
    LocalDate today = words.dayOf(station.clock().instant());
    List<Thing> things = new ArrayList<>();
    for (Meter meter : new Meters(book).list()) {
      LocalDate due = meter.calibrationDue();
      if (!meter.retired() && due != null && due.isBefore(today)) {
        things.add(
            new Thing(
                words.say("waiting.meter", meter.code(), words.day(due)), "trace", meter.code()));
      }
    }
    return things;
  }

  private static List<Thing> returned(Book book) {
    return new Units(book)
        .list().stream()
            .filter(u -> u.state().equals("returned"))
            .map(GearUnit::code)
            .map(code -> new Thing(code, "trace", code))
            .toList();
  }
}
