package lodebook.ui.desk.survey;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Supplier;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import lodebook.assembly.layout.ProbePoint;
import lodebook.assembly.survey.Diagnosis;
import lodebook.assembly.survey.Finding;
import lodebook.assembly.survey.MeasureNext;
import lodebook.assembly.survey.Verdict;
import lodebook.db.meters.Meter;
import lodebook.db.surveys.FluxUnit;
import lodebook.db.surveys.Survey;
import lodebook.ui.desk.room.Said;
import lodebook.ui.desk.run.Runner;
import lodebook.ui.desk.run.Trouble;
import lodebook.ui.desk.station.Station;
import lodebook.ui.desk.words.DeskWords;
import lodebook.ui.desk.words.SurveySentences;
import lodebook.ui.desk.words.TypedNumber;
import org.jspecify.annotations.Nullable;

/// A round of readings: taken one by one or from a file, judged, explained.
public final class SurveyModel {
  private final Runner runner;
  private final DeskWords words;
  private final SurveyBook book;
  private final SurveySentences sentences;
  private final ObservableList<SurveyBook.Choice> choices = FXCollections.observableArrayList();
  private final ReadOnlyObjectWrapper<@Nullable Round> round = new ReadOnlyObjectWrapper<>();
  private final ReadOnlyObjectWrapper<@Nullable ProbePoint> asked = new ReadOnlyObjectWrapper<>();
  private final ReadOnlyObjectWrapper<Said> said = new ReadOnlyObjectWrapper<>(Said.NOTHING);
  private final ReadOnlyBooleanWrapper busy = new ReadOnlyBooleanWrapper(false);
  private final StringProperty typed = new SimpleStringProperty("");
  private final ObjectProperty<FluxUnit> unit = new SimpleObjectProperty<>(FluxUnit.MILLITESLA);
  private @Nullable Meter meter;
  private @Nullable String askedBack;

  /// @param station whose book it is
  /// @param runner does what takes time
  public SurveyModel(Station station, Runner runner) {
    this.runner = runner;
    this.words = station.words();
    this.book = new SurveyBook(station);
    this.sentences = new SurveySentences(words);
  }

  /// Rotors to choose from.
  ObservableList<SurveyBook.Choice> choices() {
    return choices;
  }

  /// The round, or null while none is chosen.
  public ReadOnlyObjectProperty<@Nullable Round> round() {
    return round.getReadOnlyProperty();
  }

  /// The point that is to be read now, or null where nothing is asked for.
  public ReadOnlyObjectProperty<@Nullable ProbePoint> asked() {
    return asked.getReadOnlyProperty();
  }

  /// What is said.
  public ReadOnlyObjectProperty<Said> said() {
    return said.getReadOnlyProperty();
  }

  /// Whether something is being recorded or explained.
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

  /// The sentences about surveys.
  SurveySentences sentences() {
    return sentences;
  }

  /// Shows the rotors to choose from.
  public void offer() {
    round.set(null);
    asked.set(null);
    said.set(Said.NOTHING);
    runner.run(say("doing.look"), book::choices, choices::setAll, this::failed);
  }

  /// Opens a rotor's latest round, or a survey.
  public void open(String code) {
    runner.run(
        say("doing.look"),
        book::meters,
        found -> meter = found.isEmpty() ? null : found.getFirst(),
        this::failed);
    go(
        () -> {
          Round found = book.open(code);
          return found.missing().isEmpty() || found.survey() == null || judgedBefore(found)
              ? book.explain(found)
              : found;
        });
  }

  private static boolean judgedBefore(Round round) {
    Survey survey = round.survey();
    return survey != null && survey.verdict() != null;
  }

  /// Begins a new round.
  public void fresh() {
    withRound(now -> go(() -> book.fresh(now.code())));
  }

  /// Goes on with readings of the round that is shown.
  public void goOn() {
    withRound(
        now -> {
          Diagnosis diagnosis = now.diagnosis();
          if (diagnosis != null && !diagnosis.measureNext().isEmpty()) {
            asked.set(diagnosis.measureNext().getFirst().point());
          } else if (!now.missing().isEmpty()) {
            asked.set(now.missing().getFirst());
          }
        });
  }

