package lodebook.ui.desk.bench;

import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Supplier;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import lodebook.assembly.survey.Diagnosis;
import lodebook.db.builds.Rotor;
import lodebook.db.meters.Meter;
import lodebook.db.rights.Person;
import lodebook.db.surveys.FluxUnit;
import lodebook.ui.desk.room.Said;
import lodebook.ui.desk.run.Runner;
import lodebook.ui.desk.run.Trouble;
import lodebook.ui.desk.station.Station;
import lodebook.ui.desk.words.DeskWords;
import lodebook.ui.desk.words.TypedNumber;
import org.jspecify.annotations.Nullable;

/// What happens at the bench: one rotor, one step, one reading.
public final class BenchModel {
  private final Station station;
  private final Runner runner;
  private final BenchBook bench;
  private final BenchWords words;
  private final ReadOnlyObjectWrapper<BenchPhase> phase =
      new ReadOnlyObjectWrapper<>(BenchPhase.CHOOSE);
  private final ReadOnlyObjectWrapper<@Nullable BenchStep> step = new ReadOnlyObjectWrapper<>();
  private final ReadOnlyObjectWrapper<@Nullable Diagnosis> doubt = new ReadOnlyObjectWrapper<>();
  private final ReadOnlyObjectWrapper<Said> said = new ReadOnlyObjectWrapper<>(Said.NOTHING);
  private final ReadOnlyStringWrapper last = new ReadOnlyStringWrapper("");
  private final ReadOnlyStringWrapper minutes = new ReadOnlyStringWrapper("");
  private final ReadOnlyBooleanWrapper busy = new ReadOnlyBooleanWrapper(false);
  private final StringProperty typed = new SimpleStringProperty("");
  private final ObjectProperty<FluxUnit> unit = new SimpleObjectProperty<>(FluxUnit.MILLITESLA);
  private final ObjectProperty<@Nullable Meter> meter = new SimpleObjectProperty<>();
  private final ObservableList<Rotor> rotors = FXCollections.observableArrayList();
  private final ObservableList<Meter> meters = FXCollections.observableArrayList();
  private final ObservableList<Person> people = FXCollections.observableArrayList();
  private @Nullable Instant mixed;
  private @Nullable String askedBack;
  private List<String> lotsToPlan = List.of();
  private String rotor = "";

  /// @param station where the bench stands
  /// @param runner does what takes time
  public BenchModel(Station station, Runner runner) {
    this.station = station;
    this.runner = runner;
    this.bench = new BenchBook(station);
    this.words = new BenchWords(station.words());
  }

  /// What the bench shows.
  public ReadOnlyObjectProperty<BenchPhase> phase() {
    return phase.getReadOnlyProperty();
  }

  /// The step, or null where there is none.
  public ReadOnlyObjectProperty<@Nullable BenchStep> step() {
    return step.getReadOnlyProperty();
  }

  /// What is likely wrong, while something is; else null.
  public ReadOnlyObjectProperty<@Nullable Diagnosis> doubt() {
    return doubt.getReadOnlyProperty();
  }

  /// What is said to the builder.
  public ReadOnlyObjectProperty<Said> said() {
    return said.getReadOnlyProperty();
  }

  /// The last reading with its unit, empty before the first.
  public ReadOnlyStringProperty last() {
    return last.getReadOnlyProperty();
  }

  /// Minutes that the adhesive still can be worked, empty where none is mixed.
  public ReadOnlyStringProperty minutes() {
    return minutes.getReadOnlyProperty();
  }

  /// Whether something is being recorded.
  public ReadOnlyBooleanProperty busy() {
    return busy.getReadOnlyProperty();
  }

  /// The reading as it is typed.
  public StringProperty typed() {
    return typed;
  }

  /// The unit in force.
  public ObjectProperty<FluxUnit> unit() {
    return unit;
  }

  /// The meter in use.
  public ObjectProperty<@Nullable Meter> meter() {
    return meter;
  }

