package lodebook.ui.desk.history;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import lodebook.db.history.Histories;
import lodebook.db.history.HistoryEntry;
import lodebook.db.keep.Verification;
import lodebook.ui.desk.room.Said;
import lodebook.ui.desk.run.Runner;
import lodebook.ui.desk.station.Station;
import lodebook.ui.desk.words.DeskWords;
import org.jspecify.annotations.Nullable;

/// Who did what and when, the latest first.
public final class HistoryModel {
  private final Station station;
  private final Runner runner;
  private final DeskWords words;
  private final ObservableList<HistoryEntry> lines = FXCollections.observableArrayList();
  private final StringProperty number = new SimpleStringProperty("");
  private final StringProperty person = new SimpleStringProperty("");
  private final ReadOnlyObjectWrapper<Said> said = new ReadOnlyObjectWrapper<>(Said.NOTHING);
  private List<HistoryEntry> all = List.of();

  /// @param station whose book it is
  /// @param runner does what takes time
  public HistoryModel(Station station, Runner runner) {
    this.station = station;
    this.runner = runner;
    this.words = station.words();
    person.addListener((_, _, _) -> filter());
  }

  /// The lines shown.
  public ObservableList<HistoryEntry> lines() {
    return lines;
  }

  /// The number of which lines are shown, empty for all.
  public StringProperty number() {
    return number;
  }

  /// Initials of whom lines are shown, empty for everybody.
  public StringProperty person() {
    return person;
  }

  /// What is said.
  public ReadOnlyObjectProperty<Said> said() {
    return said.getReadOnlyProperty();
  }

  /// Reads the lines.
  public void look() {
    String wanted = number.get().strip();
    @Nullable String code = wanted.isEmpty() ? null : wanted;
    runner.run(
        words.say("doing.look"),
        () -> station.with(book -> new Histories(book).list(code)).reversed(),
        found -> {
          said.set(Said.NOTHING);
          all = found;
          filter();
        },
        trouble -> {
          said.set(Said.of(trouble));
          all = List.of();
          filter();
        });
  }

  private void filter() {
    String initials = person.get().strip().toLowerCase(Locale.ROOT);
    List<HistoryEntry> shown = new ArrayList<>();
    for (HistoryEntry line : all) {
      if (initials.isEmpty() || line.initials().toLowerCase(Locale.ROOT).equals(initials)) {
        shown.add(line);
      }
    }
    if (!lines.equals(shown)) {
      lines.setAll(shown);
    }
  }

  /// Checks the chain of the whole book.
  public void verify() {
    runner.run(
        words.say("doing.verify"),
        () -> station.with(book -> Verification.of(book, null)),
        outcome ->
            said.set(
                outcome.faults().isEmpty()
                    ? Said.of(
                        Said.Tone.RIGHT,
                        words.say("history.whole", words.number(outcome.lines()), outcome.head()))
                    : new Said(
                        Said.Tone.WRONG,
                        words.say("history.broken", words.number(outcome.faults().size())),
                        outcome.faults().stream()
                            .map(n -> lodebook.db.refusal.Sentences.in(words.locale()).say(n))
                            .toList())),
        trouble -> said.set(Said.of(trouble)));
  }

  /// What a line did it with: names and values, rows.
  String with(HistoryEntry line) {
    List<String> parts = new ArrayList<>();
    line.fields().forEach(f -> parts.add(f.name() + " " + f.content()));
    if (line.rows() > 0) {
      parts.add(words.say("history.rows", words.number(line.rows())));
    }
    return String.join(", ", parts);
  }

  /// When a line was stated.
  String when(HistoryEntry line) {
    return words.minute(line.statedAt());
  }
}