  /// Asks for the reading at a slot next.
  public void ask(int slot) {
    withRound(
        now -> {
          List<ProbePoint> here =
              Round.points(now.rotor().design().layout()).stream()
                  .filter(p -> p.slot() == slot)
                  .toList();
          List<ProbePoint> open = new ArrayList<>(here);
          open.retainAll(now.missing());
          asked.set(open.isEmpty() ? here.getFirst() : open.getFirst());
        });
  }

  /// Takes the typed reading.
  public void enter() {
    Round now = round.get();
    ProbePoint point = asked.get();
    Meter with = meter;
    if (now == null || point == null || busy.get()) {
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
    FluxUnit stated = unit.get();
    double amount = number.getAsDouble();
    if (Math.abs(stated.tesla(amount)) > TypedNumber.MOST_TESLA && !typed.get().equals(askedBack)) {
      askedBack = typed.get();
      said.set(
          Said.of(Said.Tone.OPEN, say("bench.impossible", typed.get().strip(), stated.word())));
      return;
    }
    askedBack = null;
    go(
        () -> {
          Round taken = book.reading(now, point, amount, stated, with.code());
          return taken.missing().isEmpty() ? book.judge(taken) : taken;
        });
  }

  /// Judges what was read so far.
  public void judge() {
    withRound(now -> go(() -> book.judge(now)));
  }

  /// Takes a file of readings in.
  public void file(Path path) {
    Meter with = meter;
    withRound(now -> go(() -> book.file(now, path, with == null ? null : with.code())));
  }

  /// The magnet of the first finding was put right; a new round begins.
  public void reworked() {
    withRound(
        now -> {
          Diagnosis diagnosis = now.diagnosis();
          if (diagnosis != null && !diagnosis.findings().isEmpty()) {
            Finding first = diagnosis.findings().getFirst();
            go(() -> book.reworked(now, first, say("why.turned")));
          }
        });
  }

  /// Declares the round void.
  public void voided(String why) {
    withRound(now -> go(() -> book.voided(now, why)));
  }

  /// Moves the round to another rotor.
  public void moved(String rotor) {
    withRound(now -> go(() -> book.moved(now, rotor, say("why.moved"))));
  }

  private interface WithRound {
    void take(Round round);
  }

  private void withRound(WithRound work) {
    Round now = round.get();
    if (now != null && !busy.get()) {
      work.take(now);
    }
  }

  private void go(Supplier<Round> work) {
    busy.set(true);
    runner.run(say("doing.survey"), work, this::arrived, this::failed);
  }

  private void arrived(Round now) {
    busy.set(false);
    typed.set("");
    Diagnosis diagnosis = now.diagnosis();
    asked.set(diagnosis != null || now.missing().isEmpty() ? null : now.missing().getFirst());
    said.set(diagnosis == null ? Said.NOTHING : verdict(now, diagnosis));
    round.set(now);
  }

  private Said verdict(Round now, Diagnosis diagnosis) {
    Said.Tone tone =
        diagnosis.verdict() == Verdict.PASS
            ? Said.Tone.RIGHT
            : diagnosis.verdict() == Verdict.FAULT ? Said.Tone.WRONG : Said.Tone.OPEN;
    List<String> rows = new ArrayList<>();
    for (Finding finding : diagnosis.findings()) {
      rows.add(sentences.finding(finding, now.rotor().design().layout()));
    }
    if (diagnosis.verdict() == Verdict.FAULT) {
      rows.add(sentences.remedy(diagnosis.findings().getFirst(), now.rotor().design().layout()));
    }
    rows.addAll(sentences.beside(diagnosis));
    for (MeasureNext next : diagnosis.measureNext().stream().limit(2).toList()) {
      rows.add(sentences.next(next));
    }
    return new Said(tone, sentences.verdict(diagnosis, now.code()), rows);
  }

  private void failed(Trouble trouble) {
    busy.set(false);
    said.set(Said.of(trouble));
  }

  private String say(String key, Object... arguments) {
    return words.say(key, arguments);
  }

  /// The desktop's sentences.
  DeskWords words() {
    return words;
  }
}