  /// Rotors to choose from.
  public ObservableList<Rotor> rotors() {
    return rotors;
  }

  /// Meters to choose from.
  public ObservableList<Meter> meters() {
    return meters;
  }

  /// People who may take over.
  public ObservableList<Person> people() {
    return people;
  }

  /// The rotor at the bench, empty for none.
  public String rotor() {
    return rotor;
  }

  /// The sentences of a step.
  BenchWords words() {
    return words;
  }

  /// Shows what there is to sit down at.
  public void offer() {
    rotor = "";
    step.set(null);
    doubt.set(null);
    phase.set(BenchPhase.CHOOSE);
    fetchOffer();
  }

  /// Looks again what there is, without leaving the step.
  public void fetchOffer() {
    runner.run(
        say("doing.look"),
        bench::offer,
        offer -> {
          Meter held = meter.get();
          if (held == null
              || offer.meters().stream().noneMatch(m -> m.code().equals(held.code()))) {
            meter.set(offer.meters().isEmpty() ? null : offer.meters().getFirst());
          }
          meters.setAll(offer.meters());
          people.setAll(offer.people());
          rotors.setAll(offer.rotors());
        },
        this::tell);
  }

  /// Sits down at a rotor, at the step where it stands.
  public void sitDown(String code) {
    said.set(Said.NOTHING);
    last.set("");
    fetchOffer();
    go(() -> bench.load(code));
  }

  /// Takes the typed reading.
  public void enter() {
    BenchStep now = step.get();
    Meter with = meter.get();
    if (now == null || busy.get() || phase.get() != BenchPhase.STEP) {
      return;
    }
    if (with == null) {
      said.set(Said.of(Said.Tone.WRONG, say("bench.no-meter")));
      return;
    }
    OptionalDouble number = TypedNumber.of(typed.get());
    if (number.isEmpty()) {
      said.set(Said.of(Said.Tone.WRONG, say("bench.no-number", typed.get().strip())));
      return;
    }
    double amount = number.getAsDouble();
    FluxUnit stated = unit.get();
    if (Math.abs(stated.tesla(amount)) > TypedNumber.MOST_TESLA && !typed.get().equals(askedBack)) {
      askedBack = typed.get();
      said.set(
          Said.of(Said.Tone.OPEN, say("bench.impossible", typed.get().strip(), stated.word())));
      return;
    }
    askedBack = null;
    String text = typed.get().strip().replace('-', '\u2212') + " " + stated.word();
    busy.set(true);
    runner.run(
        say("doing.record"),
        () -> bench.confirm(now, amount, stated, with.code()),
        outcome -> judged(outcome, text),
        this::failed);
  }

  private void judged(Outcome outcome, String text) {
    busy.set(false);
    typed.set("");
    last.set(text);
    BenchStep after = outcome.after();
    step.set(after);
    said.set(words.outcome(outcome));
    switch (outcome.kind()) {
      case FAULT, UNEXPLAINED -> {
        doubt.set(outcome.diagnosis());
        phase.set(BenchPhase.DOUBT);
      }
      case RIGHT, CANNOT_TELL -> {
        doubt.set(null);
        if (after.toRead().isEmpty()) {
          go(() -> bench.next(after.code()));
        }
      }
    }
  }

  /// The magnet was put in the wrong way round; it is turned and read again.
  public void turned() {
    withStep(now -> go(() -> bench.turned(now, say("why.turned"))));
  }

  /// The reading was mistaken; it is taken again.
  public void readAgain() {
    withStep(now -> go(() -> bench.readAgain(now)));
  }

  /// The builder goes on in spite of a doubt; its mark stays in the book.
  public void goOn() {
    Diagnosis diagnosis = doubt.get();
    withStep(now -> go(() -> bench.goOn(now, diagnosis)));
  }

  /// The magnet is in but cannot be read.
  public void unread() {
    withStep(now -> go(() -> bench.unread(now)));
  }

  /// The step's magnet is broken.
  public void broken() {
    withStep(now -> go(() -> bench.broken(now, say("why.broken"))));
  }

  /// Another magnet was used.
  ///
  /// @param where tray and cell, or `LOT/NUMBER`
  public void usedAnother(String where) {
    withStep(now -> go(() -> bench.usedAnother(now, where, say("why.another"))));
  }

  /// Plans the empty slots, from the lots that were named.
  public void planAnew() {
    List<String> lots = lotsToPlan;
    String code = rotor;
    if (lots.isEmpty()) {
      return;
    }
    go(() -> bench.planAnew(code, lots));
  }

  /// Somebody else takes over.
  public void handOver(Person person) {
    station.takenBy(person);
    said.set(Said.of(Said.Tone.PLAIN, say("bench.handed-over", person.name())));
  }

  /// The adhesive is mixed now.
  public void mixedNow() {
    mixed = station.clock().instant();
    tick();
  }

  /// Time has passed.
  public void tick() {
    BenchStep now = step.get();
    Instant since = mixed;
    Double working = now == null ? null : now.design().layout().adhesiveWorkingMinutes();
    if (since == null || working == null) {
      minutes.set("");
      return;
    }
    Duration left =
        Duration.ofSeconds(Math.round(working * 60))
            .minus(Duration.between(since, station.clock().instant()));
    minutes.set(
        left.isNegative() || left.isZero()
            ? say("bench.adhesive.over")
            : say(
                "bench.adhesive.left",
                left.toMinutes() + ":" + String.format("%02d", left.toSecondsPart())));
  }

  private interface WithStep {
    void take(BenchStep step);
  }

  private void withStep(WithStep work) {
    BenchStep now = step.get();
    if (now != null && !busy.get()) {
      work.take(now);
    }
  }

  private void go(Supplier<BenchLoad> work) {
    busy.set(true);
    runner.run(say("doing.step"), work, this::arrived, this::failed);
  }

  private void arrived(BenchLoad load) {
    busy.set(false);
    typed.set("");
    doubt.set(null);
    switch (load) {
      case BenchLoad.Ready ready -> {
        rotor = ready.step().code();
        step.set(ready.step());
        phase.set(BenchPhase.STEP);
        tick();
      }
      case BenchLoad.Full full -> {
        rotor = full.rotor().rotor().code();
        step.set(null);
        phase.set(BenchPhase.FULL);
        said.set(Said.of(Said.Tone.RIGHT, say("bench.full", rotor)));
      }
      case BenchLoad.Unplanned unplanned -> {
        rotor = unplanned.rotor().rotor().code();
        step.set(null);
        lotsToPlan = unplanned.lots();
        phase.set(BenchPhase.UNPLANNED);
        String lots = String.join(", ", lotsToPlan);
        said.set(
            Said.of(
                Said.Tone.OPEN,
                lots.isEmpty()
                    ? say("bench.unplanned.no-lot", rotor)
                    : say("bench.unplanned", rotor, lots)));
      }
      case BenchLoad.Spoilt spoilt -> {
        rotor = spoilt.rotor().rotor().code();
        step.set(null);
        lotsToPlan = spoilt.lots();
        phase.set(BenchPhase.SPOILT);
        List<String> slots = new ArrayList<>();
        spoilt.slots().forEach(s -> slots.add(station.words().number(s)));
        said.set(Said.of(Said.Tone.OPEN, say("bench.spoilt", rotor, String.join(", ", slots))));
      }
    }
  }

  private void failed(Trouble trouble) {
    busy.set(false);
    tell(trouble);
  }

  private void tell(Trouble trouble) {
    said.set(Said.of(trouble));
  }

  private String say(String key, Object... arguments) {
    return station.words().say(key, arguments);
  }

  /// The desktop's sentences.
  DeskWords desk() {
    return station.words();
  }
}
